import { SHEET_ALLOYS } from '../../trade/sheets.js';
import { requirePositive } from './require.js';

/** End fixity by head: the lowest sourced value of each (S46 to S49). Advisory. */
export const RIVET_FIXITY = { universal: 2.37, universalHighest: 4, dimpled: 1.5, shearFlush: 1 } as const;

const PSI_PER_KSI = 1000;
const CLAD_YIELD_PSI = PSI_PER_KSI * SHEET_ALLOYS['2024-T3 clad']!.ranges[1]!.compressiveYield!;
/** Above this share of the yield the sheet no longer buckles elastically: house. */
const ELASTIC_SHARE = 0.5;

/**
 * Stress at which the sheet buckles between two rivets, c π² E t² / (12 s²) (S46), capped at the compressive yield
 * (house; 36 ksi of clad 2024-T3 where none is given, S27). Inch, psi. Throws RangeError naming the field.
 */
export function interRivetBuckling(input: {
  fixity: number;
  thickness: number;
  spacing: number;
  modulus: number;
  compressiveYield?: number;
}) {
  const { fixity, thickness, spacing, modulus, compressiveYield = CLAD_YIELD_PSI } = input;
  for (const [field, value] of Object.entries({ fixity, thickness, spacing, modulus, compressiveYield })) {
    requirePositive(field, value);
  }
  const stress = (fixity * Math.PI ** 2 * modulus * thickness ** 2) / (12 * spacing ** 2);
  return { stress: Math.min(stress, compressiveYield), elastic: stress <= ELASTIC_SHARE * compressiveYield };
}
