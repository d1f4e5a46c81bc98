import { createHash } from 'node:crypto';
import { type HoleCard, known, type Measured, valueOf } from '@rivetside/shared';
import type { SeedPhoto } from '../seed.schema.js';

/** The field that scenes are drawn on. */
export const WIDE = 1_440;
export const HIGH = 1_080;
/** What comes out, in points: fewer, as every start of a new demo waits for them. */
export const POINTS_WIDE = 1_200;
export const POINTS_HIGH = 900;

export interface Point {
  readonly x: number;
  readonly y: number;
}
/** From 0 to 1; the same order at every start. */
export type Lot = () => number;

export interface Shot {
  readonly photo: SeedPhoto;
  readonly card: HoleCard | null;
  readonly lot: Lot;
}

/** Three layers: what is metal is brushed or sprayed, what is behind and what lies on it is not. */
export interface Picture {
  /** The bench, or the shop far out of focus. Not seen where the metal fills the frame. */
  readonly behind?: { readonly drawn: string; readonly far: boolean };
  readonly ground: string;
  readonly things: string;
  readonly skin: Skin;
}
export type Skin = 'brushed' | 'sprayed' | 'plain';
export type Scene = (shot: Shot) => Picture;

export function lotsOf(name: string): Lot {
  let state = createHash('sha256').update(name).digest().readUInt32LE(0);
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 4_294_967_296;
  };
}

/** Where a mark of the photo points; its middle where it has none. */
export function spot({ photo }: Shot, number = 0): Point {
  const { x, y } = photo.marks[number] ?? { x: 0.5, y: 0.5 };
  return { x: x * WIDE, y: y * HIGH };
}

export const n = (value: number) => value.toFixed(1);

/** Held a little out of true, about the point that matters. */
export const turned = (degrees: number, { x, y }: Point, drawn: string) =>
  `<g transform="rotate(${n(degrees)} ${n(x)} ${n(y)})">${drawn}</g>`;

export const range = (from: number, to: number) =>
  Array.from({ length: to - from + 1 }, (_, at) => from + at);

/** A photo whose scale stands on a number that its card does not have cannot be drawn. */
function told(value: Measured | null | undefined, what: string): number {
  if (!known(value)) throw new Error(`The card of this photo tells no ${what}.`);
  return valueOf(value);
}

/** The measured edge distance of a layer on the card, inch. */
export const edgeOf = (card: HoleCard | null, layer: number): number =>
  told(card?.layers[layer]?.edges?.[0]?.distance, 'edge distance');

/** How far a layer's hole lies off, inch, up and to the right positive as on the card. */
export function offsetOf(card: HoleCard | null, layer: number): Point {
  const offset = card?.layers[layer]?.offset;
  return { x: told(offset?.x, 'offset'), y: told(offset?.y, 'offset') };
}
