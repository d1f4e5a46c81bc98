import { BEARING_THICKNESS_D, EDGE_FLOOR_D, STRENGTH_FULL, STRENGTH_LEAST } from '../../trade/limits.js';
import { RIVET_SHEARS } from '../../trade/rivets.js';
import { SHEET_ALLOYS, type SheetRange } from '../../trade/sheets.js';
import type { Verdict } from '../hole-card.schema.js';
import { rivetHole } from './holes.js';
import { diameterOf, reaches, requireCount, requirePositive, requireRow, TOLERANCE } from './require.js';

const PSI_PER_KSI = 1000;
const EDGE_FULL_D = 2;

/** Strengths of a sheet at a thickness; a thickness between two ranges counts as the thinner one. Null where not tabulated. */
export function sheetRange(sheet: string, thickness: number): SheetRange | null {
  const ranges = SHEET_ALLOYS[sheet]?.ranges ?? [];
  const last = ranges.at(-1);
  if (!last || thickness > last.to + TOLERANCE) return null;
  return ranges.findLast((range) => reaches(thickness, range.from)) ?? null;
}

/** Bearing ultimate, ksi: linear from 1.5 D to 2 D, flat above, none below. */
export function bearingStressAt(range: SheetRange, edgeRatio: number): number | null {
  if (!reaches(edgeRatio, EDGE_FLOOR_D.value)) return null;
  const part = Math.min((edgeRatio - EDGE_FLOOR_D.value) / (EDGE_FULL_D - EDGE_FLOOR_D.value), 1);
  return range.bearing15 + (range.bearing20 - range.bearing15) * Math.max(part, 0);
}

/** Single shear of a solid rivet, lbf; never more for a larger hole (S9). Null where not tabulated. */
export function shearOf(alloy: string, dash: number): number | null {
  return RIVET_SHEARS[alloy]?.pounds[dash] ?? null;
}

export interface StrengthInput {
  readonly thickness: number;
  readonly dash: number;
  readonly edge: number;
  readonly sheet: string;
  /** Letters of the rivet's call-out. */
  readonly rivet?: string;
}

export interface RivetStrength {
  readonly edgeRatio: number;
  /** ksi; null below 1.5 D */
  readonly bearingStress: number | null;
  /** lbf */
  readonly bearing: number | null;
  readonly shear: number;
  readonly critical: 'shear' | 'bearing';
  readonly allowable: number | null;
  readonly thicknessRatio: number;
  /** False where the sheet is too thin for tabulated bearing (S9). */
  readonly tabulated: boolean;
}

/**
 * Ultimate strength of one rivet in one sheet: the lesser of its shear (S23, memory) and of the bearing of the nominal
 * hole (S27, S28; S9). Inch, lbf, ksi; dash in 1/32. Throws RangeError naming the field where nothing is tabulated.
 */
export function rivetStrength(input: StrengthInput): RivetStrength {
  const { thickness, dash, edge, sheet, rivet = 'AD' } = input;
  requirePositive('thickness', thickness);
  requirePositive('edge', edge);
  const diameter = diameterOf(dash);
  requireRow('sheet', sheet, SHEET_ALLOYS[sheet]);
  const range = requireRow('thickness', thickness, sheetRange(sheet, thickness));
  const hole = requireRow('dash', dash, rivetHole(dash));
  const shear = requireRow('rivet', `${rivet}${dash}`, shearOf(rivet, dash));
  const edgeRatio = edge / diameter;
  const bearingStress = bearingStressAt(range, edgeRatio);
  const bearing = bearingStress === null ? null : bearingStress * PSI_PER_KSI * hole.nominal * thickness;
  const thicknessRatio = thickness / diameter;
  return {
    edgeRatio,
    bearingStress,
    bearing,
    shear,
    critical: bearing === null || bearing < shear ? 'bearing' : 'shear',
    allowable: bearing === null ? null : Math.min(bearing, shear),
    thicknessRatio,
    tabulated: reaches(thicknessRatio, BEARING_THICKNESS_D.value),
  };
}

/** Strength after in percent of before: full from 100, marginal from 95, below it needs compensation (house). */
export function strengthVerdict(percent: number | null): Verdict {
  if (percent === null) return 'unknown';
  if (reaches(percent, STRENGTH_FULL.value)) return 'inside';
  return reaches(percent, STRENGTH_LEAST.value) ? 'marginal' : 'outside';
}

export interface GroupInput extends Omit<StrengthInput, 'dash'> {
  readonly count: number;
  readonly fromDash: number;
  readonly toDash: number;
  /** Rivets that change size. */
  readonly changed?: number;
  /** Rivets left out. */
  readonly missing?: number;
}

/**
 * Strength of a group that shares its load equally, before and after some rivets change size or are left out.
 * Inch, lbf; null below 1.5 D, where no bearing is tabulated. Throws RangeError naming the field.
 */
export function groupStrength(input: GroupInput) {
  const { count, fromDash, toDash, changed = 1, missing = 0, ...joint } = input;
  requireCount('count', count, 1);
  requireCount('changed', changed, 0);
  requireCount('missing', missing, 0);
  if (changed + missing > count)
    throw new RangeError(`changed: ${changed + missing} of ${count} rivets cannot be.`);
  diameterOf(fromDash, 'fromDash');
  diameterOf(toDash, 'toDash');
  const from = rivetStrength({ ...joint, dash: fromDash }).allowable;
  const to = rivetStrength({ ...joint, dash: toDash }).allowable;
  const before = from === null ? null : count * from;
  const after = from === null || to === null ? null : (count - changed - missing) * from + changed * to;
  const percent = before === null || after === null ? null : (100 * after) / before;
  return { before, after, percent, verdict: strengthVerdict(percent) };
}
