import type { Reading, SourceId } from './sources.js';

/** Strengths of one thickness range; ksi. Bearing ultimate at an edge distance of 1.5 D and of 2.0 D. */
export interface SheetRange {
  /** inch, both ends included */
  readonly from: number;
  readonly to: number;
  readonly bearing15: number;
  readonly bearing20: number;
  /** Longitudinal compressive yield; caps the buckling stress. */
  readonly compressiveYield: number | null;
}

export interface SheetAlloy {
  readonly source: readonly SourceId[];
  readonly how: Reading;
  readonly note: string;
  readonly ranges: readonly SheetRange[];
}

/** Alloys whose strength is known here. Any other name is taken; its strength is not known. */
export const SHEET_ALLOYS: Readonly<Record<string, SheetAlloy>> = {
  '2024-T3 clad': {
    source: ['S27'],
    how: 'restated',
    note: 'A-basis, QQ-A-250/5; 121 ksi at 2 D for 0.050 is also cited by S23',
    ranges: [
      { from: 0.008, to: 0.009, bearing15: 96, bearing20: 119, compressiveYield: 36 },
      { from: 0.01, to: 0.062, bearing15: 97, bearing20: 121, compressiveYield: 36 },
      { from: 0.063, to: 0.128, bearing15: 101, bearing20: 125, compressiveYield: 37 },
      { from: 0.129, to: 0.249, bearing15: 102, bearing20: 127, compressiveYield: 37 },
    ],
  },
  '2024-T3': {
    source: ['S28'],
    how: 'memory',
    note: 'bearing at 1.5 D restated by S28, at 2 D recalled',
    ranges: [{ from: 0.01, to: 0.128, bearing15: 104, bearing20: 129, compressiveYield: null }],
  },
  '6061-T6': {
    source: ['S28'],
    how: 'memory',
    note: 'bearing at 1.5 D restated by S28, at 2 D recalled',
    ranges: [{ from: 0.008, to: 0.249, bearing15: 67, bearing20: 88, compressiveYield: null }],
  },
};
export const STRENGTH_ALLOYS = Object.keys(SHEET_ALLOYS);

/** Old gauge decimals of S4 to S6 and current stock (S34 and memory), inch. */
export const SHEET_GAUGES: readonly number[] = [
  0.016, 0.02, 0.025, 0.032, 0.036, 0.04, 0.05, 0.051, 0.063, 0.064, 0.071, 0.08, 0.081, 0.09, 0.091, 0.1,
  0.102, 0.125, 0.128,
];

/** Compressive modulus of clad 2024-T3, psi (S27). */
export const CLAD_COMPRESSIVE_MODULUS = 10_700_000;
