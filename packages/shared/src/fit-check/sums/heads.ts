import { COUNTERSINK_SHEET, SHOP_HEAD } from '../../trade/limits.js';
import { RIVET_HEADS } from '../../trade/rivets.js';
import type { Verdict } from '../hole-card.schema.js';
import { diameterOf, reaches, requirePositive, requireRow } from './require.js';

export type CountersinkCode = 'countersink_ok' | 'between' | 'knife_edge' | 'not_tabulated';
const COUNTERSINK_VERDICTS: Readonly<Record<CountersinkCode, Verdict>> = {
  countersink_ok: 'inside',
  between: 'marginal',
  knife_edge: 'outside',
  not_tabulated: 'unknown',
};

function countersinkCode(thickness: number, minimum: number | null, headHeight: number): CountersinkCode {
  if (reaches(headHeight, thickness)) return 'knife_edge';
  if (minimum === null) return 'not_tabulated';
  return reaches(thickness, minimum) ? 'countersink_ok' : 'between';
}

/**
 * Whether a sheet is thick enough for a 100-degree machine countersink: least sheet S11, head height from memory; a
 * sheet no thicker than the head leaves a knife edge (S25). Inch; dash in 1/32. `minimum` is null for AD8, whose
 * printed value is a misprint. Throws RangeError naming `thickness` or `dash`.
 */
export function countersinkCheck({ thickness, dash }: { thickness: number; dash: number }) {
  requirePositive('thickness', thickness);
  diameterOf(dash);
  const headHeight = requireRow('dash', dash, RIVET_HEADS.sizes[dash]).flushHeight;
  const minimum = COUNTERSINK_SHEET.byDash[dash] ?? null;
  const code = countersinkCode(thickness, minimum, headHeight);
  return { minimum, headHeight, verdict: COUNTERSINK_VERDICTS[code], code };
}

export type DrivenHeadCode = 'reject' | 'below_nominal' | 'overdriven' | 'ok';

/** The least width and height of a driven head, in D: published (S9) unless the kit has its own. */
export interface HeadLimits {
  readonly width: number;
  readonly height: number;
}
export const PUBLISHED_HEAD_LIMITS: HeadLimits = {
  width: SHOP_HEAD.widthReject.value,
  height: SHOP_HEAD.heightReject.value,
};

/** Where a driven head stands, width and height in D. */
export function drivenHeadCode(
  width: number,
  height: number,
  limits = PUBLISHED_HEAD_LIMITS,
): DrivenHeadCode {
  if (!reaches(width, limits.width) || !reaches(height, limits.height)) return 'reject';
  const flat = !reaches(height, SHOP_HEAD.heightUsual.value);
  if (flat && width > SHOP_HEAD.widthOver.value) return 'overdriven';
  return flat || !reaches(width, SHOP_HEAD.widthUsual.value) ? 'below_nominal' : 'ok';
}

const HEAD_VERDICTS: Readonly<Record<DrivenHeadCode, Verdict>> = {
  reject: 'outside',
  below_nominal: 'marginal',
  overdriven: 'marginal',
  ok: 'inside',
};

/**
 * A driven head against 1.3 D by 0.3 D (S9), nominal 1.5 D by 0.5 D (S13, S19); between them marginal (house).
 * Inch; dash in 1/32. Throws RangeError naming `width`, `height` or `dash`.
 */
export function drivenHead({ width, height, dash }: { width: number; height: number; dash: number }) {
  requirePositive('width', width);
  requirePositive('height', height);
  const diameter = diameterOf(dash);
  const [widthRatio, heightRatio] = [width / diameter, height / diameter];
  const code = drivenHeadCode(widthRatio, heightRatio);
  return { widthRatio, heightRatio, verdict: HEAD_VERDICTS[code], code };
}
