import { MEASURING_TOOLS, type Limit } from '../../trade/limits.js';
import { sourceNamed } from '../../trade/sources.js';
import type { Reading } from '../geometry/hole-views.js';
import type { CheckCode, CheckLine, Verdict } from '../hole-card.schema.js';
import { said } from '../measured.js';
import { TOLERANCE } from '../sums/require.js';

/** On which side of a limit a reading lies, its measuring error counted. */
export type Side = 'inside' | 'outside' | 'tooClose';

/** Inside when v - U reaches the minimum, outside when v + U does not, else too close to call. */
export function againstMinimum({ value, error }: Reading, minimum: number): Side {
  if (value - error >= minimum - TOLERANCE) return 'inside';
  return value + error < minimum - TOLERANCE ? 'outside' : 'tooClose';
}

export function againstMaximum({ value, error }: Reading, maximum: number): Side {
  if (value + error <= maximum + TOLERANCE) return 'inside';
  return value - error > maximum + TOLERANCE ? 'outside' : 'tooClose';
}

/** The coarsest tool that would settle a margin, inch. */
export function settledBy(margin: number): string {
  const tool = MEASURING_TOOLS.find(({ error }) => error <= Math.abs(margin) + TOLERANCE);
  if (!tool) return `Too close to call: no shop tool settles ${said(Math.abs(margin))} in; take it as short.`;
  return `Too close to call: measured with ${tool.name} (± ${tool.error}) it would be settled.`;
}

const HOUSE = 'house rule';
const RECALLED = 'recalled, not read';

/** Where one or more limits stand, as it is named beside the number. */
export function sourceOf(...limits: readonly Pick<Limit, 'source' | 'how'>[]): string {
  const named = limits.flatMap(({ source, how }) => {
    const ids = source.map(sourceNamed);
    if (how === 'house') return [...ids, HOUSE];
    return how === 'memory' ? [...ids, RECALLED] : ids;
  });
  return [...new Set(named)].join('; ');
}

/** What a line is about, before anything is worked out. */
export type Facts = Pick<CheckLine, 'id' | 'label' | 'unit' | 'source'>;

/** How a reading stands against the limit that decides. */
export interface Finding {
  readonly limit: number;
  /** Most checks have a minimum. */
  readonly isMaximum?: boolean;
  readonly verdict: Verdict;
  readonly code: CheckCode;
}

interface Words {
  readonly formula: string;
  readonly remark?: string | null;
}

/** A line that could be worked out. Field by field, not spread: fitCheck runs at every key that is pressed. */
export function judged(facts: Facts, reading: Reading, finding: Finding, words: Words): CheckLine {
  const { value, error } = reading;
  return {
    id: facts.id,
    label: facts.label,
    value,
    unit: facts.unit,
    limit: finding.limit,
    margin: finding.isMaximum ? finding.limit - value : value - finding.limit,
    verdict: finding.verdict,
    code: finding.code,
    source: facts.source,
    formula: words.formula,
    error: error > 0 ? error : null,
    remark: words.remark ?? null,
  };
}

/** A line that could not be: it names what is missing, and never improves a remedy. */
export function notKnown(facts: Facts, missing: string, formula: string): CheckLine {
  return {
    id: facts.id,
    label: facts.label,
    value: null,
    unit: facts.unit,
    limit: null,
    margin: null,
    verdict: 'unknown',
    code: 'not_measured',
    source: facts.source,
    formula,
    error: null,
    remark: `Missing: ${missing}.`,
  };
}

const SEVERITY: readonly Verdict[] = ['inside', 'marginal', 'unknown', 'outside'];

/** How bad a verdict is: outside, then unknown, then marginal. */
export function severityOf(verdict: Verdict): number {
  return SEVERITY.indexOf(verdict);
}

/** The worst line decides; without a line nothing is known. */
export function worstVerdict(lines: readonly { verdict: Verdict }[]): Verdict {
  if (lines.length === 0) return 'unknown';
  return SEVERITY[Math.max(...lines.map(({ verdict }) => severityOf(verdict)))]!;
}
