import { DRILLS } from '../../trade/drills.js';
import { cleanedCentre, type Bench, type Plan } from '../bench.js';
import { cleanUpCheck, holeLimit } from '../checks/hole-checks.js';
import type { RemedyCheck } from '../hole-card.schema.js';
import { rivetHole } from '../sums/holes.js';
import { reaches } from '../sums/require.js';
import { heldOnOneRemarks, placeChecks, remedyOf } from './remedy.js';

/** The smallest drill that cleans up every hole, is no smaller than the rivet's own and does not pass its hole maximum. */
function cleanUpDrill(bench: Bench, minimum: number | null): Plan['finalHole'] {
  const { dash } = bench.card.rivet;
  const own = rivetHole(dash);
  if (minimum === null || !own) return null;
  const maximum = holeLimit(bench, dash)?.maximum ?? own.shopFinal;
  const least = Math.max(minimum, own.shopFinal);
  const drill = DRILLS.find(({ diameter }) => reaches(diameter, least));
  return drill && reaches(maximum, drill.diameter) ? { diameter: drill.diameter, drill: drill.name } : null;
}

/** Clean up and set the same rivet: only while a drill serves inside the rivet's hole maximum. */
export function cleanUpRemedy(bench: Bench): RemedyCheck {
  const { minimum } = bench.views.base;
  const finalHole = cleanUpDrill(bench, minimum);
  const plan: Plan = {
    kind: 'cleanUp',
    dash: bench.card.rivet.dash,
    finalHole,
    slack: finalHole ? finalHole.diameter - minimum! : 0,
    centreFor: cleanedCentre,
  };
  const checks = [cleanUpCheck(bench, plan, false), ...placeChecks(bench, plan)];
  return remedyOf(bench, plan, checks, heldOnOneRemarks(bench));
}
