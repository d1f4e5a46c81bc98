import { formatAgainst, formatLength } from '../measures/length-words.js';
import type { Units } from '../measures/read-length.js';
import type { Mishap } from '../words/words.js';
import { severityOf } from './checks/judge.js';
import { CHECK_WORDS, checkFamily, VERDICT_WORDS, type CheckFamily } from './fit-check-words.js';
import type { CheckLine, FitCheck, RemedyCheck, RemedyKind, Verdict } from './hole-card.schema.js';

/** One short line for a list: what was measured, and how it stands. */
export interface Trouble {
  readonly text: string;
  readonly verdict: Verdict;
}

const inD =
  (noun: string, decimals = 1) =>
  (line: CheckLine) =>
    `${noun} ${formatAgainst(line.value!, line.limit, decimals)} D`;
const overLimit = ({ value, limit, code }: CheckLine, units: Units) => {
  const word = code === 'over_hole_maximum' ? 'over' : code === 'too_close_to_call' ? 'about' : 'within';
  return `${formatLength(value!, units)} ${word} ${formatLength(limit!, units)}`;
};

type Say = (line: CheckLine, units: Units) => string;

function sayFinalHole(line: CheckLine, units: Units): string {
  if (line.code === 'skips_size') return `skips a size, ${formatLength(line.value!, units)}`;
  const word = line.code === 'too_close_to_call' ? 'hardly' : 'for';
  return `${formatLength(line.value!, units)} ${word} ${formatLength(line.limit!, units)}`;
}

const SAY: Readonly<Record<CheckFamily, Say>> = {
  round: overLimit,
  cleanUp: sayFinalHole,
  edge: inD('edge'),
  corner: inD('corner'),
  pitch: inD('pitch'),
  headClearance: ({ value }, units) =>
    value! < 0 ? 'heads touch' : `heads ${formatLength(value!, units)} apart`,
  bend: inD('bend'),
  thickness: inD('sheet', 2),
  countersink: ({ value, limit, verdict }, units) =>
    `sheet ${formatLength(value!, units)} ${verdict === 'inside' ? 'over' : 'under'} ${formatLength(limit!, units)}`,
  strength: ({ value }) => `strength ${formatAgainst(value!, 100, 0)} %`,
  pattern: ({ value, limit }) => `${value} oversize, ${limit} allowed`,
  length: ({ value }, units) => `length ${formatLength(value!, units)}`,
  shopHead: (line) => inD(line.id.endsWith('width') ? 'width' : 'height', 2)(line),
  finalHole: overLimit,
};

/** What is missing, named by what it would decide. */
const MISSING: Partial<Readonly<Record<CheckFamily, string>>> = {
  round: 'holes to measure',
  cleanUp: 'holes to measure',
  edge: 'edge to measure',
  corner: 'edge to measure',
  pitch: 'pitch to measure',
  headClearance: 'heads to measure',
  bend: 'bend to measure',
  thickness: 'thickness to measure',
  countersink: 'dimpled or countersunk?',
  pattern: 'pattern to count',
};

/** One line in a few words: "edge 1.5 D", "0.156 over 0.132", "pitch 3.9 D". */
export function sayLine(line: CheckLine, units: Units): string {
  const family = checkFamily(line.id);
  if (line.code === 'no_drill') return `needs ${formatLength(line.limit!, units)}`;
  if (line.value !== null) return SAY[family](line, units);
  return MISSING[family] ?? `${CHECK_WORDS[family].toLowerCase()} not known`;
}

/** The line that decides: the worst; among equals the one a builder would look at first. */
function worstOf(lines: readonly CheckLine[]): CheckLine | null {
  return lines.reduce<CheckLine | null>(
    (worst, line) => (worst && severityOf(worst.verdict) >= severityOf(line.verdict) ? worst : line),
    null,
  );
}

/** What decides a remedy, in a few words, with the remedy's verdict. */
export function remedyHeadline(remedy: RemedyCheck, units: Units = 'inch'): Trouble {
  const { kind, verdict, checks } = remedy;
  const worst = worstOf(checks);
  if (kind === 'askKitMaker' || !worst) return { text: 'their word decides', verdict };
  if (verdict !== 'inside') return { text: sayLine(worst, units), verdict };
  return { text: kind === 'replacePart' ? 'as drawn' : VERDICT_WORDS.inside, verdict };
}

/** Which lines a mishap is about. */
const ABOUT: Partial<Readonly<Record<Mishap, readonly CheckFamily[]>>> = {
  misalignedHole: ['round'],
  outOfRoundHole: ['round'],
  doubleHole: ['round'],
  edgeTooNear: ['edge', 'corner'],
  badRivet: ['shopHead'],
  dimpleOrCountersink: ['countersink'],
};

/** In a list what was measured comes before what was not: outside, marginal, not known, inside. */
const LIST_ORDER: readonly Verdict[] = ['outside', 'marginal', 'unknown', 'inside'];

function firstInList(lines: readonly CheckLine[]): CheckLine | null {
  const rank = ({ verdict }: CheckLine) => LIST_ORDER.indexOf(verdict);
  return lines.reduce<CheckLine | null>(
    (first, line) => (first && rank(first) <= rank(line) ? first : line),
    null,
  );
}

/** The line of one family that is nearest to its limit or farthest beyond it. */
function tightest(lines: readonly CheckLine[]): CheckLine | null {
  const first = firstInList(lines);
  const alike = lines.filter(({ verdict }) => verdict === first?.verdict);
  return alike.reduce<CheckLine | null>(
    (least, line) => (least && (least.margin ?? Infinity) <= (line.margin ?? Infinity) ? least : line),
    null,
  );
}

/** An edge is told even where it holds, since it is what was asked about; of the rest only what is wrong. */
function lineAbout(mishap: Mishap | null | undefined, found: readonly CheckLine[]): CheckLine | null {
  const families = (mishap && ABOUT[mishap]) || [];
  const own = tightest(found.filter(({ id }) => families.includes(checkFamily(id))));
  return own && (own.verdict !== 'inside' || families.includes('edge')) ? own : null;
}

/**
 * The measured trouble of a question, as its row in a list says it: from the lines that the mishap is about as the card
 * stands, else from the worst of all. Null without a fit check.
 *
 * @example headlineTrouble('misalignedHole', check) // { text: '0.156 over 0.132', verdict: 'outside' }
 */
export function headlineTrouble(
  mishap: Mishap | null | undefined,
  fitCheck: FitCheck | null | undefined,
  units: Units = 'inch',
): Trouble | null {
  const leave = fitCheck?.remedies.find(({ kind }) => kind === 'leave');
  if (!leave) return null;
  const about = lineAbout(mishap, leave.checks);
  if (about) return { text: sayLine(about, units), verdict: about.verdict };
  const worst = firstInList(leave.checks);
  if (!worst) return null;
  const text = worst.verdict === 'inside' ? VERDICT_WORDS.inside : sayLine(worst, units);
  return { text, verdict: worst.verdict };
}

const WORKABLE: readonly Verdict[] = ['inside', 'marginal'];
const LAST: RemedyKind = 'askKitMaker';

/** The first remedy, in the order of preference, that no line rules out and nothing unknown leaves open; else to ask the kit maker. */
export function foremostRemedy({ remedies }: FitCheck): RemedyCheck {
  return (
    remedies.find(({ verdict }) => WORKABLE.includes(verdict)) ?? remedies.find(({ kind }) => kind === LAST)!
  );
}
