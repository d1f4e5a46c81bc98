import type { Reading, SourceId } from './sources.js';

/** A limit of published practice and where it stands. */
export interface Limit {
  readonly value: number;
  readonly source: readonly SourceId[];
  readonly how: Reading;
}

const limit = (value: number, how: Reading, ...source: SourceId[]): Limit => ({ value, source, how });

/** Centre of the hole to the edge, in D. */
export const EDGE_MINIMUM_D = {
  universal: limit(2, 'read', 'S7'),
  flush: limit(2.5, 'read', 'S7'),
} as const;
/** Below this no bearing value is tabulated. */
export const EDGE_FLOOR_D = limit(1.5, 'restated', 'S21');
/** Above this an edge can lift. */
export const EDGE_MAXIMUM_D = limit(4, 'read', 'S7');

/** Centre to centre, in D of the larger rivet of the pair. */
export const PITCH_MINIMUM_D = limit(3, 'read', 'S7', 'S3', 'S12');
export const PITCH_USUAL_D = limit(4, 'restated', 'S3', 'S21');
export const PITCH_MAXIMUM_D = limit(10, 'read', 'S7');

/** Widths in D: heads that must not touch. */
export const UNIVERSAL_HEAD_D = limit(2, 'memory');
export const SHOP_HEAD_D = limit(1.5, 'part', 'S13', 'S19');
/** Under this gap between heads, inch, no set gets in. */
export const HEAD_GAP_USUAL = limit(0.02, 'house');

/** Tangent of a bend to the centre of the rivet, in D, on the side of each head. */
export const BEND_MINIMUM_D = { head: limit(1, 'house'), shop: limit(0.75, 'house') } as const;
/** Nearer than half the shank the head sits on the radius itself. */
export const BEND_FLOOR_D = limit(0.5, 'house');

/** Driven head in D: rejected below, thin up to, and what it should be. */
export const SHOP_HEAD = {
  widthReject: limit(1.3, 'part', 'S9'),
  heightReject: limit(0.3, 'part', 'S9'),
  widthUsual: limit(1.4, 'house', 'S24'),
  heightUsual: limit(0.4, 'house'),
  widthNominal: limit(1.5, 'part', 'S13', 'S19'),
  heightNominal: limit(0.5, 'part', 'S13', 'S19'),
  /** Wider than this and flat: struck too often. */
  widthOver: limit(1.6, 'house'),
} as const;

/** Thinner than this in D and bearing strength is not tabulated. */
export const BEARING_THICKNESS_D = limit(0.18, 'part', 'S9');

/** Rivet length beyond the grip, in D. */
export const LENGTH_BEYOND_GRIP_D = limit(1.5, 'read', 'S3', 'S10');
export const LENGTH_STEP = limit(1 / 16, 'read', 'S12', 'S1');

/** Oversize rivets: a share of the pattern, never more than so many, never more than so many side by side. */
export const OVERSIZE_SHARE = limit(0.2, 'restated', 'S8');
export const OVERSIZE_MOST = limit(10, 'restated', 'S8');
export const OVERSIZE_ADJACENT = limit(2, 'restated', 'S8');
/** From this many rivets up one oversize is allowed, though a fifth rounds to none. */
export const OVERSIZE_ONE_FROM = limit(5, 'house');

/** Group strength after, in percent of the strength before. */
export const STRENGTH_FULL = limit(100, 'house');
export const STRENGTH_LEAST = limit(95, 'house');

/** Least sheet for a 100-degree machine countersink, inch, by dash; the table's -8 repeats its -6 and is left out as a misprint. */
export const COUNTERSINK_SHEET: {
  readonly source: readonly SourceId[];
  readonly how: Reading;
  readonly byDash: Readonly<Record<number, number>>;
} = {
  source: ['S11'],
  how: 'read',
  byDash: { 3: 0.04, 4: 0.05, 5: 0.064, 6: 0.072 },
};

/** Measuring tools and their usual error, inch. */
export const MEASURING_TOOLS = [
  { tool: 'photo', name: 'a scaled photo', error: 0.022 },
  { tool: 'rule', name: 'a steel rule', error: 0.01 },
  { tool: 'caliper', name: 'a caliper', error: 0.005 },
  { tool: 'pins', name: 'pins', error: 0.002 },
] as const;
export type MeasuringTool = (typeof MEASURING_TOOLS)[number]['tool'];
