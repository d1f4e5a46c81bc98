import { OVERSIZE_ADJACENT, OVERSIZE_SHARE } from '../../trade/limits.js';
import { lacking, type Bench } from '../bench.js';
import type { CheckLine } from '../hole-card.schema.js';
import { known } from '../measured.js';
import { oversizeAllowed } from '../sums/pattern.js';
import { judged, notKnown, sourceOf, type Facts } from './judge.js';

interface Pattern {
  readonly count: number;
  readonly oversize: number;
  /** null: nobody said how many lie side by side. */
  readonly adjacent: number | null;
}

function patternLine(facts: Facts, { count, oversize, adjacent }: Pattern): CheckLine {
  const after = oversize + 1;
  const limit = oversizeAllowed(count);
  const tooMany = after > limit;
  const sideBySide = adjacent !== null && adjacent + 1 > OVERSIZE_ADJACENT.value;
  const verdict = tooMany || sideBySide ? 'outside' : 'inside';
  const code = tooMany ? 'pattern_limit' : sideBySide ? 'adjacent_limit' : 'ok';
  return judged(
    facts,
    { value: after, error: 0 },
    { limit, isMaximum: true, verdict, code },
    {
      formula: `${oversize} + 1 of ${count} oversize, at most ${limit}; side by side at most ${OVERSIZE_ADJACENT.value}`,
      remark: sideBySide ? `${adjacent + 1} side by side need special treatment.` : null,
    },
  );
}

/** How many rivets of the pattern would be oversize, and how many side by side. */
export function patternCheck(bench: Bench): CheckLine {
  const facts = {
    id: 'pattern',
    label: 'Oversize in the pattern',
    unit: 'rivets' as const,
    source: sourceOf(OVERSIZE_SHARE),
  };
  const { count, oversize, adjacentOversize } = bench.card.group ?? {};
  if (!known(count) || !known(oversize)) {
    const missing = lacking(
      bench,
      'how many rivets the pattern has, and how many of them are oversize already',
    );
    return notKnown(facts, missing, 'oversize + 1');
  }
  const adjacent = oversize === 0 ? 0 : (adjacentOversize ?? null);
  const line = patternLine(facts, { count, oversize, adjacent });
  if (adjacent !== null || line.verdict === 'outside') return line;
  return notKnown(
    facts,
    lacking(bench, 'how many oversize rivets lie side by side with this one'),
    line.formula,
  );
}
