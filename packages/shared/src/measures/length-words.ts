import { DRILLS } from '../trade/drills.js';
import { MM_PER_INCH, type Units } from './read-length.js';

const INCH_DECIMALS = 3;
const MM_DECIMALS = 2;
/** A measured hole this near to a drill carries its name, inch. */
const DRILL_NEARNESS = 0.00025;
const SIXTY_FOURTHS = 64;
const UNIT_WORDS: Readonly<Record<Units, string>> = { inch: 'in', mm: 'mm' };

/**
 * Rounds to `decimals`, a half to the even digit as shop tables do: 0.1285 shows as 0.128, 0.1555 as 0.156.
 * What is a half to within 1e-9 counts as one, since 0.322 + 0.0135 is not exactly 0.3355.
 */
export function roundHalfEven(value: number, decimals: number): string {
  const scaled = Math.abs(value) * 10 ** decimals;
  const floor = Math.floor(scaled);
  const rest = scaled - floor;
  const isHalf = Math.abs(rest - 0.5) < 1e-9 * 10 ** decimals;
  const rounded = isHalf ? floor + (floor % 2) : Math.round(scaled);
  const text = (rounded / 10 ** decimals).toFixed(decimals);
  return value < 0 && rounded > 0 ? `-${text}` : text;
}

/** A length as it is shown: inch to three decimals, millimetres to two; no unit name. */
export function formatLength(inches: number, units: Units): string {
  return units === 'mm'
    ? roundHalfEven(inches * MM_PER_INCH, MM_DECIMALS)
    : roundHalfEven(inches, INCH_DECIMALS);
}

/** A length with its unit: `0.322 in`, `8.18 mm`. */
export function formatLengthUnit(inches: number, units: Units): string {
  return `${formatLength(inches, units)} ${UNIT_WORDS[units]}`;
}

/** A length with its measuring error: `0.322 ± 0.005`. */
export function formatWithError(inches: number, u: number | null | undefined, units: Units): string {
  return u ? `${formatLength(inches, units)} ± ${formatLength(u, units)}` : formatLength(inches, units);
}

/** Name of the drill that makes a hole of that diameter (inch), or null where none is that near. */
export function drillName(diameter: number): string | null {
  const off = (drill: { diameter: number }) => Math.abs(drill.diameter - diameter);
  const nearest = DRILLS.reduce((best, drill) => (off(drill) < off(best) ? drill : best));
  return off(nearest) <= DRILL_NEARNESS ? nearest.name : null;
}

/** A hole with its drill beside it where there is one: `0.128 · #30`. */
export function formatHole(diameter: number, units: Units, drill = drillName(diameter)): string {
  return drill ? `${formatLength(diameter, units)} · ${drill}` : formatLength(diameter, units);
}

/** The fraction that the trade says for a length in inches: 0.15625 is `5/32`, 1.375 `1 3/8`; null off the 1/64 grid. */
export function fractionName(inches: number): string | null {
  const parts = Math.round(inches * SIXTY_FOURTHS);
  if (parts <= 0 || Math.abs(parts / SIXTY_FOURTHS - inches) > 1e-6) return null;
  const whole = Math.floor(parts / SIXTY_FOURTHS);
  let [over, under] = [parts % SIXTY_FOURTHS, SIXTY_FOURTHS];
  if (over === 0) return String(whole);
  while (over % 2 === 0) [over, under] = [over / 2, under / 2];
  return whole > 0 ? `${whole} ${over}/${under}` : `${over}/${under}`;
}

/** A value beside its limit, with as many decimals as it takes to tell them apart: 1.996 against 2 is `1.996`. */
export function formatAgainst(value: number, limit: number | null, decimals: number): string {
  const most = decimals + 3;
  for (let places = decimals; places < most; places += 1) {
    const text = roundHalfEven(value, places);
    if (limit === null || value === limit || Math.sign(Number(text) - limit) === Math.sign(value - limit))
      return text;
  }
  return roundHalfEven(value, most);
}
