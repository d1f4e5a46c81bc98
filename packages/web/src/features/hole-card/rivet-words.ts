import { DASH_LARGEST, DASH_SMALLEST, type HoleCard, type RivetHead } from '@rivetside/shared';

export type RivetReading =
  | {
      readonly ok: true;
      readonly rivet: HoleCard['rivet'];
      /** Length in sixteenths where it was typed too. */
      readonly lengthDash: number | null;
    }
  | { readonly ok: false; readonly message: string };

const SHAPE =
  /^(?:(?:MS|NAS|AN)\s*(?:20)?)?\s*(470|426)?\s*(AD|DD|A|B|D|M)?\s*-?\s*(\d{1,2})(?:\s*-\s*(\d{1,2}(?:[.,]5)?))?$/;
const HEADS: Readonly<Record<string, RivetHead>> = { '470': 'universal', '426': 'flush' };
const HEAD_WORDS: readonly (readonly [RegExp, string])[] = [
  [/\b(UNIVERSAL|PROTRUDING)\b/, '470'],
  [/\b(FLUSH|COUNTERSUNK)\b/, '426'],
];
const HINT = 'Type it as 470 AD4, 426 AD3 or MS20470AD4-5.';

/** "AD4 universal" is said as often as "470 AD4". */
function inCallOutOrder(typed: string): string {
  const text = typed.trim().toUpperCase();
  const found = HEAD_WORDS.find(([word]) => word.test(text));
  return found ? `${found[1]} ${text.replace(found[0], '').trim()}` : text;
}

/**
 * Reads a rivet as the shop says it: the family (470 universal, 426 flush), the alloy's letters, the diameter in
 * thirty-seconds and, where it is known, the length in sixteenths.
 */
export function readRivet(typed: string): RivetReading {
  if (!typed.trim()) return { ok: false, message: `Give the rivet as drawn. ${HINT}` };
  const found = SHAPE.exec(inCallOutOrder(typed));
  if (!found) return { ok: false, message: `${typed.trim()} is not understood as a rivet. ${HINT}` };
  const [, family, alloy, size, length] = found;
  const dash = Number(size);
  if (dash < DASH_SMALLEST || dash > DASH_LARGEST) {
    const message = `Rivet sizes run from ${DASH_SMALLEST} to ${DASH_LARGEST} thirty-seconds: ${dash} is none.`;
    return { ok: false, message };
  }
  const head = family ? HEADS[family]! : null;
  const lengthDash = length ? Number(length.replace(',', '.')) : null;
  return { ok: true, rivet: { head, alloy: alloy ?? null, dash }, lengthDash };
}

/** What was understood: "universal head, AD, 1/8 in". */
export function rivetUnderstood({ head, alloy, dash }: HoleCard['rivet'], diameter: string): string {
  const headWords = head ? `${head} head` : 'head not told';
  return [headWords, alloy ?? 'alloy not told', `-${dash}, ${diameter} across`].join(' · ');
}

/** The same rivet as it is typed into the field. */
export function rivetTyped({ head, alloy, dash }: HoleCard['rivet']): string {
  const family = head === 'flush' ? '426 ' : head === 'universal' ? '470 ' : '';
  return `${family}${alloy ?? ''}${dash}`;
}
