import { drawnCentre, type Bench, type Plan } from '../bench.js';
import type { HoleCard } from '../card-fields.js';
import { edgeChecks } from '../checks/edge-checks.js';
import { notKnown } from '../checks/judge.js';
import { pitchChecks } from '../checks/pitch-checks.js';
import { lengthCheck } from '../checks/stack-checks.js';
import type { CheckLine, RemedyCheck } from '../hole-card.schema.js';
import { known } from '../measured.js';
import { rivetHole } from '../sums/holes.js';
import { remedyOf } from './remedy.js';

/** The card as the drawing has it: the drawing's edge and pitch where they are given, else what was measured. */
function asDrawn(card: HoleCard): HoleCard {
  const { edge, pitch } = card.drawn ?? {};
  const layers = card.layers.map((layer) => ({
    ...layer,
    offset: known(edge) ? { x: 0, y: 0 } : layer.offset,
    edges: known(edge) ? (layer.edges ?? []).map((one) => ({ ...one, distance: edge })) : layer.edges,
  }));
  const neighbours = known(pitch)
    ? card.neighbours
        ?.map((one, index) => ({ ...one, x: index === 0 ? pitch : negative(pitch), y: 0 }))
        .slice(0, 2)
    : card.neighbours;
  return { ...card, layers, neighbours };
}

function negative(pitch: NonNullable<NonNullable<HoleCard['drawn']>['pitch']>) {
  return typeof pitch === 'number' ? -pitch : { ...pitch, value: -pitch.value };
}

/** A measured edge that is short, or may be, can be the fault itself: the card does not tell what the drawing has. */
function untoldWhereShort(line: CheckLine): CheckLine {
  const short = line.verdict === 'outside' || line.code === 'too_close_to_call';
  if (!short || line.id === 'length') return line;
  const facts = { id: line.id, label: line.label, unit: line.unit, source: line.source };
  return notKnown(facts, 'the edge distance and pitch of the drawing', 'as drawn');
}

/** A new part, drilled as drawn: the card without its fault. What it does not tell is not known. */
export function replacePartRemedy(bench: Bench): RemedyCheck {
  const { dash } = bench.card.rivet;
  const hole = rivetHole(dash);
  const plan: Plan = {
    kind: 'replacePart',
    dash,
    finalHole: hole ? { diameter: hole.shopFinal, drill: hole.shopFinalDrill } : null,
    slack: 0,
    centreFor: drawnCentre,
  };
  const drawn = { ...bench, card: asDrawn(bench.card) };
  const lines = [...edgeChecks(drawn, plan), ...pitchChecks(drawn, plan), lengthCheck(drawn, plan)];
  return remedyOf(bench, plan, lines.map(untoldWhereShort));
}
