import { MM_PER_INCH, type Units } from '../../measures/read-length.js';
import type { Frame } from './model.js';

const GRIDS: Readonly<Record<Units, readonly (readonly [number, string])[]>> = {
  inch: [
    [0.1, 'grid 0.100 in'],
    [0.25, 'grid 0.250 in'],
    [0.5, 'grid 0.500 in'],
  ],
  mm: [
    [2 / MM_PER_INCH, 'grid 2 mm'],
    [5 / MM_PER_INCH, 'grid 5 mm'],
    [10 / MM_PER_INCH, 'grid 10 mm'],
  ],
};
const GRID_LEAST_PIXELS = 14;

/** The finest grid whose lines do not crowd: its spacing in inch, and its name. */
export function gridFor(frame: Frame, units: Units): readonly [number, string] {
  return GRIDS[units].find(([grid]) => grid * frame.scale >= GRID_LEAST_PIXELS) ?? GRIDS[units].at(-1)!;
}
