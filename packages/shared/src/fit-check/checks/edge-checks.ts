import { EDGE_FLOOR_D, EDGE_MINIMUM_D, EDGE_MAXIMUM_D } from '../../trade/limits.js';
import {
  directionName,
  HOLES_MISSING,
  lacking,
  layerName,
  planDiameter,
  signed,
  type Bench,
  type Plan,
} from '../bench.js';
import type { LayerEdge } from '../card-fields.js';
import { reckon, unitVector, type HoleView, type Reading } from '../geometry/hole-views.js';
import type { CheckCode, CheckLine, Verdict } from '../hole-card.schema.js';
import { known, said, valueOf, type Measured } from '../measured.js';
import { reaches } from '../sums/require.js';
import {
  againstMinimum,
  judged,
  notKnown,
  settledBy,
  sourceOf,
  type Facts,
  type Finding,
  type Side,
} from './judge.js';

const EDGE_SOURCES = { universal: sourceOf(EDGE_MINIMUM_D.universal), flush: sourceOf(EDGE_MINIMUM_D.flush) };

export interface EdgeLimit {
  /** In D. */
  readonly minimum: number;
  readonly source: string;
}

/** The limit of an edge: its own, else the kit maker's on the hole line, else the published one; null without a head. */
export function edgeLimit(bench: Bench, edge: Pick<LayerEdge, 'minimumD'>): EdgeLimit | null {
  const own = edge.minimumD;
  if (known(own))
    return { minimum: own, source: bench.limits?.source ?? 'the kit maker’s limit for this edge' };
  const kit = bench.limits?.edgeMinimumD;
  if (known(kit)) return { minimum: kit, source: bench.limits!.source };
  const head = bench.card.rivet.head;
  if (!known(head)) return null;
  return { minimum: EDGE_MINIMUM_D[head].value, source: EDGE_SOURCES[head] };
}

/** How far the finished hole moves toward something that lies in direction `angle` from the layer's own hole. */
function shiftToward(
  view: HoleView,
  plan: Plan,
  layer: number,
  angle: number | null | undefined,
): number | null {
  const own = view.layers[layer] ?? null;
  const centre = plan.centreFor(view, layer);
  if (plan.kind === 'leave') return 0;
  if (!own || !centre) return null;
  const [x, y] = [centre.x - own.x, centre.y - own.y];
  if (Math.hypot(x, y) < 1e-12) return 0;
  if (!known(angle)) return null;
  const toward = unitVector(angle);
  return x * toward.x + y * toward.y;
}

/** The distance from the finished hole's centre to what was measured from the layer's own hole, inch. */
export function distanceAfter(
  bench: Bench,
  plan: Plan,
  layer: number,
  line: { readonly distance: Measured; readonly angle?: number | null | undefined },
): Reading | null {
  return reckon(bench.views, [line.distance], (view, [measured]) => {
    const shift = shiftToward(view, plan, layer, line.angle);
    return shift === null ? null : measured! - shift;
  });
}

/** What keeps the distance to a layer's `what` (edge, bend) from being worked out, in words. */
export function whatIsMissing(bench: Bench, plan: Plan, layer: number, what: string): string {
  const name = layerName(bench.card, layer);
  const { base } = bench.views;
  if (!base.layers[layer]) return lacking(bench, `how far the hole in ${name} lies from the first hole`);
  if (!plan.centreFor(base, layer)) return lacking(bench, HOLES_MISSING);
  return lacking(bench, `on which side the ${what} of ${name} lies`);
}

const OUTCOMES: Readonly<Record<Side, Verdict>> = {
  inside: 'inside',
  outside: 'outside',
  tooClose: 'marginal',
};

function edgeCodeOf(side: Side, ratio: number): CheckCode {
  if (side === 'tooClose') return 'too_close_to_call';
  if (side === 'inside') return 'ok';
  return reaches(ratio, EDGE_FLOOR_D.value) ? 'below_minimum' : 'below_floor';
}

function edgeFinding(side: Side, ratio: number, limit: number): Finding {
  return { limit, verdict: OUTCOMES[side], code: edgeCodeOf(side, ratio) };
}

function edgeRemark(side: Side, plan: Plan, after: Reading, minimum: number): string | null {
  const diameter = planDiameter(plan);
  const ratio = after.value / diameter;
  if (side === 'tooClose') return settledBy(after.value - minimum * diameter);
  if (side === 'outside' && plan.slack > 0) {
    const best = after.value + plan.slack / 2;
    return `With all the slack used away from this edge ${said(best)}, ${said(best / diameter)} D.`;
  }
  const beyond = ratio > EDGE_MAXIMUM_D.value;
  return beyond ? 'Beyond 4 D: only the row nearest an edge is meant by that limit (S7).' : null;
}

function edgeFormula(measured: number, after: number, diameter: number, minimum: number): string {
  const shift = after - measured;
  const moved =
    Math.abs(shift) < 1e-9
      ? `e = ${said(measured)}`
      : `e = ${said(measured)} ${signed(shift)} = ${said(after)}`;
  return `${moved}; e / D = ${said(after)} / ${said(diameter)} = ${said(after / diameter)}, at least ${minimum}`;
}

function edgeLine(bench: Bench, plan: Plan, layer: number, index: number): CheckLine {
  const edge = bench.card.layers[layer]!.edges![index]!;
  const where = known(edge.angle) ? `, ${directionName(edge.angle)}` : '';
  const name = `Edge, ${layerName(bench.card, layer)}${where}`;
  const limit = edgeLimit(bench, edge);
  const facts: Facts = {
    id: `edge:${layer}:${index}`,
    label: name,
    unit: 'D',
    source: limit?.source ?? '',
  };
  if (!known(edge.distance)) {
    const missing = lacking(bench, `the edge of ${layerName(bench.card, layer)}, centre to edge`);
    return notKnown(facts, missing, 'e / D');
  }
  if (!limit) return notKnown(facts, lacking(bench, 'the rivet head, universal or flush'), 'e / D');
  const after = distanceAfter(bench, plan, layer, { distance: edge.distance, angle: edge.angle });
  if (!after)
    return notKnown(facts, whatIsMissing(bench, plan, layer, 'edge'), 'e / D, moved with the centre');
  const diameter = planDiameter(plan);
  const reading = { value: after.value / diameter, error: after.error / diameter };
  const side = againstMinimum(reading, limit.minimum);
  return judged(facts, reading, edgeFinding(side, reading.value, limit.minimum), {
    formula: edgeFormula(valueOf(edge.distance), after.value, diameter, limit.minimum),
    remark: edgeRemark(side, plan, after, limit.minimum),
  });
}

const CORNER_SHARPEST = 30;

/** Angle between two edges' directions, 0 to 180 degrees. */
function between(one: number, other: number): number {
  const turn = Math.abs(one - other) % 360;
  return turn > 180 ? 360 - turn : turn;
}

interface Corner {
  readonly turn: number;
  readonly edges: readonly [LayerEdge, LayerEdge];
}

/** Pairs of edges that meet in a corner: neither on one side nor on opposite sides of the hole. */
function cornersOf(edges: readonly LayerEdge[]): Corner[] {
  const placed = edges.filter(({ distance, angle }) => known(distance) && known(angle));
  return placed.flatMap((one, index) =>
    placed.slice(index + 1).flatMap((other) => {
      const turn = between(one.angle!, other.angle!);
      const meets = turn >= CORNER_SHARPEST && turn <= 180 - CORNER_SHARPEST;
      return meets ? [{ turn, edges: [one, other] as const }] : [];
    }),
  );
}

/** From the hole's centre to the point where two edges meet. */
function diagonal(first: number, second: number, turn: number): number {
  const rad = (turn * Math.PI) / 180;
  return Math.sqrt(first ** 2 + second ** 2 - 2 * first * second * Math.cos(rad)) / Math.sin(rad);
}

function diagonalAfter(bench: Bench, plan: Plan, layer: number, { turn, edges }: Corner): Reading | null {
  return reckon(
    bench.views,
    edges.map(({ distance }) => distance!),
    (view, [first, second]) => {
      const shifts = edges.map(({ angle }) => shiftToward(view, plan, layer, angle));
      const [one, other] = shifts;
      return known(one) && known(other) ? diagonal(first! - one, second! - other, turn) : null;
    },
  );
}

function cornerLine(bench: Bench, plan: Plan, layer: number): CheckLine | null {
  const corners = cornersOf(bench.card.layers[layer]!.edges ?? []);
  const readings = corners.flatMap((corner) => {
    const reading = diagonalAfter(bench, plan, layer, corner);
    const limits = corner.edges.map((edge) => edgeLimit(bench, edge)).filter(known);
    const limit = limits.reduce<EdgeLimit | null>((a, b) => (a && a.minimum >= b.minimum ? a : b), null);
    return reading && limit ? [{ reading, limit }] : [];
  });
  if (readings.length === 0) return null;
  const { reading: inches, limit } = readings.reduce((a, b) => (b.reading.value < a.reading.value ? b : a));
  const diameter = planDiameter(plan);
  const reading = { value: inches.value / diameter, error: inches.error / diameter };
  const side = againstMinimum(reading, limit.minimum);
  const facts: Facts = {
    id: `corner:${layer}`,
    label: `Corner, ${layerName(bench.card, layer)}`,
    unit: 'D',
    source: limit.source,
  };
  return judged(facts, reading, edgeFinding(side, reading.value, limit.minimum), {
    formula: `to the corner ${said(inches.value)} / ${said(diameter)} = ${said(reading.value)}, at least ${limit.minimum}`,
    remark: side === 'tooClose' ? settledBy(inches.value - limit.minimum * diameter) : null,
  });
}

/** Every edge of every layer in D of the plan's rivet, and the corner where two of them meet. */
export function edgeChecks(bench: Bench, plan: Plan): CheckLine[] {
  return bench.card.layers.flatMap(({ edges }, layer) => {
    if (!edges) {
      const name = layerName(bench.card, layer);
      const missing = lacking(bench, `the edges near the hole in ${name} (none is an answer too)`);
      const facts = { id: `edge:${layer}:0`, label: `Edge, ${name}`, unit: 'D' as const, source: '' };
      return [notKnown(facts, missing, 'e / D')];
    }
    const lines = edges.map((_, index) => edgeLine(bench, plan, layer, index));
    const corner = cornerLine(bench, plan, layer);
    return corner ? [...lines, corner] : lines;
  });
}
