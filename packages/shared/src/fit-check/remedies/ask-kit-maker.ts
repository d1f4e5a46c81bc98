import type { RemedyCheck } from '../hole-card.schema.js';

/** Always open: no number decides it. */
export function askKitMakerRemedy(): RemedyCheck {
  return {
    kind: 'askKitMaker',
    verdict: 'unknown',
    finalHole: null,
    rivet: null,
    checks: [],
    centre: null,
    remarks: [],
  };
}
