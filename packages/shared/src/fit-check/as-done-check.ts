import { readLength } from '../measures/read-length.js';
import { LENGTH_BEYOND_GRIP_D } from '../trade/limits.js';
import { RIVET_DASHES } from '../trade/rivets.js';
import type { AsDone } from '../questions/completion.schema.js';
import { lacking, layBench, rivetName, type Bench, type Plan } from './bench.js';
import type { HoleCard } from './card-fields.js';
import { edgeChecks } from './checks/edge-checks.js';
import { headChecks } from './checks/head-checks.js';
import { cleanUpCheck, holeLimit } from './checks/hole-checks.js';
import { judged, notKnown, sourceOf, worstVerdict, type Facts, type Finding } from './checks/judge.js';
import { pitchChecks } from './checks/pitch-checks.js';
import { stackOf } from './checks/stack-checks.js';
import { ENGINE_VERSION } from './fit-check.js';
import { ORIGIN } from './geometry/enclosing-circle.js';
import type { AsDoneCheck, CheckLine, RemedyCheck } from './hole-card.schema.js';
import { known, said } from './measured.js';
import { rivetHole } from './sums/holes.js';
import { reaches } from './sums/require.js';
import { lengthDashFor, rivetLength } from './sums/rivet-length.js';

/** Longer than it should be by more than this, the rivet bends (S3). Inch; house. */
const LONG_BY = 1 / 16;
const SIXTEENTHS = 16;

interface Done {
  readonly bench: Bench;
  readonly asDone: AsDone;
  readonly planned: RemedyCheck | null;
  /** Diameter of the hole as drilled, inch. */
  readonly hole: { readonly diameter: number; readonly drill: string } | null;
  readonly dash: number;
  /** False where no listed size fits the hole. */
  readonly fits: boolean;
}

function holeOf({ finalDrill }: AsDone): Done['hole'] {
  if (!finalDrill) return null;
  const read = readLength(finalDrill);
  return read.ok && read.inches > 0 ? { diameter: read.inches, drill: read.drill ?? finalDrill } : null;
}

/** A rivet enters the hole and still fills it. */
function fills(bench: Bench, dash: number, diameter: number): boolean {
  const maximum = holeLimit(bench, dash)?.maximum ?? rivetHole(dash)?.shopFinal;
  return known(maximum) && reaches(diameter, dash / 32) && reaches(maximum, diameter);
}

/** The size that was driven: the planned one where it fits the hole, else the drawn one, else the largest that does. */
function sizeOf(bench: Bench, hole: Done['hole'], planned: RemedyCheck | null): Pick<Done, 'dash' | 'fits'> {
  const drawn = bench.card.rivet.dash;
  const wanted = planned?.rivet?.dash ?? drawn;
  if (!hole) return { dash: wanted, fits: true };
  const found = [wanted, drawn, ...RIVET_DASHES.toReversed()].find((dash) =>
    fills(bench, dash, hole.diameter),
  );
  return { dash: found ?? wanted, fits: found !== undefined };
}

/** Too small for the shank, too large to be filled, or right. */
function holeFinding({ dash, fits }: Done, diameter: number, maximum: number): Finding {
  if (!reaches(diameter, dash / 32)) return { limit: dash / 32, verdict: 'outside', code: 'no_rivet' };
  const most = { limit: maximum, isMaximum: true };
  return fits
    ? { ...most, verdict: 'inside', code: 'ok' }
    : { ...most, verdict: 'outside', code: 'over_hole_maximum' };
}

function holeLine(done: Done): CheckLine {
  const { bench, hole, dash } = done;
  const limit = holeLimit(bench, dash);
  const facts: Facts = { id: 'finalHole', label: 'Hole as drilled', unit: 'in', source: limit?.source ?? '' };
  if (!hole) return notKnown(facts, lacking(bench, 'the drill that was run last'), 'final hole');
  const maximum = limit?.maximum ?? rivetHole(dash)?.shopFinal;
  if (!known(maximum))
    return notKnown(facts, `the largest hole for ${rivetName(bench.card, dash)}`, 'final hole');
  const finding = holeFinding(done, hole.diameter, maximum);
  const word = finding.isMaximum ? 'at most' : 'at least';
  return judged(facts, { value: hole.diameter, error: 0 }, finding, {
    formula: `${hole.drill} ${said(hole.diameter)}, ${word} ${said(finding.limit)} for ${rivetName(bench.card, dash)}`,
  });
}

/** The card with the edges as they were measured again: one a layer, the nearest, under the strictest of its limits. */
function measuredAgain(card: HoleCard, { edgeDistances }: AsDone): HoleCard {
  const layers = card.layers.map((layer, index) => {
    const distance = edgeDistances?.[index];
    if (distance === undefined) return { ...layer, edges: layer.edges?.length === 0 ? [] : null };
    const limits = (layer.edges ?? []).map(({ minimumD }) => minimumD).filter(known);
    return { ...layer, edges: [{ distance, minimumD: limits.length > 0 ? Math.max(...limits) : null }] };
  });
  return { ...card, layers };
}

function placeLines({ bench, asDone, planned, dash }: Done): CheckLine[] {
  const centre = planned?.centre ?? ORIGIN;
  const plan: Plan = { kind: 'leave', dash, finalHole: null, slack: 0, centreFor: () => centre };
  const again = { ...bench, card: measuredAgain(bench.card, asDone) };
  const edges = edgeChecks(again, plan);
  return bench.card.neighbours ? [...edges, ...pitchChecks(again, plan)] : edges;
}

function cleanedLine({ bench, hole, planned, dash }: Done): CheckLine[] {
  if (!hole || (planned?.kind !== 'cleanUp' && planned?.kind !== 'nextSize')) return [];
  const plan: Plan = {
    kind: planned.kind,
    dash,
    finalHole: hole,
    slack: 0,
    centreFor: (view) => view.centre,
  };
  return [cleanUpCheck(bench, plan, false)];
}

/** Never short by rounding: half a size short is the nearest half size, which the trade also drives (S1). */
function lengthFinding(driven: number, length: number): Finding {
  const least = lengthDashFor(length) / SIXTEENTHS;
  const nearest = Math.round(length * SIXTEENTHS * 2) / 2 / SIXTEENTHS;
  if (driven > least + LONG_BY)
    return { limit: least + LONG_BY, isMaximum: true, verdict: 'marginal', code: 'long_rivet' };
  if (reaches(driven, length)) return { limit: length, verdict: 'inside', code: 'ok' };
  return { limit: length, verdict: reaches(driven, nearest) ? 'marginal' : 'outside', code: 'short_rivet' };
}

function lengthLine({ bench, asDone, dash }: Done): CheckLine[] {
  const { rivetLengthDash } = asDone;
  if (!known(rivetLengthDash)) return [];
  const facts: Facts = {
    id: 'length',
    label: 'Rivet length',
    unit: 'in',
    source: sourceOf(LENGTH_BEYOND_GRIP_D),
  };
  const layers = stackOf(bench);
  if (!layers) return [notKnown(facts, lacking(bench, 'the thickness of every layer'), 'L = G + 1.5 D')];
  const { grip, length } = rivetLength({ layers, dash });
  const driven = rivetLengthDash / SIXTEENTHS;
  return [
    judged(facts, { value: driven, error: 0 }, lengthFinding(driven, length), {
      formula: `-${rivetLengthDash} is ${said(driven)}; L = ${said(grip)} + 1.5 × ${said(dash / 32)} = ${said(length)}`,
    }),
  ];
}

/**
 * Looks again at what was really done: the hole as drilled, the edges as measured, the driven head, the rivet's length.
 * `planned` is the remedy's check of the fix that was carried out; it tells the size meant and where its hole lies.
 * Inch; the same limits and sources as `fitCheck`. What was not measured is named and not judged. Never throws on a
 * valid card.
 */
export function asDoneCheck(
  holeCard: HoleCard,
  asDone: AsDone,
  planned: RemedyCheck | null = null,
): AsDoneCheck {
  const bench = layBench(holeCard);
  const hole = holeOf(asDone);
  const size = sizeOf(bench, hole, planned);
  const done: Done = { bench, asDone, planned, hole, ...size };
  const heads = asDone.shopHead ? headChecks(asDone.shopHead, done.dash, bench.limits) : [];
  const checks = [holeLine(done), ...cleanedLine(done), ...placeLines(done), ...heads, ...lengthLine(done)];
  if (!asDone.shopHead) lacking(bench, 'the driven head, width and height');
  return {
    engineVersion: ENGINE_VERSION,
    verdict: worstVerdict(checks),
    rivetDash: done.fits ? done.dash : null,
    missing: [...bench.missing],
    checks,
  };
}
