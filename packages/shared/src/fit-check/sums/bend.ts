import { requireNotNegative, requirePositive } from './require.js';

/** Bend allowance per degree, FAA handbook constants (S31b); the Navy's 0.0173 gives up to 0.002 inch less (S30). */
const PER_RADIUS = 0.01743;
const PER_THICKNESS = 0.0078;
const STRAIGHT = 180;

/**
 * Setback tan(angle/2)(R + T) (S29), allowance (0.01743 R + 0.0078 T) per degree (S31b) and what the flat is shorter
 * than the two legs. Inch, degrees. Throws RangeError naming `angle`, `radius` or `thickness`.
 */
export function bend({ angle, radius, thickness }: { angle: number; radius: number; thickness: number }) {
  requirePositive('angle', angle);
  if (angle >= STRAIGHT)
    throw new RangeError(`angle: ${angle} degrees folds the sheet flat; give less than 180.`);
  requireNotNegative('radius', radius);
  requirePositive('thickness', thickness);
  const setback = Math.tan((angle / 2) * (Math.PI / STRAIGHT)) * (radius + thickness);
  const allowance = (PER_RADIUS * radius + PER_THICKNESS * thickness) * angle;
  return { setback, allowance, deduction: 2 * setback - allowance };
}
