import type { HolePlace } from '@rivetside/shared';

export type HoleNumbers =
  | { readonly ok: true; readonly holes: readonly HolePlace[] }
  | { readonly ok: false; readonly message: string };

/** A hole line as far as its holes are counted. */
export interface CountedLine {
  readonly code: string;
  readonly count: number;
  readonly repeats: number;
}

const HOLES_MOST = 200;
const RANGE = /^(\d{1,4})(?:\s*(?:-|–|to)\s*(\d{1,4}))?$/;

function numbersIn(part: string): number[] | null {
  const found = RANGE.exec(part.trim());
  if (!found) return null;
  const [from, to] = [Number(found[1]), Number(found[2] ?? found[1])];
  if (to < from || to - from >= HOLES_MOST) return null;
  return Array.from({ length: to - from + 1 }, (_, index) => from + index);
}

/**
 * Reads hole numbers as they are written on a sheet: `7`, `3-5, 9`. They are counted from 1 in one repeat (which rib,
 * which side) of the line. Nothing typed is no hole in particular.
 */
export function readHoleNumbers(typed: string, repeat: number, line: CountedLine | null): HoleNumbers {
  const parts = typed.split(/[,;]/).filter((part) => part.trim() !== '');
  const numbers = parts.map(numbersIn);
  const wrong = parts[numbers.indexOf(null)];
  if (wrong !== undefined)
    return { ok: false, message: `${wrong.trim()} is no hole number: write 7, or 3-5, 9.` };
  const holes = [...new Set(numbers.flatMap((some) => some ?? []))];
  const none = holes.find((hole) => hole < 1 || (line !== null && hole > line.count));
  if (none !== undefined) {
    const counted = line ? `${line.code} has ${line.count} holes` : 'Holes are counted from 1';
    return { ok: false, message: `${counted}: ${none} is none of them.` };
  }
  if (holes.length > HOLES_MOST)
    return { ok: false, message: `At most ${HOLES_MOST} holes in one question.` };
  return { ok: true, holes: holes.map((hole) => ({ repeat, hole })) };
}
