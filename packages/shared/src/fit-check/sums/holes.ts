import { DRILLS } from '../../trade/drills.js';
import { RIVET_DASHES, RIVET_HOLES, type RivetDash, type RivetHole } from '../../trade/rivets.js';
import {
  diameterOf,
  reaches,
  requireNotNegative,
  requirePositive,
  requireRow,
  TOLERANCE,
} from './require.js';

/** The holes of a rivet size, or null where the size has no row. */
export function rivetHole(dash: number): RivetHole | null {
  return RIVET_HOLES[dash as RivetDash] ?? null;
}

/**
 * Nominal hole of a solid rivet (proved by the arithmetic of S4 to S6), its drill (S20) and the clearance round the
 * rivet. Inch; dash in 1/32. Throws RangeError naming `dash` where the size has no hole tabulated.
 */
export function holeForRivet({ dash }: { dash: number }) {
  const diameter = diameterOf(dash);
  const hole = requireRow('dash', dash, rivetHole(dash));
  return { nominalHole: hole.nominal, drill: hole.nominalDrill, clearance: hole.nominal - diameter };
}

/**
 * The smallest drill that is not under `diameter` (inch), of the number, letter and 1/64 series together (S20);
 * nulls above the largest. Throws RangeError naming `diameter`.
 */
export function drillAtLeast({ diameter }: { diameter: number }) {
  requirePositive('diameter', diameter);
  const drill = DRILLS.find((candidate) => reaches(candidate.diameter, diameter));
  return { drill: drill?.name ?? null, diameter: drill?.diameter ?? null };
}

/** The smallest rivet size whose last shop drill cleans up to `diameter` (inch), or null. */
export function rivetForHole(diameter: number): RivetDash | null {
  return RIVET_DASHES.find((dash) => reaches(RIVET_HOLES[dash].shopFinal, diameter)) ?? null;
}

/** The next stocked size above `dash`, or null above the largest. */
export function nextDash(dash: number): RivetDash | null {
  return RIVET_DASHES.find((candidate) => candidate > dash) ?? null;
}

/**
 * The hole that swallows two round ones and the rivet that fits it: exact geometry, drills S20.
 * Inch. Shifts are how far the new centre lies from each old one. Throws RangeError naming the field.
 */
export function cleanUpHole(input: { diameter1: number; diameter2: number; offset: number }) {
  const { diameter1, diameter2, offset } = input;
  requirePositive('diameter1', diameter1);
  requirePositive('diameter2', diameter2);
  requireNotNegative('offset', offset);
  const oneInsideOther = offset <= Math.abs(diameter1 - diameter2) / 2 + TOLERANCE;
  const larger = Math.max(diameter1, diameter2);
  const minimumDiameter = oneInsideOther ? larger : (diameter1 + diameter2) / 2 + offset;
  const shift = (diameter: number) => {
    if (!oneInsideOther) return (minimumDiameter - diameter) / 2;
    return diameter === larger ? 0 : offset;
  };
  const dash = rivetForHole(minimumDiameter);
  const hole = dash && RIVET_HOLES[dash];
  return {
    minimumDiameter,
    shift1: shift(diameter1),
    shift2: diameter1 === diameter2 && oneInsideOther ? offset : shift(diameter2),
    oneInsideOther,
    dash,
    drill: hole ? hole.shopFinalDrill : null,
    finalDiameter: hole ? hole.shopFinal : null,
    slack: hole ? hole.shopFinal - minimumDiameter : null,
  };
}
