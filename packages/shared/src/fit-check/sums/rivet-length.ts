import { LENGTH_BEYOND_GRIP_D } from '../../trade/limits.js';
import { diameterOf, requirePositive, TOLERANCE } from './require.js';

const SIXTEENTHS = 16;

export interface RivetLength {
  /** Total thickness held, inch. */
  readonly grip: number;
  /** Length that the rivet should have, inch. */
  readonly length: number;
  /** Next whole sixteenth up. */
  readonly dashRoundedUp: number;
  /** Nearest half size in sixteenths. */
  readonly dashNearestHalf: number;
}

/**
 * Length of a solid rivet for a stack: L = G + 1.5 D (S3, S10), next 1/16 up (S12), nearest half size (S1).
 * Inch; dash in 1/32. Throws RangeError naming `layers` or `dash`.
 */
export function rivetLength({ layers, dash }: { layers: readonly number[]; dash: number }): RivetLength {
  if (layers.length === 0) throw new RangeError('layers: give at least one thickness.');
  layers.forEach((thickness, index) => requirePositive(`layers.${index}`, thickness));
  const grip = layers.reduce((sum, thickness) => sum + thickness, 0);
  const length = grip + LENGTH_BEYOND_GRIP_D.value * diameterOf(dash);
  return {
    grip,
    length,
    dashRoundedUp: Math.ceil(length * SIXTEENTHS - TOLERANCE),
    dashNearestHalf: Math.round(length * SIXTEENTHS * 2) / 2,
  };
}

/** The smallest half size that is not short of `length` (inch): a call-out is never short by rounding. */
export function lengthDashFor(length: number): number {
  return Math.ceil(length * SIXTEENTHS * 2 - TOLERANCE) / 2;
}
