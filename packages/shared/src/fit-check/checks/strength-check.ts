import { BEARING_THICKNESS_D, EDGE_FLOOR_D, STRENGTH_FULL } from '../../trade/limits.js';
import { RIVET_SHEARS, SHEAR_READ } from '../../trade/rivets.js';
import { SHEET_ALLOYS } from '../../trade/sheets.js';
import {
  HOLES_MISSING,
  lacking,
  layerName,
  planDiameter,
  rivetName,
  type Bench,
  type Plan,
} from '../bench.js';
import type { CheckCode, CheckLine, Verdict } from '../hole-card.schema.js';
import { known, said, valueOf } from '../measured.js';
import { reaches } from '../sums/require.js';
import { bearingStressAt, sheetRange, shearOf, strengthVerdict } from '../sums/strength.js';
import { rivetHole } from '../sums/holes.js';
import { distanceAfter } from './edge-checks.js';
import { judged, notKnown, sourceOf, type Facts } from './judge.js';

/** With nothing near, bearing is full. */
const FAR = Infinity;
const METHOD = 'after / before, each the lesser of shear and bearing';

/** The nearest edge of a layer after the remedy, inch; null while it is not known. */
function nearestEdge(bench: Bench, plan: Plan, layer: number): number | null {
  const { edges } = bench.card.layers[layer]!;
  if (!edges) return null;
  const distances = edges.map(({ distance, angle }) =>
    known(distance) ? (distanceAfter(bench, plan, layer, { distance, angle })?.value ?? null) : null,
  );
  return distances.every(known) ? Math.min(FAR, ...distances) : null;
}

interface Strength {
  readonly pounds: number;
  readonly critical: string;
}

/** The least of the rivet's shear and the bearing of every layer; null where a bearing is not tabulated at that edge. */
function strengthOf(bench: Bench, plan: Plan, edges: readonly number[]): Strength | null {
  const { card } = bench;
  const hole = rivetHole(plan.dash)!;
  const shear = { pounds: shearOf(card.rivet.alloy!, plan.dash)!, critical: 'shear of the rivet' };
  const bearings = card.layers.map((layer, index) => {
    const thickness = valueOf(layer.thickness!);
    const stress = bearingStressAt(sheetRange(layer.alloy!, thickness)!, edges[index]! / planDiameter(plan));
    if (stress === null) return null;
    return {
      pounds: stress * 1000 * hole.nominal * thickness,
      critical: `bearing of ${layerName(card, index)}`,
    };
  });
  if (!bearings.every(known)) return null;
  return [shear, ...bearings].reduce((least, one) => (one.pounds < least.pounds ? one : least));
}

/** What keeps the strength from being worked out. */
interface Gap {
  readonly what: string;
  readonly code: CheckCode;
}

function sheetGap(bench: Bench, layer: number): Gap | null {
  const { alloy, thickness, edges } = bench.card.layers[layer]!;
  const name = layerName(bench.card, layer);
  const notMeasured = (what: string): Gap => ({ what: lacking(bench, what), code: 'not_measured' });
  if (!known(alloy) || alloy === '') return notMeasured(`the alloy of ${name}`);
  if (!known(thickness)) return notMeasured(`the thickness of ${name}`);
  if (!SHEET_ALLOYS[alloy]) return { what: `the strength of ${alloy}`, code: 'unknown_alloy' };
  if (!sheetRange(alloy, valueOf(thickness))) {
    return { what: `the strength of ${alloy} at ${said(valueOf(thickness))} in`, code: 'not_tabulated' };
  }
  return edges ? null : notMeasured(`the edges near the hole in ${name} (none is an answer too)`);
}

function rivetGap(bench: Bench, dashes: readonly number[]): Gap | null {
  const { rivet, group } = bench.card;
  if (!known(rivet.alloy) || rivet.alloy === '') {
    return { what: lacking(bench, 'the alloy of the rivet'), code: 'not_measured' };
  }
  if (!RIVET_SHEARS[rivet.alloy])
    return { what: `the strength of ${rivet.alloy} rivets`, code: 'unknown_alloy' };
  const untold = dashes.find((dash) => shearOf(rivet.alloy!, dash) === null || !rivetHole(dash));
  if (untold) return { what: `the strength of ${rivetName(bench.card, untold)}`, code: 'not_tabulated' };
  if (known(group?.count)) return null;
  return { what: lacking(bench, 'how many rivets share the load'), code: 'not_measured' };
}

function gapOf(bench: Bench, dashes: readonly number[]): Gap | null {
  const sheets = bench.card.layers.map((_, layer) => sheetGap(bench, layer));
  return rivetGap(bench, dashes) ?? sheets.find(known) ?? null;
}

function sourcesOf(bench: Bench, plan: Plan): string {
  const alloys = [...new Set(bench.card.layers.map(({ alloy }) => alloy ?? ''))];
  const sheets = alloys.filter((alloy) => SHEET_ALLOYS[alloy]).map((alloy) => sourceOf(SHEET_ALLOYS[alloy]!));
  const shear = RIVET_SHEARS[bench.card.rivet.alloy ?? ''];
  const wasRead = bench.card.rivet.alloy === SHEAR_READ.alloy && plan.dash === SHEAR_READ.dash;
  const sheared = shear ? sourceOf({ source: shear.source, how: wasRead ? 'restated' : shear.how }) : '';
  return [...new Set([sourceOf(BEARING_THICKNESS_D), ...sheets, `shear ${sheared}`])].join('; ');
}

function tooThin(bench: Bench, plan: Plan): boolean {
  return bench.card.layers.some(
    ({ thickness }) => !reaches(valueOf(thickness!) / planDiameter(plan), BEARING_THICKNESS_D.value),
  );
}

interface Outcome {
  readonly verdict: Verdict;
  readonly code: CheckCode;
}

function outcomeOf(percent: number, thin: boolean): Outcome {
  const verdict = strengthVerdict(percent);
  if (verdict === 'outside') return { verdict, code: 'needs_compensation' };
  if (thin) return { verdict: 'marginal', code: 'not_tabulated' };
  return { verdict, code: verdict === 'inside' ? 'ok' : 'weaker' };
}

function remarkOf(bench: Bench, before: Strength, after: Strength): string | null {
  const changed = before.critical !== after.critical;
  const flush = bench.card.rivet.head === 'flush';
  const remarks = [
    changed ? `What gives first changes from ${before.critical} to ${after.critical}.` : '',
    flush ? 'Flush joint: advisory, the method overstates thin countersunk sheet.' : '',
  ];
  return remarks.filter(Boolean).join(' ') || null;
}

function assume(bench: Bench, count: number): void {
  if (count > 1) bench.assumptions.add('The rivets of the pattern share the load equally.');
  if (bench.card.rivet.alloy === 'D') {
    bench.assumptions.add('2017 rivets are taken at the lower of their two recalled strengths.');
  }
}

/** The group after the remedy in percent of the group as drawn, one rivet changed. `drawn` is the card as it stands. */
export function strengthCheck(bench: Bench, drawn: Plan, plan: Plan): CheckLine {
  const named: Facts = {
    id: 'strength',
    label: 'Strength of the group',
    unit: 'percent',
    source: sourcesOf(bench, plan),
  };
  const gap = gapOf(bench, [drawn.dash, plan.dash]);
  if (gap) return { ...notKnown(named, gap.what, METHOD), code: gap.code };
  const layers = bench.card.layers.map((_, layer) => layer);
  const edgesBefore = layers.map((layer) => nearestEdge(bench, drawn, layer));
  const edgesAfter = layers.map((layer) => nearestEdge(bench, plan, layer));
  if (!edgesBefore.every(known) || !edgesAfter.every(known)) {
    return notKnown(
      named,
      plan.centreFor(bench.views.base, 0) ? 'the edges of every layer' : lacking(bench, HOLES_MISSING),
      METHOD,
    );
  }
  const before = strengthOf(bench, drawn, edgesBefore);
  const after = strengthOf(bench, plan, edgesAfter);
  if (!before || !after) {
    const line = notKnown(
      named,
      `bearing strength, which is not tabulated below ${EDGE_FLOOR_D.value} D`,
      METHOD,
    );
    return { ...line, code: 'below_floor' };
  }
  return strengthLine(bench, plan, named, { before, after });
}

function strengthLine(
  bench: Bench,
  plan: Plan,
  facts: Facts,
  { before, after }: { readonly before: Strength; readonly after: Strength },
): CheckLine {
  const count = bench.card.group!.count!;
  assume(bench, count);
  const whole = count * before.pounds;
  const repaired = (count - 1) * before.pounds + after.pounds;
  const percent = (100 * repaired) / whole;
  const outcome = outcomeOf(percent, tooThin(bench, plan));
  const remark = remarkOf(bench, before, after);
  const finding = { limit: STRENGTH_FULL.value, verdict: outcome.verdict, code: outcome.code };
  const line = judged(facts, { value: percent, error: 0 }, finding, {
    formula: `${repaired.toFixed(1)} / ${whole.toFixed(1)} lb = ${percent.toFixed(1)} %`,
    remark,
  });
  if (outcome.code !== 'not_tabulated') return line;
  // A percentage of what nobody tabulated would only comfort.
  const untold = 'Not tabulated for a sheet as thin as that: the percentage is left out.';
  return {
    ...line,
    value: null,
    margin: null,
    formula: METHOD,
    remark: [untold, remark].filter(Boolean).join(' '),
  };
}
