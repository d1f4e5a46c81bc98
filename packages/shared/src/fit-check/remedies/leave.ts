import type { Bench } from '../bench.js';
import { headChecks } from '../checks/head-checks.js';
import { roundCheck } from '../checks/hole-checks.js';
import type { RemedyCheck } from '../hole-card.schema.js';
import { asFound, placeChecks, remedyOf } from './remedy.js';

/** Leave it: the rivet as drawn in the holes as they are, or the head as it was driven. */
export function leaveRemedy(bench: Bench): RemedyCheck {
  const plan = asFound(bench);
  const head = bench.card.shopHead;
  const heads = head ? headChecks(head, plan.dash, bench.limits) : [];
  return remedyOf(bench, plan, [roundCheck(bench), ...heads, ...placeChecks(bench, plan)]);
}
