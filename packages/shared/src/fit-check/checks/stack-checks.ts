import { BEARING_THICKNESS_D, COUNTERSINK_SHEET, LENGTH_BEYOND_GRIP_D } from '../../trade/limits.js';
import { lacking, layerName, planDiameter, rivetName, type Bench, type Plan } from '../bench.js';
import type { CheckCode, CheckLine } from '../hole-card.schema.js';
import { errorOf, known, said, valueOf, type Measured } from '../measured.js';
import { countersinkCheck } from '../sums/heads.js';
import { lengthDashFor, rivetLength } from '../sums/rivet-length.js';
import { RIVET_HEADS } from '../../trade/rivets.js';
import { againstMinimum, judged, notKnown, settledBy, sourceOf } from './judge.js';

const BEARING_SOURCE = sourceOf(BEARING_THICKNESS_D);
const LENGTH_SOURCE = sourceOf(LENGTH_BEYOND_GRIP_D);

function thicknessLine(bench: Bench, plan: Plan, layer: number): CheckLine {
  const name = layerName(bench.card, layer);
  const facts = {
    id: `thickness:${layer}`,
    label: `Thickness, ${name}`,
    unit: 'D' as const,
    source: BEARING_SOURCE,
  };
  const thickness = bench.card.layers[layer]!.thickness;
  if (!known(thickness)) return notKnown(facts, lacking(bench, `the thickness of ${name}`), 't / D');
  const diameter = planDiameter(plan);
  const reading = { value: valueOf(thickness) / diameter, error: errorOf(thickness) / diameter };
  const limit = BEARING_THICKNESS_D.value;
  const side = againstMinimum(reading, limit);
  const code: CheckCode =
    side === 'inside' ? 'ok' : side === 'outside' ? 'not_tabulated' : 'too_close_to_call';
  const tooThin = 'Bearing strength is not tabulated for a sheet as thin as that against the rivet.';
  return judged(
    facts,
    reading,
    { limit, verdict: side === 'inside' ? 'inside' : 'marginal', code },
    {
      formula: `t / D = ${said(valueOf(thickness))} / ${said(diameter)} = ${said(reading.value)}, at least ${limit}`,
      remark:
        side === 'inside'
          ? null
          : side === 'outside'
            ? tooThin
            : settledBy(valueOf(thickness) - limit * diameter),
    },
  );
}

export function thicknessChecks(bench: Bench, plan: Plan): CheckLine[] {
  return bench.card.layers.map((_, layer) => thicknessLine(bench, plan, layer));
}

/** The same verdict at both ends of the measuring error, or none. */
function countersunk(thickness: Measured, dash: number) {
  const [value, u] = [valueOf(thickness), errorOf(thickness)];
  const found = countersinkCheck({ thickness: value, dash });
  const thin = countersinkCheck({ thickness: Math.max(value - u, 1e-6), dash });
  const thick = countersinkCheck({ thickness: value + u, dash });
  if (thin.code === thick.code) return found;
  return { ...found, verdict: 'marginal' as const, code: 'too_close_to_call' as const };
}

const COUNTERSINK_SOURCE = `${sourceOf(COUNTERSINK_SHEET)}; head height ${sourceOf({ source: ['S25'], how: RIVET_HEADS.how })}`;

function countersinkLine(bench: Bench, plan: Plan, layer: number): CheckLine {
  const name = layerName(bench.card, layer);
  const facts = {
    id: `countersink:${layer}`,
    label: `Countersink, ${name}`,
    unit: 'in' as const,
    source: COUNTERSINK_SOURCE,
  };
  const thickness = bench.card.layers[layer]!.thickness;
  if (!known(thickness)) return notKnown(facts, lacking(bench, `the thickness of ${name}`), 't');
  if (!RIVET_HEADS.sizes[plan.dash]) {
    return notKnown(
      facts,
      `the flush head of ${rivetName(bench.card, plan.dash)}, which is not tabulated`,
      't',
    );
  }
  const { minimum, headHeight, verdict, code } = countersunk(thickness, plan.dash);
  const limit = minimum ?? headHeight;
  const reading = { value: valueOf(thickness), error: errorOf(thickness) };
  return judged(
    facts,
    reading,
    { limit, verdict, code },
    {
      formula: `t = ${said(valueOf(thickness))}, at least ${said(limit)}; flush head ${said(headHeight)} high`,
      remark: code === 'too_close_to_call' ? settledBy(valueOf(thickness) - limit) : null,
    },
  );
}

/** Every countersunk layer; under a flush head, also the outer one while nobody said how it is formed. */
export function countersinkChecks(bench: Bench, plan: Plan): CheckLine[] {
  const { layers, rivet } = bench.card;
  const formed = layers.some(({ finish }) => finish === 'countersunk' || finish === 'dimpled');
  const lines = layers.flatMap(({ finish }, layer) =>
    finish === 'countersunk' ? [countersinkLine(bench, plan, layer)] : [],
  );
  if (rivet.head !== 'flush' || formed) return lines;
  const missing = lacking(bench, `whether ${layerName(bench.card, 0)} is dimpled or countersunk`);
  if (known(layers[0]!.finish)) return lines;
  const facts = {
    id: 'countersink:0',
    label: `Countersink, ${layerName(bench.card, 0)}`,
    unit: 'in' as const,
  };
  return [...lines, notKnown({ ...facts, source: COUNTERSINK_SOURCE }, missing, 't')];
}

/** Thickness of every layer, or null where one was not given. */
export function stackOf(bench: Bench): number[] | null {
  const thicknesses = bench.card.layers.map(({ thickness }) => thickness);
  return thicknesses.every(known) ? thicknesses.map((thickness) => valueOf(thickness)) : null;
}

/** Length to call out, in sixteenths; null while a thickness is not known. */
export function lengthDashOf(bench: Bench, dash: number): number | null {
  const layers = stackOf(bench);
  return layers && lengthDashFor(rivetLength({ layers, dash }).length);
}

export function lengthCheck(bench: Bench, plan: Plan): CheckLine {
  const facts = { id: 'length', label: 'Rivet length', unit: 'in' as const, source: LENGTH_SOURCE };
  const layers = stackOf(bench);
  if (!layers) return notKnown(facts, lacking(bench, 'the thickness of every layer'), 'L = G + 1.5 D');
  const { grip, length } = rivetLength({ layers, dash: plan.dash });
  const lengthDash = lengthDashFor(length);
  const finding = { limit: lengthDash / 16, isMaximum: true, verdict: 'inside', code: 'ok' } as const;
  return judged(facts, { value: length, error: 0 }, finding, {
    formula: `L = ${said(grip)} + 1.5 × ${said(planDiameter(plan))} = ${said(length)}; call out -${lengthDash} (${said(lengthDash / 16)})`,
  });
}
