import {
  errorOf,
  known,
  MM_PER_INCH,
  valueOf,
  type DrawnHandle,
  type HoleCard,
  type Measured,
  type Point,
  type Units,
} from '@rivetside/shared';

/** How far a point goes with one key, and with the key held down together with Shift; inch. */
export const KEY_STEPS: Readonly<Record<Units, { readonly fine: number; readonly coarse: number }>> = {
  inch: { fine: 0.001, coarse: 0.01 },
  mm: { fine: 0.05 / MM_PER_INCH, coarse: 0.5 / MM_PER_INCH },
};

/** A dragged point falls on what can be read off a caliper, so that no number is finer than the hand. */
function snapped(value: number, units: Units): number {
  const step = KEY_STEPS[units].fine;
  return Math.round(Math.round(value / step) * step * 1e9) / 1e9 + 0;
}

function withValue(measured: Measured | null | undefined, value: number, u: number): Measured {
  const error = known(measured) ? errorOf(measured) || u : u;
  return error > 0 ? { value, u: error } : value;
}

interface Pair {
  readonly x?: Measured | null | undefined;
  readonly y?: Measured | null | undefined;
}

/** Both readings of a place have one error: that of whichever was told it. */
function movedPair(pair: Pair | null | undefined, to: Point, units: Units): { x: Measured; y: Measured } {
  const { x, y } = pair ?? {};
  const u = Math.max(known(x) ? errorOf(x) : 0, known(y) ? errorOf(y) : 0);
  const part = (old: Measured | null | undefined, value: number) => {
    const next = snapped(value, units);
    return known(old) && valueOf(old) === next ? old : withValue(old, next, u);
  };
  return { x: part(x, to.x), y: part(y, to.y) };
}

const HANDLE_PATH = /^(layers|neighbours)\.(\d+)(?:\.(edges|bends)\.(\d+))?/;

function movedStraight(card: HoleCard, handle: DrawnHandle, to: Point, units: Units): HoleCard {
  const [, , layerText, list, rowText] = HANDLE_PATH.exec(handle.path)!;
  const [layer, row] = [Number(layerText), Number(rowText)];
  const rad = ((handle.along ?? 0) * Math.PI) / 180;
  const moved = (to.x - handle.at.x) * Math.cos(rad) + (to.y - handle.at.y) * Math.sin(rad);
  const move = <T extends { distance?: Measured | null | undefined }>(one: T): T => {
    const old = one.distance!;
    return { ...one, distance: withValue(old, Math.max(snapped(valueOf(old) + moved, units), 0), 0) };
  };
  const layers = card.layers.map((one, index) => {
    if (index !== layer) return one;
    if (list === 'edges')
      return { ...one, edges: one.edges!.map((edge, at) => (at === row ? move(edge) : edge)) };
    return { ...one, bends: one.bends!.map((bend, at) => (at === row ? move(bend) : bend)) };
  });
  return { ...card, layers };
}

/**
 * The card with one of its drawn points elsewhere (inch). Edges and bends go along their own direction alone; nothing
 * else of the card moves, and every measuring error stays.
 */
export function movePoint(card: HoleCard, handle: DrawnHandle, to: Point, units: Units): HoleCard {
  if (handle.along !== null) return movedStraight(card, handle, to, units);
  const index = Number(HANDLE_PATH.exec(handle.path)![2]);
  if (handle.kind === 'neighbour') {
    const neighbours = card.neighbours!.map((one, at) =>
      at === index ? { ...one, ...movedPair(one, to, units) } : one,
    );
    return { ...card, neighbours };
  }
  const layers = card.layers.map((one, at) =>
    at === index ? { ...one, offset: movedPair(one.offset, to, units) } : one,
  );
  return { ...card, layers };
}
