import {
  errorOf,
  formatHole,
  formatLength,
  formatWithError,
  MM_PER_INCH,
  readLength,
  roundHalfEven,
  valueOf,
  type Measured,
  type Units,
} from '@rivetside/shared';
import type { TypedLength } from './hole-card-fields';
import { toolError, toolOfError, type Tool } from './measuring-tools';

export type TypedReading =
  | { readonly kind: 'blank' }
  | { readonly kind: 'unread'; readonly message: string }
  | {
      readonly kind: 'read';
      readonly inches: number;
      /** What was typed after ±, else the tool's; null where neither is told. Inch. */
      readonly u: number | null;
      readonly drill: string | null;
      readonly isErrorTyped: boolean;
    };

const BLANK: TypedReading = { kind: 'blank' };

/** Reads a field: what was typed after ± stands above the tool; a drill named is its own size and has no error. */
export function readTyped({ typed, units, tool }: TypedLength): TypedReading {
  if (!typed.trim()) return BLANK;
  const reading = readLength(typed, units);
  if (!reading.ok) return { kind: 'unread', message: reading.message };
  const { inches, u, drill } = reading;
  const ofTool = drill ? null : toolError(tool);
  return { kind: 'read', inches, u: u ?? ofTool, drill, isErrorTyped: u !== null };
}

/** A length for the card: bare where no error is told. */
export function asMeasured(inches: number, u: number | null): Measured {
  return u ? { value: inches, u } : inches;
}

/** Sums of typed decimals without the dust of binary fractions. */
export function clean(value: number): number {
  return Math.round(value * 1e9) / 1e9 + 0;
}

const TYPED_DECIMALS = { inch: [3, 5], mm: [2, 4] } as const;

/** A number as one would type it: no fewer decimals than are shown, no more than are known. */
export function typedNumber(inches: number, units: Units): string {
  const [least, most] = TYPED_DECIMALS[units];
  const value = units === 'mm' ? inches * MM_PER_INCH : inches;
  const exact = roundHalfEven(value, most);
  const shown = roundHalfEven(value, least);
  return Number(exact) === Number(shown) ? shown : exact.replace(/0+$/, '');
}

/** The field for a length of a card: its tool where one has that error, else the error typed after ±. */
export function typedFrom(measured: Measured | null | undefined, units: Units, usual: Tool): TypedLength {
  if (measured === null || measured === undefined) return { typed: '', units, tool: usual };
  const u = errorOf(measured);
  const typed = typedNumber(valueOf(measured), units);
  const tool = toolOfError(u);
  if (tool) return { typed, units, tool };
  return { typed: `${typed} ± ${typedNumber(u, units)}`, units, tool: usual };
}

/** What was understood, in the reader's units: "0.322 ± 0.005 in", "0.128 · #30"; empty while there is nothing to say. */
export function understood(field: TypedLength, units: Units, isHole = false): string {
  const reading = readTyped(field);
  if (reading.kind !== 'read') return '';
  const { inches, u, drill } = reading;
  const unit = units === 'mm' ? 'mm' : 'in';
  if (!isHole && !drill) return `${formatWithError(inches, u, units)} ${unit}`;
  const hole = drill ? formatHole(inches, units, drill) : formatHole(inches, units);
  return u ? `${hole} ± ${formatLength(u, units)}` : hole;
}
