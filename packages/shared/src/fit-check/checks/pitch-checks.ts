import {
  HEAD_GAP_USUAL,
  PITCH_MAXIMUM_D,
  PITCH_MINIMUM_D,
  PITCH_USUAL_D,
  SHOP_HEAD_D,
  UNIVERSAL_HEAD_D,
} from '../../trade/limits.js';
import { RIVET_HEADS } from '../../trade/rivets.js';
import { HOLES_MISSING, lacking, neighbourName, type Bench, type Plan } from '../bench.js';
import type { Neighbour, RivetHead } from '../card-fields.js';
import { distance } from '../geometry/enclosing-circle.js';
import { reckon, type Reading } from '../geometry/hole-views.js';
import type { CheckCode, CheckLine, Verdict } from '../hole-card.schema.js';
import { known, said } from '../measured.js';
import { pitchCode } from '../sums/edge-and-pitch.js';
import {
  againstMaximum,
  againstMinimum,
  judged,
  notKnown,
  settledBy,
  sourceOf,
  type Finding,
} from './judge.js';

/** From the centre of the finished hole to the neighbour, inch; null where either place is not known. */
export function pitchAfter(bench: Bench, plan: Plan, neighbour: Neighbour): Reading | null {
  const { x, y } = neighbour;
  if (!known(x) || !known(y)) return null;
  return reckon(bench.views, [x, y], (view, [nx, ny]) => {
    const centre = plan.centreFor(view, 0);
    return centre && distance(centre, { x: nx!, y: ny! });
  });
}

const PITCH_SOURCE = sourceOf(PITCH_MINIMUM_D);
const TIGHT_SOURCE = sourceOf(PITCH_MINIMUM_D, PITCH_USUAL_D);
const USUAL_SOURCE = sourceOf(PITCH_USUAL_D);
const MOST_SOURCE = sourceOf(PITCH_MAXIMUM_D);

interface PitchLimit {
  readonly minimum: number;
  readonly source: string;
}

function pitchLimit(bench: Bench): PitchLimit {
  const kit = bench.limits?.pitchMinimumD;
  if (known(kit)) return { minimum: kit, source: bench.limits!.source };
  return { minimum: PITCH_MINIMUM_D.value, source: PITCH_SOURCE };
}

/** Which limit decides, and how: the minimum, the usual pitch above it, or the maximum. */
function findPitch(reading: Reading, limit: number): Finding {
  if (againstMinimum(reading, limit) === 'tooClose')
    return { limit, verdict: 'marginal', code: 'too_close_to_call' };
  const code = pitchCode(reading.value, limit);
  if (code === 'tight') return { limit, verdict: 'marginal', code };
  if (code === 'too_close') return { limit, verdict: 'outside', code };
  const most = PITCH_MAXIMUM_D.value;
  const side = againstMaximum(reading, most);
  if (side === 'inside') return { limit, verdict: 'inside', code: 'ok' };
  const far = side === 'tooClose' ? 'too_close_to_call' : 'too_far';
  return { limit: most, isMaximum: true, verdict: 'marginal', code: far };
}

/** A neighbour of unknown size can only make the ratio worse: short already is short, all else is not known. */
function withoutDash(finding: Finding, dash: number | null | undefined): Finding {
  if (known(dash) || finding.verdict === 'outside') return finding;
  return { ...finding, verdict: 'unknown', code: 'not_measured' };
}

function pitchSource(finding: Finding, source: string): string {
  if (finding.isMaximum) return MOST_SOURCE;
  if (finding.code !== 'tight') return source;
  return source === PITCH_SOURCE ? TIGHT_SOURCE : `${source}; ${USUAL_SOURCE}`;
}

function pitchRemark(finding: Finding, inches: Reading, diameter: number): string | null {
  if (finding.code === 'tight') return `Tight: usual from ${PITCH_USUAL_D.value} D.`;
  if (finding.code === 'not_measured') return 'Missing: the size of the neighbouring rivet.';
  return finding.code === 'too_close_to_call' ? settledBy(inches.value - finding.limit * diameter) : null;
}

function pitchLine(bench: Bench, plan: Plan, index: number, inches: Reading | null): CheckLine {
  const neighbour = bench.card.neighbours![index]!;
  const name = neighbourName(bench.card, index);
  const { minimum, source } = pitchLimit(bench);
  const id = `pitch:${index}`;
  const label = `Pitch to ${name}`;
  if (!inches) {
    const placed = known(neighbour.x) && known(neighbour.y);
    const missing = lacking(bench, placed ? HOLES_MISSING : `the place of ${name}`);
    return notKnown({ id, label, unit: 'D', source }, missing, 'p / D of the larger rivet');
  }
  if (!known(neighbour.dash)) lacking(bench, `the size of the ${name}`);
  const diameter = Math.max(plan.dash, neighbour.dash ?? 0) / 32;
  const reading = { value: inches.value / diameter, error: inches.error / diameter };
  const finding = withoutDash(findPitch(reading, minimum), neighbour.dash);
  const word = finding.isMaximum ? 'at most' : 'at least';
  return judged({ id, label, unit: 'D', source: pitchSource(finding, source) }, reading, finding, {
    formula: `p / D = ${said(inches.value)} / ${said(diameter)} = ${said(reading.value)}, ${word} ${finding.limit}`,
    remark: pitchRemark(finding, inches, diameter),
  });
}

/** Width of the wider of a rivet's two heads, inch; null where the head or its size is not known. */
export function headWidth(
  head: RivetHead | null | undefined,
  dash: number | null | undefined,
): number | null {
  if (!known(head) || !known(dash)) return null;
  if (head === 'universal') return (UNIVERSAL_HEAD_D.value * dash) / 32;
  const flush = RIVET_HEADS.sizes[dash]?.flushWidth;
  return known(flush) ? Math.max(flush, (SHOP_HEAD_D.value * dash) / 32) : null;
}

const HEADS_SOURCE = `${sourceOf(UNIVERSAL_HEAD_D)}; shop head ${sourceOf(SHOP_HEAD_D)}`;

function gapCode(gap: Reading): CheckCode {
  const side = againstMinimum(gap, 0);
  if (side === 'tooClose') return 'too_close_to_call';
  if (side === 'outside') return 'heads_touch';
  return againstMinimum({ value: gap.value, error: 0 }, HEAD_GAP_USUAL.value) === 'inside'
    ? 'ok'
    : 'heads_close';
}

function gapVerdict(code: CheckCode): Verdict {
  if (code === 'ok') return 'inside';
  return code === 'heads_touch' ? 'outside' : 'marginal';
}

function clearanceLine(bench: Bench, plan: Plan, index: number, inches: Reading | null): CheckLine {
  const { card } = bench;
  const neighbour = card.neighbours![index]!;
  const name = neighbourName(card, index);
  const facts = {
    id: `headClearance:${index}`,
    label: `Between heads, ${name}`,
    unit: 'in' as const,
    source: HEADS_SOURCE,
  };
  const own = headWidth(card.rivet.head, plan.dash);
  const other = headWidth(neighbour.head ?? card.rivet.head, neighbour.dash);
  if (!inches || own === null || other === null) {
    const missing = inches
      ? `the head and size of this rivet and of the ${name}`
      : `the place of the ${name}`;
    return notKnown(facts, missing, 'p - (h1 + h2) / 2');
  }
  const gap = { value: inches.value - (own + other) / 2, error: inches.error };
  const code = gapCode(gap);
  return judged(
    facts,
    gap,
    { limit: 0, verdict: gapVerdict(code), code },
    {
      formula: `${said(inches.value)} - (${said(own)} + ${said(other)}) / 2 = ${said(gap.value)} in`,
      remark: code === 'too_close_to_call' ? settledBy(gap.value) : null,
    },
  );
}

/** Pitch and room between heads, to every neighbour. */
export function pitchChecks(bench: Bench, plan: Plan): CheckLine[] {
  const { neighbours } = bench.card;
  if (!neighbours) {
    const missing = lacking(bench, 'the next rivets, centre to centre (none is an answer too)');
    const facts = {
      id: 'pitch:0',
      label: 'Pitch to the next rivet',
      unit: 'D' as const,
      source: PITCH_SOURCE,
    };
    return [notKnown(facts, missing, 'p / D')];
  }
  return neighbours.flatMap((neighbour, index) => {
    const inches = pitchAfter(bench, plan, neighbour);
    return [pitchLine(bench, plan, index, inches), clearanceLine(bench, plan, index, inches)];
  });
}
