import { cleanedCentre, type Bench, type Plan } from '../bench.js';
import { cleanUpCheck } from '../checks/hole-checks.js';
import { patternCheck } from '../checks/pattern-check.js';
import { pitchAfter } from '../checks/pitch-checks.js';
import type { RemedyCheck } from '../hole-card.schema.js';
import { nextDash, rivetForHole, rivetHole } from '../sums/holes.js';
import { asFound, heldOnOneRemarks, placeChecks, remedyOf } from './remedy.js';

interface Size {
  /** The next size; null above the largest. */
  readonly next: number | null;
  /** The size whose hole cleans up; the next one while that is not known. */
  readonly taken: number | null;
  readonly skips: boolean;
}

function sizeFor(bench: Bench): Size {
  const next = nextDash(bench.card.rivet.dash);
  const { minimum } = bench.views.base;
  const fitting = minimum === null ? next : rivetForHole(minimum);
  if (next === null || fitting === null) return { next, taken: null, skips: false };
  const taken = Math.max(next, fitting);
  return { next, taken, skips: taken > next };
}

function planFor(bench: Bench, { next, taken }: Size): Plan {
  const { minimum } = bench.views.base;
  const hole = taken !== null && minimum !== null ? rivetHole(taken) : null;
  return {
    kind: 'nextSize',
    dash: taken ?? next ?? bench.card.rivet.dash,
    finalHole: hole ? { diameter: hole.shopFinal, drill: hole.shopFinalDrill } : null,
    slack: hole ? hole.shopFinal - minimum! : 0,
    centreFor: cleanedCentre,
  };
}

function nearestPitch(bench: Bench, plan: Plan): number | null {
  const pitches = (bench.card.neighbours ?? []).map(
    (neighbour) => pitchAfter(bench, plan, neighbour)?.value ?? 0,
  );
  return pitches.length > 0 && Math.min(...pitches) > 0 ? Math.min(...pitches) : null;
}

/** What is left of the sheet between two rivets. */
function netSectionRemarks(bench: Bench, plan: Plan): string[] {
  const before = rivetHole(bench.card.rivet.dash)?.nominal;
  const pitchBefore = nearestPitch(bench, asFound(bench));
  const pitchAfterwards = nearestPitch(bench, plan);
  if (!before || !plan.finalHole || !pitchBefore || !pitchAfterwards) return [];
  const share = (pitch: number, hole: number) => Math.round((100 * (pitch - hole)) / pitch);
  const [was, is] = [share(pitchBefore, before), share(pitchAfterwards, plan.finalHole.diameter)];
  return [`Of the sheet between the nearest two rivets ${is} % is left, ${was} % as drawn.`];
}

/** Open the hole to the next rivet size, 1/32 inch up. */
export function nextSizeRemedy(bench: Bench): RemedyCheck {
  const size = sizeFor(bench);
  const plan = planFor(bench, size);
  const checks = [cleanUpCheck(bench, plan, size.skips), ...placeChecks(bench, plan), patternCheck(bench)];
  const remedy = remedyOf(bench, plan, checks, [
    ...heldOnOneRemarks(bench),
    ...netSectionRemarks(bench, plan),
  ]);
  return size.next === null ? { ...remedy, rivet: null } : remedy;
}
