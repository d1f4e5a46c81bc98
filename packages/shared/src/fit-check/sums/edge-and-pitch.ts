import {
  EDGE_FLOOR_D,
  EDGE_MAXIMUM_D,
  EDGE_MINIMUM_D,
  PITCH_MAXIMUM_D,
  PITCH_MINIMUM_D,
  PITCH_USUAL_D,
} from '../../trade/limits.js';
import type { RivetHead } from '../card-fields.js';
import type { Verdict } from '../hole-card.schema.js';
import { diameterOf, reaches, requirePositive, requireRow } from './require.js';

export type EdgeCode = 'below_floor' | 'below_minimum' | 'ok' | 'above_maximum';
export type PitchCode = 'too_close' | 'tight' | 'ok' | 'too_far';

interface Spacing<Code> {
  /** In D. */
  readonly ratio: number;
  /** inch */
  readonly minimum: number;
  readonly maximum: number;
  readonly verdict: Verdict;
  readonly code: Code;
}

/** Where an edge ratio stands against its minimum, both in D; below the floor no bearing value is tabulated (S21). */
export function edgeCode(ratio: number, minimumD: number): EdgeCode {
  if (!reaches(ratio, minimumD)) return reaches(ratio, EDGE_FLOOR_D.value) ? 'below_minimum' : 'below_floor';
  return reaches(EDGE_MAXIMUM_D.value, ratio) ? 'ok' : 'above_maximum';
}

const EDGE_VERDICTS: Readonly<Record<EdgeCode, Verdict>> = {
  below_floor: 'outside',
  below_minimum: 'outside',
  ok: 'inside',
  above_maximum: 'marginal',
};

/**
 * Edge distance of a hole, centre to edge: at least 2 D protruding, 2.5 D flush, at most 4 D (S7).
 * Inch; dash in 1/32. Throws RangeError naming `edge`, `dash` or `head`.
 */
export function edgeDistance(input: { edge: number; dash: number; head: RivetHead }): Spacing<EdgeCode> {
  requirePositive('edge', input.edge);
  const diameter = diameterOf(input.dash);
  const minimumD = requireRow('head', input.head, EDGE_MINIMUM_D[input.head]).value;
  const ratio = input.edge / diameter;
  const code = edgeCode(ratio, minimumD);
  return {
    ratio,
    minimum: minimumD * diameter,
    maximum: EDGE_MAXIMUM_D.value * diameter,
    verdict: EDGE_VERDICTS[code],
    code,
  };
}

/** Where a pitch ratio stands, in D of the larger rivet of the pair. */
export function pitchCode(ratio: number, minimumD: number): PitchCode {
  if (!reaches(ratio, minimumD)) return 'too_close';
  if (!reaches(ratio, PITCH_USUAL_D.value)) return 'tight';
  return reaches(PITCH_MAXIMUM_D.value, ratio) ? 'ok' : 'too_far';
}

const PITCH_VERDICTS: Readonly<Record<PitchCode, Verdict>> = {
  too_close: 'outside',
  tight: 'marginal',
  ok: 'inside',
  too_far: 'marginal',
};

/**
 * Pitch between two rivets, centre to centre: at least 3 D (S7, S3, S12), tight to 4 D (S3, S21), at most 10 D (S7),
 * D of the larger of the two. Inch; dashes in 1/32. Throws RangeError naming `pitch`, `dash` or `neighbourDash`.
 */
export function rivetPitch(input: {
  pitch: number;
  dash: number;
  neighbourDash?: number;
}): Spacing<PitchCode> {
  requirePositive('pitch', input.pitch);
  const other = input.neighbourDash === undefined ? 0 : diameterOf(input.neighbourDash, 'neighbourDash');
  const diameter = Math.max(diameterOf(input.dash), other);
  const ratio = input.pitch / diameter;
  const code = pitchCode(ratio, PITCH_MINIMUM_D.value);
  return {
    ratio,
    minimum: PITCH_MINIMUM_D.value * diameter,
    maximum: PITCH_MAXIMUM_D.value * diameter,
    verdict: PITCH_VERDICTS[code],
    code,
  };
}
