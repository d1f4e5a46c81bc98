import { SPLICES, type SpliceDiameter, type SpliceTable } from '../../trade/splices.js';
import { reaches, requirePositive, requireRow, TOLERANCE } from './require.js';

/**
 * Rivets on each side of a splice: AC 43.13-1B Tables 4-9 (S4), 4-10 (S5), 4-11 (S6), times the width and the factor
 * of the circular's notes, rounded up once at the end. A thickness between two rows takes the thicker one.
 * Inch. Throws RangeError naming `table`, `thickness`, `diameter`, `width` or `factor`.
 */
export function spliceRivets(input: {
  table: SpliceTable;
  thickness: number;
  diameter: SpliceDiameter;
  width: number;
  factor?: number;
}) {
  const { table, thickness, diameter, width, factor = 1 } = input;
  requirePositive('thickness', thickness);
  requirePositive('width', width);
  requirePositive('factor', factor);
  const { rows } = requireRow('table', table, SPLICES[table]);
  const row = rows.find((candidate) => reaches(candidate.thickness, thickness));
  const { perInch: cells } = requireRow('thickness', thickness, row);
  const perInch = requireRow('diameter', `${diameter} in ${thickness}`, cells[diameter]);
  return { perInch, rivets: Math.ceil(perInch * width * factor - TOLERANCE) };
}
