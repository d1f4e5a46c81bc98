import { BEND_FLOOR_D, BEND_MINIMUM_D } from '../../trade/limits.js';
import { lacking, layerName, planDiameter, type Bench, type Plan } from '../bench.js';
import type { LayerBend } from '../card-fields.js';
import type { CheckCode, CheckLine, Verdict } from '../hole-card.schema.js';
import { known, said } from '../measured.js';
import { reaches } from '../sums/require.js';
import type { Reading } from '../geometry/hole-views.js';
import { distanceAfter, whatIsMissing } from './edge-checks.js';
import { againstMinimum, judged, notKnown, settledBy, sourceOf } from './judge.js';

const BEND_SOURCE = sourceOf(BEND_MINIMUM_D.head);

/** Near is marginal; so near that the head sits on the radius is outside. */
function bendCode(reading: Reading, minimum: number): CheckCode {
  const side = againstMinimum(reading, minimum);
  if (side === 'inside') return 'ok';
  if (side === 'tooClose') return 'too_close_to_call';
  return reaches(reading.value + reading.error, BEND_FLOOR_D.value) ? 'near_bend' : 'on_bend';
}

function bendVerdict(code: CheckCode): Verdict {
  if (code === 'ok') return 'inside';
  return code === 'on_bend' ? 'outside' : 'marginal';
}

const REMARKS: Partial<Readonly<Record<CheckCode, string>>> = {
  near_bend: 'The rim of the head reaches over the tangent of the bend.',
  on_bend: 'The head would sit on the radius.',
};

function limitFor(bench: Bench, bend: LayerBend, name: string): number {
  if (!known(bend.side))
    bench.assumptions.add(`The wider head is taken to lie on the side of the bend in ${name}.`);
  return BEND_MINIMUM_D[bend.side ?? 'head'].value;
}

function bendLine(bench: Bench, plan: Plan, layer: number, index: number): CheckLine {
  const bend = bench.card.layers[layer]!.bends![index]!;
  const name = layerName(bench.card, layer);
  const facts = {
    id: `bend:${layer}:${index}`,
    label: `Bend, ${name}`,
    unit: 'D' as const,
    source: BEND_SOURCE,
  };
  if (!known(bend.distance)) {
    return notKnown(facts, lacking(bench, `the distance to the bend of ${name}`), 'to the tangent / D');
  }
  const after = distanceAfter(bench, plan, layer, { distance: bend.distance, angle: bend.angle });
  if (!after) return notKnown(facts, whatIsMissing(bench, plan, layer, 'bend'), 'to the tangent / D');
  const minimum = limitFor(bench, bend, name);
  const diameter = planDiameter(plan);
  const reading = { value: after.value / diameter, error: after.error / diameter };
  const code = bendCode(reading, minimum);
  return judged(
    facts,
    reading,
    { limit: minimum, verdict: bendVerdict(code), code },
    {
      formula: `to the tangent ${said(after.value)} / ${said(diameter)} = ${said(reading.value)} D, at least ${minimum}`,
      remark:
        code === 'too_close_to_call' ? settledBy(after.value - minimum * diameter) : (REMARKS[code] ?? null),
    },
  );
}

/** The tangent of every bend, from the centre of the finished hole. */
export function bendChecks(bench: Bench, plan: Plan): CheckLine[] {
  return bench.card.layers.flatMap(({ bends }, layer) => {
    if (bends) return bends.map((_, index) => bendLine(bench, plan, layer, index));
    const name = layerName(bench.card, layer);
    const missing = lacking(bench, `the bends near the hole in ${name} (none is an answer too)`);
    const facts = { id: `bend:${layer}:0`, label: `Bend, ${name}`, unit: 'D' as const };
    return [notKnown({ ...facts, source: BEND_SOURCE }, missing, 'to the tangent / D')];
  });
}
