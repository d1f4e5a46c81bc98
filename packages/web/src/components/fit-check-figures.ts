import {
  checkFamily,
  CODE_WORDS,
  formatAgainst,
  formatHole,
  formatLengthUnit,
  known,
  type CheckFamily,
  type CheckLine,
  type RemedyCheck,
  type Units,
} from '@rivetside/shared';

/** One figure of a remedy's row, and the lines of the check that stand behind it. */
export interface Figure {
  readonly key: 'hole' | 'edge' | 'pitch' | 'strength';
  readonly text: string;
  readonly lines: readonly CheckLine[];
  readonly isTooClose: boolean;
}

export const FIGURE_HEADS: Readonly<Record<Figure['key'], string>> = {
  hole: 'Final hole',
  edge: 'Edge e/D',
  pitch: 'Pitch p/D',
  strength: 'Strength',
};

const FAMILIES: Readonly<Record<Figure['key'], readonly CheckFamily[]>> = {
  hole: ['round', 'cleanUp', 'finalHole', 'pattern', 'length'],
  edge: ['edge', 'corner', 'bend'],
  pitch: ['pitch', 'headClearance'],
  strength: ['strength', 'thickness', 'countersink'],
};
/** The family whose number is shown; the others of the figure are behind it. */
const SHOWN: Readonly<Record<Figure['key'], readonly CheckFamily[]>> = {
  hole: [],
  edge: ['edge', 'corner'],
  pitch: ['pitch'],
  strength: ['strength'],
};
const NOTHING = '–';

/** The line nearest to its limit or farthest beyond it. */
function tightest(lines: readonly CheckLine[]): CheckLine | null {
  return lines
    .filter(({ value }) => value !== null)
    .reduce<CheckLine | null>(
      (least, line) => (least && (least.margin ?? Infinity) <= (line.margin ?? Infinity) ? least : line),
      null,
    );
}

function holeText({ kind, finalHole }: RemedyCheck, units: Units): string {
  if (kind === 'leave') return 'as it is';
  if (kind === 'replacePart') return 'as drawn';
  if (kind === 'askKitMaker') return NOTHING;
  return finalHole ? formatHole(finalHole.diameter, units, finalHole.drill) : 'none';
}

function numberText(lines: readonly CheckLine[]): string {
  const line = tightest(lines);
  if (!line) return lines.length > 0 ? 'not known' : NOTHING;
  return line.unit === 'percent'
    ? `${formatAgainst(line.value!, line.limit, 0)} %`
    : formatAgainst(line.value!, line.limit, 2);
}

/** The four figures of a remedy's row. */
export function figuresOf(remedy: RemedyCheck, units: Units): Figure[] {
  return (Object.keys(FAMILIES) as Figure['key'][]).map((key) => {
    const lines = remedy.checks.filter(({ id }) => FAMILIES[key].includes(checkFamily(id)));
    const shown = lines.filter(({ id }) => SHOWN[key].includes(checkFamily(id)));
    return {
      key,
      text: key === 'hole' ? holeText(remedy, units) : numberText(shown),
      lines,
      isTooClose: lines.some(({ code }) => code === 'too_close_to_call'),
    };
  });
}

/** A value, limit or margin of a line in its unit. */
export function inUnit(value: number, line: CheckLine, units: Units): string {
  if (line.unit === 'in') return formatLengthUnit(value, units);
  if (line.unit === 'percent') return `${formatAgainst(value, line.limit, 1)} %`;
  return line.unit === 'D' ? `${formatAgainst(value, line.limit, 2)} D` : String(value);
}

/** How far inside or short, in words. */
export function marginWords(line: CheckLine, units: Units): string | null {
  const { margin } = line;
  if (!known(margin)) return null;
  const size = { ...line, limit: null };
  return margin < 0 ? `short by ${inUnit(-margin, size, units)}` : `${inUnit(margin, size, units)} to spare`;
}

/** What stands beside the verdict of a line; nothing where it is plainly inside. */
export function reasonWords({ code, remark }: CheckLine): string | null {
  // Where it is too close to call the remark says so itself, with the tool that would settle it.
  if (remark && (code === 'ok' || code === 'too_close_to_call')) return remark;
  const words = [code === 'ok' ? null : CODE_WORDS[code], remark].filter(known);
  return words.length > 0 ? words.join('. ') : null;
}

/** Published sources by their titles; the short ids that tables know them by are left out. */
export function sourceTitles(source: string): string[] {
  return source
    .split('; ')
    .map((title) => title.replace(/(^|\s)S\d+[a-z]?\s/, '$1').trim())
    .filter(Boolean);
}
