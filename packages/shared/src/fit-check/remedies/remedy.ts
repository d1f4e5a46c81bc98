import { bendChecks } from '../checks/bend-checks.js';
import { edgeChecks } from '../checks/edge-checks.js';
import { worstVerdict } from '../checks/judge.js';
import { pitchChecks } from '../checks/pitch-checks.js';
import { countersinkChecks, lengthCheck, lengthDashOf, thicknessChecks } from '../checks/stack-checks.js';
import { strengthCheck } from '../checks/strength-check.js';
import { layerName, ownCentre, type Bench, type Plan } from '../bench.js';
import { halfHole } from '../card-faults.js';
import { distance } from '../geometry/enclosing-circle.js';
import type { CheckLine, RemedyCheck } from '../hole-card.schema.js';
import { said } from '../measured.js';

/** The card as it stands: the rivet as drawn, no hole moved. */
export function asFound(bench: Bench): Plan {
  const { dash } = bench.card.rivet;
  return { kind: 'leave', dash, finalHole: null, slack: 0, centreFor: ownCentre };
}

/** What every remedy that leaves a rivet in this place is checked for, in the order in which a builder would look. */
export function placeChecks(bench: Bench, plan: Plan): CheckLine[] {
  return [
    ...edgeChecks(bench, plan),
    ...pitchChecks(bench, plan),
    ...bendChecks(bench, plan),
    ...thicknessChecks(bench, plan),
    ...countersinkChecks(bench, plan),
    strengthCheck(bench, asFound(bench), plan),
    lengthCheck(bench, plan),
  ];
}

export function rivetOf(bench: Bench, dash: number): RemedyCheck['rivet'] {
  const { head, alloy } = bench.card.rivet;
  return { head: head ?? null, alloy: alloy ?? null, dash, lengthDash: lengthDashOf(bench, dash) };
}

/** Puts a remedy together; its worst line is its verdict. */
export function remedyOf(bench: Bench, plan: Plan, checks: CheckLine[], remarks: string[] = []): RemedyCheck {
  return {
    kind: plan.kind,
    verdict: worstVerdict(checks),
    finalHole: plan.finalHole,
    rivet: rivetOf(bench, plan.dash),
    checks,
    centre: plan.kind === 'leave' ? null : plan.centreFor(bench.views.base, 0),
    remarks,
  };
}

/** Diameter that cleans up every hole when the drill is held on the centre of one layer's own. */
function heldOn(bench: Bench, layer: number): number {
  const { layers } = bench.views.base;
  const reach = bench.card.layers.map(({ hole }, index) => {
    const away = distance(layers[layer]!, layers[index]!);
    const half = hole?.shape === 'oblong' ? halfHole(hole, hole.angle) : halfHole(hole, null);
    return hole && hole.shape !== 'none' ? away + half : 0;
  });
  return 2 * Math.max(...reach);
}

/** The usual mistake: the drill follows one of the holes instead of staying between them. */
export function heldOnOneRemarks(bench: Bench): string[] {
  const { minimum, centre, layers } = bench.views.base;
  if (minimum === null || centre === null) return [];
  const moved = layers.flatMap((own, layer) => (own && distance(own, centre) > 1e-6 ? [layer] : []));
  const dearest = moved
    .map((layer) => ({ layer, needs: heldOn(bench, layer) }))
    .sort((a, b) => b.needs - a.needs)[0];
  if (!dearest || dearest.needs <= minimum + 1e-6) return [];
  const name = layerName(bench.card, dearest.layer);
  return [`Held on the centre of ${name} instead of between the holes it needs ${said(dearest.needs)}.`];
}
