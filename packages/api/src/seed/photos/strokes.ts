import { n } from './frame.js';

/** Drawn, not set: a machine that runs this may have no letters installed. On a field of 10 by 16. */
const STROKES: Readonly<Record<string, string>> = {
  '0': 'M5 0C1 0 0 4 0 8S1 16 5 16 10 12 10 8 9 0 5 0Z',
  '1': 'M2 3L6 0V16',
  '2': 'M0 4C0-1 10-1 10 4C10 8 2 11 0 16H10',
  '3': 'M0 2C3-1 10-1 10 4C10 7 7 8 4 8C8 8 10 9 10 12C10 17 3 17 0 14',
  '4': 'M8 16V0L0 11H10',
  '5': 'M9 0H2L1 7C4 5 10 6 10 11C10 17 3 17 0 14',
  '6': 'M8 0C3 2 0 7 0 11C0 18 10 18 10 11C10 6 2 6 0 11',
  '7': 'M0 0H10L4 16',
  '8': 'M5 8C-1 8-1 0 5 0S11 8 5 8C-2 8-2 16 5 16S12 8 5 8',
  '9': 'M10 5C10-2 0-2 0 5C0 10 8 10 10 5C10 10 8 14 5 16',
  '-': 'M1 8H9',
  '.': 'M4 15.5h1.5',
  '/': 'M0 16L10 0',
  '°': 'M3 0C0 0 0 5 3 5S6 0 3 0Z',
  A: 'M0 16L5 0L10 16M2 10H8',
  B: 'M1 0V16H5C11 16 11 8 5 8H1M5 8C10 8 10 0 5 0H1',
  D: 'M1 0V16H4C12 16 12 0 4 0Z',
  I: 'M5 0V16',
  R: 'M1 16V0H6C11 0 11 8 6 8H1M5 8L10 16',
  L: 'M1 0V16H9',
};

interface Written {
  readonly x: number;
  readonly y: number;
  readonly high: number;
  readonly ink?: string;
  readonly pen?: number;
}

/** Letters with their upper left corner at the point. */
export function written(text: string, { x, y, high, ink = '#23272a', pen = 1.6 }: Written): string {
  const size = high / 16;
  const letters = [...text].map(
    (letter, at) => `<path transform="translate(${at * 13.5} 0)" d="${STROKES[letter] ?? ''}"/>`,
  );
  return `<g transform="translate(${n(x)} ${n(y)}) scale(${size.toFixed(3)})" fill="none" stroke="${ink}" stroke-width="${pen}" stroke-linecap="round" stroke-linejoin="round">${letters.join('')}</g>`;
}

export const widthOf = (text: string, high: number) => ((text.length * 13.5 - 3.5) * high) / 16;
