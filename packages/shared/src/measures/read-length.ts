import { DRILLS, LETTER_DRILLS, NUMBER_DRILLS, type Drill } from '../trade/drills.js';

export type Units = 'inch' | 'mm';
export const MM_PER_INCH = 25.4;
const THOUSANDTHS = 1000;

export interface ReadLength {
  readonly ok: true;
  /** The length in inches, unrounded. */
  readonly inches: number;
  /** Measuring error in inches; null where none was typed. */
  readonly u: number | null;
  /** The unit that was typed, or the usual one where none was. */
  readonly unit: Units;
  /** Name of the drill where one was typed. */
  readonly drill: string | null;
  /** What was typed, kept to the letter. */
  readonly typed: string;
}
export interface UnreadLength {
  readonly ok: false;
  readonly message: string;
  readonly typed: string;
}
export type LengthReading = ReadLength | UnreadLength;

interface Amount {
  readonly value: number;
  /** null: no unit was typed. Drills and fractions are always inches. */
  readonly unit: 'inch' | 'mm' | 'thou' | null;
  readonly drill: string | null;
}
type AmountReading = Amount | { readonly message: string };

const HINT = 'Type it as .128, 5/32, #30 or 3.25 mm.';
const UNIT_AFTER = /^(.*?)\s*(mm|in\.?|inch(?:es)?|thou|["”″]|'')$/i;
const PLUS_MINUS = /\s*(?:±|\+\s*\/\s*-|\+-)\s*/;
const NUMBER_DRILL = /^(?:#|(?:no|nr)\.?\s*|drill\s*#?)\s*(\d+)$/i;
const LETTER_DRILL = /^(?:(?:letter|drill)\s*)?([a-z])$/i;
const FRACTION = /^([+-]?)(?:(\d+)(?:\s+|-))?(\d+)\s*\/\s*(\d+)$/;
const DECIMAL = /^[+-]?(?:\d+(?:[.,]\d*)?|[.,]\d+)$/;

/** The drill of that name: `#30`, `F`, `5/32`; null where there is none. */
export function drillNamed(name: string): Drill | null {
  return DRILLS.find((drill) => drill.name === name.trim().toUpperCase()) ?? null;
}

function readDrill(text: string): AmountReading | null {
  const number = NUMBER_DRILL.exec(text)?.[1];
  const letter = LETTER_DRILL.exec(text)?.[1];
  if (!number && !letter) return null;
  const name = number ? `#${Number(number)}` : letter!.toUpperCase();
  const drill = drillNamed(name);
  if (drill) return { value: drill.diameter, unit: 'inch', drill: name };
  return {
    message: `There is no drill ${name}: numbers run from #1 to #${NUMBER_DRILLS.rows.length}, letters from A to ${LETTER_DRILLS.rows.at(-1)![0]}.`,
  };
}

function readFraction(text: string): AmountReading | null {
  const found = FRACTION.exec(text);
  if (!found) return null;
  const [, sign, whole, over, under] = found;
  if (Number(under) === 0) return { message: 'A fraction over 0 is no length.' };
  const value = Number(whole ?? 0) + Number(over) / Number(under);
  return { value: sign === '-' ? -value : value, unit: 'inch', drill: null };
}

function readDecimal(text: string): AmountReading | null {
  if (text.includes('.') && text.includes(',')) {
    return { message: `${text} has a point and a comma: keep the one before the decimals.` };
  }
  return DECIMAL.test(text) ? { value: Number(text.replace(',', '.')), unit: null, drill: null } : null;
}

function unitTyped(suffix: string): 'inch' | 'mm' | 'thou' {
  if (/^mm$/i.test(suffix)) return 'mm';
  return /^thou$/i.test(suffix) ? 'thou' : 'inch';
}

function readAmount(text: string): AmountReading {
  const [, bare = text, suffix] = UNIT_AFTER.exec(text) ?? [];
  const amount = readDrill(bare) ?? readFraction(bare) ?? readDecimal(bare);
  if (!amount) return { message: `${text} is not understood as a length. ${HINT}` };
  if ('message' in amount || !suffix) return amount;
  const unit = unitTyped(suffix);
  if (amount.unit === 'inch' && unit !== 'inch') {
    return { message: `${text}: drills and fractions are inches. Leave out the ${suffix}.` };
  }
  return { ...amount, unit };
}

function inInches(value: number, unit: Amount['unit'], usual: Units): number {
  const taken = unit ?? usual;
  if (taken === 'mm') return value / MM_PER_INCH;
  return taken === 'thou' ? value / THOUSANDTHS : value;
}

/**
 * Reads a length as builders type it: `.128`, `0,128`, `5/32`, `1 3/8`, `#30`, `No 30`, `F`, `3.97 mm`, and with its
 * measuring error `0.322 ± 0.005` or `8.2 +/- 0.1 mm`. A bare number is in `usual` units. Inches come out.
 * Nothing is thrown: what is not understood comes back with a message and as it was typed.
 */
export function readLength(typed: string, usual: Units = 'inch'): LengthReading {
  const refused = (message: string): UnreadLength => ({ ok: false, message, typed });
  const text = typed.replace(/[−–]/g, '-').trim();
  if (!text) return refused(`Give a length. ${HINT}`);
  const [left = '', right, ...more] = text.split(PLUS_MINUS);
  if (more.length > 0) return refused('Give one measuring error, after one ±.');
  const length = readAmount(left);
  if ('message' in length) return refused(length.message);
  if (right === undefined) return { ok: true, ...lengthRead(length, null, usual), typed };
  const error = readAmount(right);
  if ('message' in error) return refused(`After the ±: ${error.message}`);
  if (error.drill || error.value < 0)
    return refused('Give the measuring error as a length, such as ± 0.005.');
  return { ok: true, ...lengthRead(length, error, usual), typed };
}

/** One unit typed for the pair holds for both: `8.2 ± 0.1 mm`, `0.322 in ± .005`. */
function lengthRead(length: Amount, error: Amount | null, usual: Units) {
  const shared = length.unit ?? error?.unit ?? null;
  const unit: Units = (shared ?? usual) === 'mm' ? 'mm' : 'inch';
  const u = error ? inInches(error.value, error.unit ?? shared, usual) : null;
  return { inches: inInches(length.value, shared, usual), u, unit, drill: length.drill };
}
