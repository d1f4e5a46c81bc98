import type { TradeTable } from './sources.js';

export const SPLICE_DIAMETERS = ['3/32', '1/8', '5/32', '3/16', '1/4'] as const;
export type SpliceDiameter = (typeof SPLICE_DIAMETERS)[number];
export const SPLICE_TABLES = ['4-9', '4-10', '4-11'] as const;
export type SpliceTable = (typeof SPLICE_TABLES)[number];

export interface SpliceRow {
  /** inch */
  readonly thickness: number;
  /** AD protruding-head rivets per inch of width; null where the circular leaves the cell empty. */
  readonly perInch: Readonly<Record<SpliceDiameter, number | null>>;
}

export interface Splices extends TradeTable<SpliceRow> {
  readonly materials: string;
}

/** Rivets per inch of a splice, AC 43.13-1B. The circular's notes: 80 % upper wing and fuselage stringers, 60 % intermediate frames, 75 % single-lap joints. */
export const SPLICES: Readonly<Record<SpliceTable, Splices>> = {
  '4-9': {
    source: ['S4'],
    how: 'part',
    materials: '2014-T6, 2024-T3, 2024-T36 and 7075-T6 sheet, bare and clad',
    rows: [
      { thickness: 0.016, perInch: { '3/32': 6.5, '1/8': 4.9, '5/32': null, '3/16': null, '1/4': null } },
      { thickness: 0.02, perInch: { '3/32': 6.9, '1/8': 4.9, '5/32': 3.9, '3/16': null, '1/4': null } },
      { thickness: 0.025, perInch: { '3/32': 8.6, '1/8': 4.9, '5/32': 3.9, '3/16': null, '1/4': null } },
      { thickness: 0.032, perInch: { '3/32': 11.1, '1/8': 6.2, '5/32': 3.9, '3/16': 3.3, '1/4': null } },
      { thickness: 0.036, perInch: { '3/32': 12.5, '1/8': 7.0, '5/32': 4.5, '3/16': 3.3, '1/4': 2.4 } },
      { thickness: 0.04, perInch: { '3/32': 13.8, '1/8': 7.7, '5/32': 5.0, '3/16': 3.5, '1/4': 2.4 } },
      { thickness: 0.051, perInch: { '3/32': null, '1/8': 9.8, '5/32': 6.4, '3/16': 4.5, '1/4': 2.5 } },
      { thickness: 0.064, perInch: { '3/32': null, '1/8': 12.3, '5/32': 8.1, '3/16': 5.6, '1/4': 3.1 } },
      { thickness: 0.081, perInch: { '3/32': null, '1/8': null, '5/32': 10.2, '3/16': 7.1, '1/4': 3.9 } },
      { thickness: 0.091, perInch: { '3/32': null, '1/8': null, '5/32': 11.4, '3/16': 7.9, '1/4': 4.4 } },
      { thickness: 0.102, perInch: { '3/32': null, '1/8': null, '5/32': 12.8, '3/16': 8.9, '1/4': 4.9 } },
      { thickness: 0.128, perInch: { '3/32': null, '1/8': null, '5/32': null, '3/16': 11.2, '1/4': 6.2 } },
    ],
  },
  '4-10': {
    source: ['S5'],
    how: 'read',
    materials: '2017, 2017 clad, 2024-T3 clad',
    rows: [
      { thickness: 0.016, perInch: { '3/32': 6.5, '1/8': 4.9, '5/32': null, '3/16': null, '1/4': null } },
      { thickness: 0.02, perInch: { '3/32': 6.5, '1/8': 4.9, '5/32': 3.9, '3/16': null, '1/4': null } },
      { thickness: 0.025, perInch: { '3/32': 6.9, '1/8': 4.9, '5/32': 3.9, '3/16': null, '1/4': null } },
      { thickness: 0.032, perInch: { '3/32': 8.9, '1/8': 4.9, '5/32': 3.9, '3/16': 3.3, '1/4': null } },
      { thickness: 0.036, perInch: { '3/32': 10.0, '1/8': 5.6, '5/32': 3.9, '3/16': 3.3, '1/4': 2.4 } },
      { thickness: 0.04, perInch: { '3/32': 11.1, '1/8': 6.2, '5/32': 4.0, '3/16': 3.3, '1/4': 2.4 } },
      { thickness: 0.051, perInch: { '3/32': null, '1/8': 7.9, '5/32': 5.1, '3/16': 3.6, '1/4': 2.4 } },
      { thickness: 0.064, perInch: { '3/32': null, '1/8': 9.9, '5/32': 6.5, '3/16': 4.5, '1/4': 2.5 } },
      { thickness: 0.081, perInch: { '3/32': null, '1/8': 12.5, '5/32': 8.1, '3/16': 5.7, '1/4': 3.1 } },
      { thickness: 0.091, perInch: { '3/32': null, '1/8': null, '5/32': 9.1, '3/16': 6.3, '1/4': 3.5 } },
      { thickness: 0.102, perInch: { '3/32': null, '1/8': null, '5/32': 10.3, '3/16': 7.1, '1/4': 3.9 } },
      { thickness: 0.128, perInch: { '3/32': null, '1/8': null, '5/32': 12.9, '3/16': 8.9, '1/4': 4.9 } },
    ],
  },
  '4-11': {
    source: ['S6'],
    how: 'read',
    materials: '5052, all tempers',
    rows: [
      { thickness: 0.016, perInch: { '3/32': 6.3, '1/8': 4.7, '5/32': null, '3/16': null, '1/4': null } },
      { thickness: 0.02, perInch: { '3/32': 6.3, '1/8': 4.7, '5/32': 3.8, '3/16': null, '1/4': null } },
      { thickness: 0.025, perInch: { '3/32': 6.3, '1/8': 4.7, '5/32': 3.8, '3/16': null, '1/4': null } },
      { thickness: 0.032, perInch: { '3/32': 6.3, '1/8': 4.7, '5/32': 3.8, '3/16': 3.2, '1/4': null } },
      { thickness: 0.036, perInch: { '3/32': 7.1, '1/8': 4.7, '5/32': 3.8, '3/16': 3.2, '1/4': 2.4 } },
      { thickness: 0.04, perInch: { '3/32': 7.9, '1/8': 4.7, '5/32': 3.8, '3/16': 3.2, '1/4': 2.4 } },
      { thickness: 0.051, perInch: { '3/32': 10.1, '1/8': 5.6, '5/32': 3.8, '3/16': 3.2, '1/4': 2.4 } },
      { thickness: 0.064, perInch: { '3/32': 12.7, '1/8': 7.0, '5/32': 4.6, '3/16': 3.2, '1/4': 2.4 } },
      { thickness: 0.081, perInch: { '3/32': null, '1/8': 8.9, '5/32': 5.8, '3/16': 4.0, '1/4': 2.4 } },
      { thickness: 0.091, perInch: { '3/32': null, '1/8': 10.0, '5/32': 6.5, '3/16': 4.5, '1/4': 2.5 } },
      { thickness: 0.102, perInch: { '3/32': null, '1/8': 11.2, '5/32': 7.3, '3/16': 5.1, '1/4': 2.8 } },
      { thickness: 0.128, perInch: { '3/32': null, '1/8': null, '5/32': 9.2, '3/16': 6.4, '1/4': 3.5 } },
    ],
  },
};
