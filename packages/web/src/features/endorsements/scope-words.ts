import type { StampScope } from '@rivetside/shared';

/** "101-140, 158" as the scope has it. What is no number stays as typed, for the schema to refuse at its field. */
export function readSerials(text: string): unknown[] {
  return pieces(text).map((piece) => {
    const range = /^(\d+)\s*(?:-|–|to)\s*(\d+)$/.exec(piece);
    if (range) return { from: Number(range[1]), to: Number(range[2]) };
    return /^\d+$/.test(piece) ? Number(piece) : piece;
  });
}

/** "7, 8" as hole numbers. */
export function readHoles(text: string): unknown[] {
  return pieces(text).map((piece) => (/^\d+$/.test(piece) ? Number(piece) : piece));
}

function pieces(text: string): string[] {
  return text
    .split(/[,;\n]/)
    .map((piece) => piece.trim())
    .filter(Boolean);
}

type Serial = NonNullable<StampScope['serials']>[number];
type Hole = NonNullable<StampScope['holes']>[number];

const serialWords = (one: Serial) => (typeof one === 'number' ? `${one}` : `${one.from} to ${one.to}`);

function holeWords(one: Hole): string {
  if (typeof one === 'number') return `${one}`;
  return one.repeat ? `${one.hole} of repeat ${one.repeat}` : `${one.hole}`;
}

/** What a stamp speaks for, in words; nothing named means this case alone. */
export function scopeWords(scope: StampScope | null): string {
  const { serials = [], holeLineIds = [], holes = [] } = scope ?? {};
  const said: string[] = [];
  if (serials.length > 0) said.push(`serials ${serials.map(serialWords).join(', ')}`);
  if (holeLineIds.length > 0)
    said.push(holeLineIds.length === 1 ? 'this hole line' : `${holeLineIds.length} hole lines`);
  if (holes.length > 0) said.push(`holes ${holes.map(holeWords).join(', ')}`);
  return said.length > 0 ? said.join(', ') : 'this case only';
}
