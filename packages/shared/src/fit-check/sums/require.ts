/** Lengths that agree to this are equal, inch; ratios in D as well. Sums of typed decimals are never exact. */
export const TOLERANCE = 1e-9;

/** Refuses what is no number above nothing, with the field's name. */
export function requirePositive(field: string, value: number): void {
  if (!Number.isFinite(value) || value <= 0)
    throw new RangeError(`${field}: ${value} is not a length above 0.`);
}

/** Refuses what is no number, or below nothing. */
export function requireNotNegative(field: string, value: number): void {
  if (!Number.isFinite(value) || value < 0) throw new RangeError(`${field}: ${value} is less than nothing.`);
}

/** Refuses what is no whole number, or below `least`. */
export function requireCount(field: string, value: number, least: number): void {
  if (!Number.isInteger(value) || value < least) {
    throw new RangeError(`${field}: ${value} is not a whole number from ${least} up.`);
  }
}

/** Looks `key` up in a table and refuses, with the field's name, what the table does not have. */
export function requireRow<T>(field: string, key: string | number, row: T | null | undefined): T {
  if (row === null || row === undefined) throw new RangeError(`${field}: nothing is tabulated for ${key}.`);
  return row;
}

/** Nominal rivet diameter in inches: dash in 1/32. Refuses a dash that is not above nothing. */
export function diameterOf(dash: number, field = 'dash'): number {
  requirePositive(field, dash);
  return dash / 32;
}

/** True where `value` reaches `limit`, to within the tolerance. */
export function reaches(value: number, limit: number): boolean {
  return value >= limit - TOLERANCE;
}
