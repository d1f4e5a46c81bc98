import type { HoleCard, HoleCardLayer } from '../card-fields.js';
import { errorOf, known, valueOf, type Measured } from '../measured.js';
import { smallestEnclosing, type Circle, type Point } from './enclosing-circle.js';

const RADIANS = Math.PI / 180;

/** The holes of the stack as one set of readings makes them. Inch, in the frame of the card. */
export interface HoleView {
  /** Diameter that all holes together need; null where a hole or its place is not known. */
  readonly minimum: number | null;
  /** Centre of that hole. */
  readonly centre: Point | null;
  /** What the known holes alone need: never more than `minimum` would be. */
  readonly atLeast: number;
  /** Each layer's own hole centre; null where nobody measured it. */
  readonly layers: readonly (Point | null)[];
}

/** The stack as read, and once more up and down by each measuring error. */
export interface HoleViews {
  readonly base: HoleView;
  readonly shaken: readonly (readonly [HoleView, HoleView])[];
}

/** One reading moved by its error: which one, and by how much. */
interface Shake {
  readonly reading: Measured;
  readonly by: number;
}

const NO_SHAKE = null;

// Readings are told apart by their identity: a reading with an error is an object of the card, a bare number has none.
function read(measured: Measured, shake: Shake | null): number {
  const value = valueOf(measured);
  return shake !== null && shake.reading === measured ? value + shake.by : value;
}

export function unitVector(angle: number): Point {
  return { x: Math.cos(angle * RADIANS), y: Math.sin(angle * RADIANS) };
}

/** Where the layer's hole lies; the first is the origin, and one not drilled yet lies on it. */
function centreOf(layer: HoleCardLayer, index: number, shake: Shake | null): Point | null {
  const { x, y } = layer.offset ?? {};
  if (known(x) && known(y)) return { x: read(x, shake), y: read(y, shake) };
  return index === 0 || layer.hole?.shape === 'none' ? { x: 0, y: 0 } : null;
}

interface LayerCircles {
  readonly circles: readonly Circle[];
  /** False where part of the hole is not known; the circles are then the least it can be. */
  readonly complete: boolean;
}

/** An oblong hole is two circles of its width, as far apart as it is longer than wide. */
function circlesOf(layer: HoleCardLayer, centre: Point | null, shake: Shake | null): LayerCircles {
  const hole = layer.hole;
  if (hole?.shape === 'none') return { circles: [], complete: true };
  if (!hole) return { circles: [], complete: false };
  const at = centre ?? { x: 0, y: 0 };
  if (hole.shape === 'round') {
    return { circles: [{ ...at, radius: read(hole.diameter, shake) / 2 }], complete: centre !== null };
  }
  const radius = read(hole.width, shake) / 2;
  const reach = Math.max(read(hole.length, shake) / 2 - radius, 0);
  if (!known(hole.angle))
    return { circles: [{ ...at, radius: radius + reach }], complete: centre !== null && reach === 0 };
  const { x, y } = unitVector(hole.angle);
  const end = (side: number): Circle => ({ x: at.x + side * reach * x, y: at.y + side * reach * y, radius });
  return { circles: [end(-1), end(1)], complete: centre !== null };
}

/** Alone, a hole of unknown place needs its own size at least. */
function leastOf(holes: readonly LayerCircles[]): number {
  const placed = smallestEnclosing(
    holes.filter(({ complete }) => complete).flatMap(({ circles }) => circles),
  );
  const unplaced = holes.filter(({ complete }) => !complete).flatMap(({ circles }) => circles);
  return 2 * Math.max(placed.radius, ...unplaced.map(({ radius }) => radius));
}

function viewOf(card: HoleCard, shake: Shake | null): HoleView {
  const layers = card.layers.map((layer, index) => centreOf(layer, index, shake));
  const holes = card.layers.map((layer, index) => circlesOf(layer, layers[index]!, shake));
  if (!holes.every(({ complete }) => complete)) {
    return { minimum: null, centre: null, atLeast: leastOf(holes), layers };
  }
  const { x, y, radius } = smallestEnclosing(holes.flatMap(({ circles }) => circles));
  return { minimum: 2 * radius, centre: { x, y }, atLeast: 2 * radius, layers };
}

/** Every reading that decides where the holes lie and how large they are. */
function holeReadings(card: HoleCard): Measured[] {
  return card.layers.flatMap(({ hole, offset }) => {
    const sizes =
      hole?.shape === 'round' ? [hole.diameter] : hole?.shape === 'oblong' ? [hole.width, hole.length] : [];
    return [...sizes, offset?.x, offset?.y].filter(known);
  });
}

/** Works out the holes as read, and again for each reading with an error, moved up and down by it. */
export function holeViews(card: HoleCard): HoleViews {
  const uncertain = holeReadings(card).filter((reading) => errorOf(reading) > 0);
  return {
    base: viewOf(card, NO_SHAKE),
    shaken: uncertain.map((reading) => [
      viewOf(card, { reading, by: errorOf(reading) }),
      viewOf(card, { reading, by: -errorOf(reading) }),
    ]),
  };
}

/** A worked-out length with the errors of all its readings combined as the root of the sum of squares. */
export interface Reading {
  readonly value: number;
  readonly error: number;
}

type Sum = (view: HoleView, locals: readonly number[]) => number | null;

/** The larger of the two moves, squared: errors add up as squares. */
function squaredMove(value: number, up: number | null, down: number | null): number {
  const move = Math.max(Math.abs((up ?? value) - value), Math.abs((down ?? value) - value));
  return move * move;
}

/**
 * Works `sum` out from the holes and from further readings, and how far it moves with the error of each of them.
 * Null where it cannot be worked out.
 */
export function reckon(views: HoleViews, locals: readonly Measured[], sum: Sum): Reading | null {
  const values = locals.map(valueOf);
  const value = sum(views.base, values);
  if (value === null) return null;
  let squares = 0;
  for (const [up, down] of views.shaken) squares += squaredMove(value, sum(up, values), sum(down, values));
  locals.forEach((local, index) => {
    const u = errorOf(local);
    if (u === 0) return;
    const moved = (by: number) => sum(views.base, values.with(index, values[index]! + by));
    squares += squaredMove(value, moved(u), moved(-u));
  });
  return { value, error: Math.sqrt(squares) };
}
