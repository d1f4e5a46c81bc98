import type { TradeTable } from './sources.js';

export type DrillSeries = 'number' | 'letter' | 'fraction';
/** Name as it is said in the shop, and diameter in inches. */
export type DrillRow = readonly [name: string, diameter: number];

/** Two public codes agree on every entry but #69 (0.0292 and 0.02925). */
export const NUMBER_DRILLS: TradeTable<DrillRow> = {
  source: ['S20'],
  how: 'restated',
  rows: [
    ['#80', 0.0135],
    ['#79', 0.0145],
    ['#78', 0.016],
    ['#77', 0.018],
    ['#76', 0.02],
    ['#75', 0.021],
    ['#74', 0.0225],
    ['#73', 0.024],
    ['#72', 0.025],
    ['#71', 0.026],
    ['#70', 0.028],
    ['#69', 0.0292],
    ['#68', 0.031],
    ['#67', 0.032],
    ['#66', 0.033],
    ['#65', 0.035],
    ['#64', 0.036],
    ['#63', 0.037],
    ['#62', 0.038],
    ['#61', 0.039],
    ['#60', 0.04],
    ['#59', 0.041],
    ['#58', 0.042],
    ['#57', 0.043],
    ['#56', 0.0465],
    ['#55', 0.052],
    ['#54', 0.055],
    ['#53', 0.0595],
    ['#52', 0.0635],
    ['#51', 0.067],
    ['#50', 0.07],
    ['#49', 0.073],
    ['#48', 0.076],
    ['#47', 0.0785],
    ['#46', 0.081],
    ['#45', 0.082],
    ['#44', 0.086],
    ['#43', 0.089],
    ['#42', 0.0935],
    ['#41', 0.096],
    ['#40', 0.098],
    ['#39', 0.0995],
    ['#38', 0.1015],
    ['#37', 0.104],
    ['#36', 0.1065],
    ['#35', 0.11],
    ['#34', 0.111],
    ['#33', 0.113],
    ['#32', 0.116],
    ['#31', 0.12],
    ['#30', 0.1285],
    ['#29', 0.136],
    ['#28', 0.1405],
    ['#27', 0.144],
    ['#26', 0.147],
    ['#25', 0.1495],
    ['#24', 0.152],
    ['#23', 0.154],
    ['#22', 0.157],
    ['#21', 0.159],
    ['#20', 0.161],
    ['#19', 0.166],
    ['#18', 0.1695],
    ['#17', 0.173],
    ['#16', 0.177],
    ['#15', 0.18],
    ['#14', 0.182],
    ['#13', 0.185],
    ['#12', 0.189],
    ['#11', 0.191],
    ['#10', 0.1935],
    ['#9', 0.196],
    ['#8', 0.199],
    ['#7', 0.201],
    ['#6', 0.204],
    ['#5', 0.2055],
    ['#4', 0.209],
    ['#3', 0.213],
    ['#2', 0.221],
    ['#1', 0.228],
  ],
};

export const LETTER_DRILLS: TradeTable<DrillRow> = {
  source: ['S20'],
  how: 'restated',
  rows: [
    ['A', 0.234],
    ['B', 0.238],
    ['C', 0.242],
    ['D', 0.246],
    ['E', 0.25],
    ['F', 0.257],
    ['G', 0.261],
    ['H', 0.266],
    ['I', 0.272],
    ['J', 0.277],
    ['K', 0.281],
    ['L', 0.29],
    ['M', 0.295],
    ['N', 0.302],
    ['O', 0.316],
    ['P', 0.323],
    ['Q', 0.332],
    ['R', 0.339],
    ['S', 0.348],
    ['T', 0.358],
    ['U', 0.368],
    ['V', 0.377],
    ['W', 0.386],
    ['X', 0.397],
    ['Y', 0.404],
    ['Z', 0.413],
  ],
};

const SIXTY_FOURTHS = 32;

function lowestTerms(sixtyFourths: number): string {
  let [over, under] = [sixtyFourths, 64];
  while (over % 2 === 0) [over, under] = [over / 2, under / 2];
  return `${over}/${under}`;
}

/** Exact arithmetic, n/64 up to 1/2 inch. */
export const FRACTION_DRILLS: TradeTable<DrillRow> = {
  source: [],
  how: 'derived',
  rows: Array.from(
    { length: SIXTY_FOURTHS },
    (_, index) => [lowestTerms(index + 1), (index + 1) / 64] as const,
  ),
};

export interface Drill {
  readonly name: string;
  /** inch */
  readonly diameter: number;
  readonly series: DrillSeries;
}

const drillsOf = (table: TradeTable<DrillRow>, series: DrillSeries): Drill[] =>
  table.rows.map(([name, diameter]) => ({ name, diameter, series }));

/** All drills together, smallest first. A letter or number comes before a fraction of the same size (E before 1/4). */
export const DRILLS: readonly Drill[] = [
  ...drillsOf(NUMBER_DRILLS, 'number'),
  ...drillsOf(LETTER_DRILLS, 'letter'),
  ...drillsOf(FRACTION_DRILLS, 'fraction'),
].sort((one, other) => one.diameter - other.diameter);
