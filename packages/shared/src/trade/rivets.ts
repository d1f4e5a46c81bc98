import type { Reading, SourceId } from './sources.js';

/** Rivet diameter in 1/32 inch; 7 is no stocked size. */
export const RIVET_DASHES = [3, 4, 5, 6, 8] as const;
export type RivetDash = (typeof RIVET_DASHES)[number];

export interface RivetHole {
  /** Hole that the strength tables count with, inch; proved by the arithmetic of S4 to S6. */
  readonly nominal: number;
  readonly nominalDrill: string;
  /** Last drill in the shop; recalled from the FAA handbook, not read. */
  readonly shopFinal: number;
  readonly shopFinalDrill: string;
  /** Largest hole that the rivet still fills, inch: house, where the kit gives none. */
  readonly maximum: number | null;
}

export const RIVET_HOLES: Readonly<Record<RivetDash, RivetHole>> = {
  3: { nominal: 0.096, nominalDrill: '#41', shopFinal: 0.098, shopFinalDrill: '#40', maximum: 0.101 },
  4: { nominal: 0.1285, nominalDrill: '#30', shopFinal: 0.1285, shopFinalDrill: '#30', maximum: 0.132 },
  5: { nominal: 0.159, nominalDrill: '#21', shopFinal: 0.159, shopFinalDrill: '#21', maximum: 0.164 },
  6: { nominal: 0.191, nominalDrill: '#11', shopFinal: 0.191, shopFinalDrill: '#11', maximum: 0.196 },
  8: { nominal: 0.257, nominalDrill: 'F', shopFinal: 0.257, shopFinalDrill: 'F', maximum: null },
};

/** Ultimate single shear of solid rivets, pound-force, by dash. */
export interface RivetShear {
  readonly alloy: string;
  readonly source: readonly SourceId[];
  readonly how: Reading;
  readonly pounds: Readonly<Record<number, number>>;
}

/**
 * MIL-HDBK-5 Table 8.1.2(b) was not to be had: recalled, but for the AD5, 596 lb, which S23 cites. They agree with
 * stress times hole area within half a percent. 2017 has two published strengths; the lower is taken.
 */
export const RIVET_SHEARS: Readonly<Record<string, RivetShear>> = {
  AD: {
    alloy: '2117-T3',
    source: ['S23'],
    how: 'memory',
    pounds: { 2: 106, 3: 217, 4: 388, 5: 596, 6: 862, 8: 1550 },
  },
  B: {
    alloy: '5056-H32',
    source: [],
    how: 'memory',
    pounds: { 2: 99, 3: 203, 4: 363, 5: 556, 6: 802, 8: 1450 },
  },
  D: {
    alloy: '2017-T31',
    source: [],
    how: 'memory',
    pounds: { 2: 120, 3: 247, 4: 442, 5: 675, 6: 977, 8: 1760 },
  },
  DD: {
    alloy: '2024-T31',
    source: [],
    how: 'memory',
    pounds: { 2: 145, 3: 296, 4: 531, 5: 815, 6: 1180, 8: 2120 },
  },
};
export const SHEAR_READ = { alloy: 'AD', dash: 5 } as const;

export interface HeadSize {
  readonly universalWidth: number;
  readonly universalHeight: number;
  readonly flushWidth: number;
  readonly flushHeight: number;
}

/** MS20470 and MS20426 heads, inch, recalled; the 100-degree cone agrees with the flush heights. */
export const RIVET_HEADS: { readonly how: Reading; readonly sizes: Readonly<Record<number, HeadSize>> } = {
  how: 'memory',
  sizes: {
    2: { universalWidth: 0.125, universalHeight: 0.027, flushWidth: 0.114, flushHeight: 0.022 },
    3: { universalWidth: 0.187, universalHeight: 0.04, flushWidth: 0.179, flushHeight: 0.036 },
    4: { universalWidth: 0.25, universalHeight: 0.054, flushWidth: 0.225, flushHeight: 0.042 },
    5: { universalWidth: 0.312, universalHeight: 0.067, flushWidth: 0.286, flushHeight: 0.055 },
    6: { universalWidth: 0.375, universalHeight: 0.08, flushWidth: 0.353, flushHeight: 0.07 },
    8: { universalWidth: 0.5, universalHeight: 0.107, flushWidth: 0.476, flushHeight: 0.095 },
  },
};

/** Rivet alloys by the letters of the call-out. */
export const RIVET_ALLOYS: Readonly<Record<string, { readonly alloy: string; readonly mark: string }>> = {
  A: { alloy: '1100-F', mark: 'plain' },
  AD: { alloy: '2117-T3/T4', mark: 'dimple' },
  D: { alloy: '2017-T4', mark: 'raised dot' },
  DD: { alloy: '2024-T4', mark: 'two raised dashes' },
  B: { alloy: '5056-H32', mark: 'raised cross' },
  M: { alloy: 'nickel-copper (monel)', mark: 'dots' },
};
