import type { Scene } from './frame.js';
import { EDGE_SCENES } from './scenes-of-edges.js';
import { FIT_SCENES } from './scenes-of-fit.js';
import { HOLE_SCENES } from './scenes-of-holes.js';
import { RIVET_SCENES } from './scenes-of-rivets.js';
import { SURFACE_SCENES } from './scenes-of-surfaces.js';

/** Every photo of the demo world by its key. */
export const SCENES: Readonly<Record<string, Scene>> = {
  ...HOLE_SCENES,
  ...EDGE_SCENES,
  ...RIVET_SCENES,
  ...SURFACE_SCENES,
  ...FIT_SCENES,
};
