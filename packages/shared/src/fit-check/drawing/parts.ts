import type { HoleCard, HoleCardLayer } from '../card-fields.js';
import { distance, type Point } from '../geometry/enclosing-circle.js';
import { holeViews, unitVector } from '../geometry/hole-views.js';
import type { FitCheck, RemedyCheck, RemedyKind } from '../hole-card.schema.js';
import { foremostRemedy } from '../headline.js';
import { known, valueOf } from '../measured.js';
import { rivetHole } from '../sums/holes.js';
import { EDGE_MINIMUM_D } from '../../trade/limits.js';
import type { DrawnCircle, DrawnSlot } from './model.js';

/** Beyond this from the hole nothing is drawn, inch: the holes would shrink to dots. */
export const REACH = 1.25;

/** A straight line of a layer: a sheet edge or a bend tangent. */
export interface Straight {
  readonly layer: number;
  readonly index: number;
  readonly kind: 'edge' | 'bend';
  /** From the layer's own hole, inch. */
  readonly measured: number;
  readonly angle: number;
  /** The nearest point of it to the layer's own hole. */
  readonly foot: Point;
}

/** What a remedy does to the picture: where its hole lies and how large its ring is. */
export interface Scene {
  readonly card: HoleCard;
  readonly centres: readonly Point[];
  readonly straights: readonly Straight[];
  readonly neighbours: readonly { readonly index: number; readonly at: Point; readonly radius: number }[];
  readonly remedy: RemedyCheck | null;
  /** Where the rivet would sit. */
  readonly seat: Point;
  readonly dash: number;
  /** Least edge distance in D: 2, 2.5 under a flush head, or the kit maker's. */
  readonly ringD: number;
  readonly beyond: readonly Straight[];
}

function straightsOf(layer: HoleCardLayer, index: number, centre: Point): Straight[] {
  const of = (kind: 'edge' | 'bend') =>
    ((kind === 'edge' ? layer.edges : layer.bends) ?? []).flatMap(({ distance: length, angle }, at) => {
      if (!known(length) || !known(angle)) return [];
      const measured = valueOf(length);
      const toward = unitVector(angle);
      const foot = { x: centre.x + toward.x * measured, y: centre.y + toward.y * measured };
      return [{ layer: index, index: at, kind, measured, angle, foot }];
    });
  return [...of('edge'), ...of('bend')];
}

const MOVING: readonly RemedyKind[] = ['cleanUp', 'nextSize'];

/**
 * The remedy to draw: the one asked for, else the foremost where it drills. While nothing rules out leaving the hole,
 * it is drawn as found; where something does, what the next size would do is drawn, be it outside too.
 */
function drawnRemedy(check: FitCheck | null, wanted: RemedyKind | undefined): RemedyCheck | null {
  if (!check) return null;
  const of = (kind: RemedyKind) => check.remedies.find((remedy) => remedy.kind === kind) ?? null;
  if (wanted) return of(wanted);
  const foremost = foremostRemedy(check);
  if (MOVING.includes(foremost.kind)) return foremost;
  const leave = of('leave');
  return leave && leave.verdict !== 'outside' ? leave : of('nextSize');
}

function neighboursOf(card: HoleCard): Scene['neighbours'] {
  return (card.neighbours ?? []).flatMap(({ x, y, dash }, index) => {
    if (!known(x) || !known(y)) return [];
    const size = dash ?? card.rivet.dash;
    const radius = (rivetHole(size)?.nominal ?? size / 32) / 2;
    return [{ index, at: { x: valueOf(x), y: valueOf(y) }, radius }];
  });
}

export function ringOf(card: HoleCard): number {
  return card.limits?.edgeMinimumD ?? EDGE_MINIMUM_D[card.rivet.head ?? 'universal'].value;
}

/** Reads the card and the check as what is to be drawn. */
export function sceneOf(card: HoleCard, check: FitCheck | null, wanted?: RemedyKind): Scene {
  const { layers } = holeViews(card).base;
  const centres = layers.map((centre) => centre ?? { x: 0, y: 0 });
  const straights = card.layers.flatMap((layer, index) => straightsOf(layer, index, centres[index]!));
  const remedy = drawnRemedy(check, wanted);
  const seat = remedy?.finalHole && remedy.centre ? remedy.centre : centres[0]!;
  const isNear = ({ foot }: Straight) => distance(foot, seat) <= REACH;
  return {
    card,
    centres,
    straights: straights.filter(isNear),
    neighbours: neighboursOf(card),
    remedy,
    seat,
    dash: remedy?.finalHole ? (remedy.rivet?.dash ?? card.rivet.dash) : card.rivet.dash,
    ringD: ringOf(card),
    beyond: straights.filter((straight) => !isNear(straight)),
  };
}

/** Distance from the seat of the rivet to a straight line, along its own direction. */
export function fromSeat({ seat }: Scene, { foot, angle }: Straight): number {
  const toward = unitVector(angle);
  return (foot.x - seat.x) * toward.x + (foot.y - seat.y) * toward.y;
}

/** The hole of a layer as it is; none where it is not known or not drilled. */
export function holeShape({ card, centres }: Scene, layer: number): DrawnCircle | DrawnSlot | null {
  const hole = card.layers[layer]!.hole;
  const centre = centres[layer]!;
  if (!hole || hole.shape === 'none') return null;
  if (hole.shape === 'round') {
    return { kind: 'circle', role: 'hole', layer, centre, radius: valueOf(hole.diameter) / 2 };
  }
  const size = { width: valueOf(hole.width), length: valueOf(hole.length), angle: hole.angle ?? 0 };
  return { kind: 'slot', role: 'hole', layer, centre, ...size };
}

const FAR = 100;

/** An endless line square to `angle` through `foot`, cut to the frame's box (inch); null where it misses it. */
export function acrossBox(foot: Point, angle: number, box: { low: Point; high: Point }) {
  const along = unitVector(angle + 90);
  let [enter, leave] = [-FAR, FAR];
  for (const axis of ['x', 'y'] as const) {
    const step = along[axis];
    const [low, high] = [box.low[axis] - foot[axis], box.high[axis] - foot[axis]];
    if (Math.abs(step) < 1e-9) {
      if (low > 0 || high < 0) return null;
    } else {
      enter = Math.max(enter, Math.min(low / step, high / step));
      leave = Math.min(leave, Math.max(low / step, high / step));
    }
  }
  if (enter >= leave) return null;
  const at = (part: number) => ({ x: foot.x + along.x * part, y: foot.y + along.y * part });
  return { from: at(enter), to: at(leave) };
}

/** What is left of a polygon on the hole's side of a sheet edge. */
export function cutAt(polygon: readonly Point[], { foot, angle }: Straight): Point[] {
  const toward = unitVector(angle);
  const past = ({ x, y }: Point) => (x - foot.x) * toward.x + (y - foot.y) * toward.y;
  return polygon.flatMap((point, index) => {
    const next = polygon[(index + 1) % polygon.length]!;
    const [here, there] = [past(point), past(next)];
    const kept = here <= 0 ? [point] : [];
    if (here <= 0 === there <= 0) return kept;
    const part = here / (here - there);
    return [...kept, { x: point.x + (next.x - point.x) * part, y: point.y + (next.y - point.y) * part }];
  });
}
