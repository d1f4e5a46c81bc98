import type { HoleLine, Units } from '@rivetside/shared';
import { fieldsOfHoleLine } from './fields-of-hole-line';
import { blankHoleCard, type HoleCardFields } from './hole-card-fields';
import { isBlankCard } from './read-hole-card';

/** The hole line as it is drawn, and whether its section is critical structure. */
export interface DrawnLine {
  readonly line: HoleLine;
  readonly critical: boolean;
}

/** What the form begins with: whatever the drawing tells, or nothing. */
export function usualCard(drawn: DrawnLine | null, units: Units): HoleCardFields {
  return drawn ? fieldsOfHoleLine(drawn.line, drawn, units) : blankHoleCard(units);
}

/** Nothing was measured: what the drawing tells may be told by another drawing. */
export function isUnmeasured(fields: HoleCardFields): boolean {
  return isBlankCard({ ...fields, rivet: '' });
}

/**
 * The card on another hole line. Where something was measured it stays as it is, but for what only the drawing can
 * tell: pitch and edge as drawn, and the kit maker's limits. Null where the form may begin anew.
 */
export function onOtherLine(
  fields: HoleCardFields | null,
  drawn: DrawnLine | null,
  units: Units,
): HoleCardFields | null {
  if (!fields || isUnmeasured(fields)) return null;
  const other = usualCard(drawn, units);
  return { ...fields, drawn: other.drawn, limits: other.limits };
}
