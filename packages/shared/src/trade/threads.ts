import type { TradeTable } from './sources.js';

export interface TorqueRow {
  readonly thread: string;
  readonly series: 'fine' | 'coarse';
  /** Recommended torque, inch-pound, lowest and highest. */
  readonly tension: readonly [number, number];
  readonly shear: readonly [number, number];
  /** The circular marks the shear figure as estimated. */
  readonly estimated?: boolean;
}

/** Oil-free cadmium-plated threads, only where the kit maker gives no torque. */
export const BOLT_TORQUES: TradeTable<TorqueRow> = {
  source: ['S36', 'S37'],
  how: 'read',
  rows: [
    { thread: '8-36', series: 'fine', tension: [12, 15], shear: [7, 9] },
    { thread: '10-32', series: 'fine', tension: [20, 25], shear: [12, 15] },
    { thread: '1/4-28', series: 'fine', tension: [50, 70], shear: [30, 40] },
    { thread: '5/16-24', series: 'fine', tension: [100, 140], shear: [60, 85] },
    { thread: '3/8-24', series: 'fine', tension: [160, 190], shear: [95, 110] },
    { thread: '7/16-20', series: 'fine', tension: [450, 500], shear: [270, 300] },
    { thread: '1/2-20', series: 'fine', tension: [480, 690], shear: [290, 410] },
    { thread: '9/16-18', series: 'fine', tension: [800, 1000], shear: [480, 600] },
    { thread: '5/8-18', series: 'fine', tension: [1100, 1300], shear: [600, 780] },
    { thread: '3/4-16', series: 'fine', tension: [2300, 2500], shear: [1300, 1500] },
    { thread: '7/8-14', series: 'fine', tension: [2500, 3000], shear: [1500, 1800] },
    { thread: '1-14', series: 'fine', tension: [3700, 5500], shear: [2200, 3300], estimated: true },
    { thread: '1-1/8-12', series: 'fine', tension: [5000, 7000], shear: [3000, 4200], estimated: true },
    { thread: '1-1/4-12', series: 'fine', tension: [9000, 11000], shear: [5400, 6600], estimated: true },
    { thread: '8-32', series: 'coarse', tension: [12, 15], shear: [7, 9] },
    { thread: '10-24', series: 'coarse', tension: [20, 25], shear: [12, 15] },
    { thread: '1/4-20', series: 'coarse', tension: [40, 50], shear: [25, 30] },
    { thread: '5/16-18', series: 'coarse', tension: [80, 90], shear: [48, 55] },
    { thread: '3/8-16', series: 'coarse', tension: [160, 185], shear: [95, 100] },
    { thread: '7/16-14', series: 'coarse', tension: [235, 255], shear: [140, 155] },
    { thread: '1/2-13', series: 'coarse', tension: [400, 480], shear: [240, 290] },
    { thread: '9/16-12', series: 'coarse', tension: [500, 700], shear: [300, 420] },
    { thread: '5/8-11', series: 'coarse', tension: [700, 900], shear: [420, 540] },
    { thread: '3/4-10', series: 'coarse', tension: [1150, 1600], shear: [700, 950] },
    { thread: '7/8-9', series: 'coarse', tension: [2200, 3000], shear: [1300, 1800] },
  ],
};

export interface ThreadRow {
  readonly thread: string;
  /** inch */
  readonly major: number;
  readonly tapDrill: string;
  readonly tapDiameter: number;
  readonly closeDrill: string;
  readonly closeDiameter: number;
  readonly freeDrill: string;
  readonly freeDiameter: number;
}

/** About 75 % thread; close and free clearance holes. */
export const THREADS: TradeTable<ThreadRow> = {
  source: ['S38'],
  how: 'read',
  rows: [
    {
      thread: '4-40',
      major: 0.112,
      tapDrill: '#43',
      tapDiameter: 0.089,
      closeDrill: '#32',
      closeDiameter: 0.116,
      freeDrill: '#30',
      freeDiameter: 0.1285,
    },
    {
      thread: '4-48',
      major: 0.112,
      tapDrill: '#42',
      tapDiameter: 0.0935,
      closeDrill: '#32',
      closeDiameter: 0.116,
      freeDrill: '#30',
      freeDiameter: 0.1285,
    },
    {
      thread: '6-32',
      major: 0.138,
      tapDrill: '#36',
      tapDiameter: 0.1065,
      closeDrill: '#27',
      closeDiameter: 0.144,
      freeDrill: '#25',
      freeDiameter: 0.1495,
    },
    {
      thread: '6-40',
      major: 0.138,
      tapDrill: '#33',
      tapDiameter: 0.113,
      closeDrill: '#27',
      closeDiameter: 0.144,
      freeDrill: '#25',
      freeDiameter: 0.1495,
    },
    {
      thread: '8-32',
      major: 0.164,
      tapDrill: '#29',
      tapDiameter: 0.136,
      closeDrill: '#18',
      closeDiameter: 0.1695,
      freeDrill: '#16',
      freeDiameter: 0.177,
    },
    {
      thread: '8-36',
      major: 0.164,
      tapDrill: '#29',
      tapDiameter: 0.136,
      closeDrill: '#18',
      closeDiameter: 0.1695,
      freeDrill: '#16',
      freeDiameter: 0.177,
    },
    {
      thread: '10-24',
      major: 0.19,
      tapDrill: '#25',
      tapDiameter: 0.1495,
      closeDrill: '#9',
      closeDiameter: 0.196,
      freeDrill: '#7',
      freeDiameter: 0.201,
    },
    {
      thread: '10-32',
      major: 0.19,
      tapDrill: '#21',
      tapDiameter: 0.159,
      closeDrill: '#9',
      closeDiameter: 0.196,
      freeDrill: '#7',
      freeDiameter: 0.201,
    },
    {
      thread: '12-24',
      major: 0.216,
      tapDrill: '#16',
      tapDiameter: 0.177,
      closeDrill: '#2',
      closeDiameter: 0.221,
      freeDrill: '#1',
      freeDiameter: 0.228,
    },
    {
      thread: '12-28',
      major: 0.216,
      tapDrill: '#14',
      tapDiameter: 0.182,
      closeDrill: '#2',
      closeDiameter: 0.221,
      freeDrill: '#1',
      freeDiameter: 0.228,
    },
    {
      thread: '1/4-20',
      major: 0.25,
      tapDrill: '#7',
      tapDiameter: 0.201,
      closeDrill: 'F',
      closeDiameter: 0.257,
      freeDrill: 'H',
      freeDiameter: 0.266,
    },
    {
      thread: '1/4-28',
      major: 0.25,
      tapDrill: '#3',
      tapDiameter: 0.213,
      closeDrill: 'F',
      closeDiameter: 0.257,
      freeDrill: 'H',
      freeDiameter: 0.266,
    },
  ],
};
