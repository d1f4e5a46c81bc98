import { HOLES_MISSING, lacking, rivetName, type Bench, type Plan } from '../bench.js';
import { reckon } from '../geometry/hole-views.js';
import type { CheckCode, CheckLine, Verdict } from '../hole-card.schema.js';
import { known, said } from '../measured.js';
import { rivetHole } from '../sums/holes.js';
import {
  againstMaximum,
  againstMinimum,
  judged,
  notKnown,
  settledBy,
  sourceOf,
  type Facts,
  type Side,
} from './judge.js';

export interface HoleLimit {
  /** inch */
  readonly maximum: number;
  readonly source: string;
}

/** Largest hole that a rivet still fills: the kit maker's for the rivet as drawn, else the house value; null for AD8 and sizes without a row. */
export function holeLimit(bench: Bench, dash: number): HoleLimit | null {
  const kit = bench.limits?.holeMaximum;
  if (known(kit) && dash === bench.card.rivet.dash) return { maximum: kit, source: bench.limits!.source };
  const maximum = rivetHole(dash)?.maximum;
  return known(maximum) ? { maximum, source: sourceOf({ source: [], how: 'house' }) } : null;
}

const VERDICTS: Readonly<Record<Side, Verdict>> = {
  inside: 'inside',
  outside: 'outside',
  tooClose: 'marginal',
};

function needed(bench: Bench) {
  return reckon(bench.views, [], (view) => view.minimum);
}

/** Whether the holes as they are, taken together, still fit the rivet. */
export function roundCheck(bench: Bench): CheckLine {
  const { dash } = bench.card.rivet;
  const limit = holeLimit(bench, dash);
  const facts = {
    id: 'round',
    label: 'Holes taken together',
    unit: 'in' as const,
    source: limit?.source ?? '',
  };
  const formula = 'smallest circle round all holes';
  if (!limit)
    return notKnown(facts, lacking(bench, `the largest hole for ${rivetName(bench.card, dash)}`), formula);
  const reading = needed(bench);
  const { atLeast } = bench.views.base;
  if (!reading) {
    if (atLeast <= limit.maximum) return notKnown(facts, lacking(bench, HOLES_MISSING), formula);
    return overTheLimit(facts, atLeast, limit.maximum);
  }
  const side = againstMaximum(reading, limit.maximum);
  const code: CheckCode =
    side === 'inside' ? 'ok' : side === 'outside' ? 'over_hole_maximum' : 'too_close_to_call';
  return judged(
    facts,
    reading,
    { limit: limit.maximum, isMaximum: true, verdict: VERDICTS[side], code },
    {
      formula: `${formula} ${said(reading.value)}, at most ${said(limit.maximum)}`,
      remark: side === 'tooClose' ? settledBy(limit.maximum - reading.value) : null,
    },
  );
}

/** A part of the holes is not known, and what is known is too large already. */
function overTheLimit(facts: Facts, atLeast: number, maximum: number): CheckLine {
  const finding = { limit: maximum, isMaximum: true, verdict: 'outside', code: 'over_hole_maximum' } as const;
  return judged(facts, { value: atLeast, error: 0 }, finding, {
    formula: `the holes that were measured need ${said(atLeast)}, at most ${said(maximum)}`,
  });
}

function finalCode(side: Side, skips: boolean): CheckCode {
  if (skips) return 'skips_size';
  if (side === 'inside') return 'ok';
  return side === 'outside' ? 'not_cleaned' : 'too_close_to_call';
}

const DRILL_SOURCE = `${sourceOf({ source: ['S20'], how: 'restated' })}; exact geometry`;

/** Whether the plan's hole cleans up all holes. `skips`: it takes a rivet more than one size up. */
export function cleanUpCheck(bench: Bench, plan: Plan, skips: boolean): CheckLine {
  const facts = { id: 'cleanUp', label: 'Final hole', unit: 'in' as const, source: DRILL_SOURCE };
  const reading = needed(bench);
  if (!reading)
    return notKnown(facts, lacking(bench, HOLES_MISSING), 'final hole ≥ smallest circle round all holes');
  const { finalHole } = plan;
  if (!finalHole) {
    return {
      ...facts,
      value: null,
      limit: reading.value,
      margin: null,
      error: reading.error || null,
      verdict: 'outside',
      code: 'no_drill',
      formula: `no drill from ${said(reading.value)} up that ${rivetName(bench.card, plan.dash)} still fills`,
      remark: null,
    };
  }
  const margin = { value: finalHole.diameter, error: reading.error };
  const side = againstMinimum(margin, reading.value);
  const code = finalCode(side, skips);
  const skipped = 'A rivet size would be skipped: ask.';
  const verdict = skips ? 'outside' : VERDICTS[side];
  return judged(
    facts,
    margin,
    { limit: reading.value, verdict, code },
    {
      formula: `${finalHole.drill} ${said(finalHole.diameter)} ≥ ${said(reading.value)}`,
      remark: skips ? skipped : side === 'tooClose' ? settledBy(finalHole.diameter - reading.value) : null,
    },
  );
}
