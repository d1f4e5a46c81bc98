import { BASIS_WORDS, type EntryLine, type Fix, type Question } from '@rivetside/shared';
import type { CompletionEntity } from './completion.entity.js';

const inches = (value: number) => value.toFixed(3);

function measured({ asDone }: Pick<CompletionEntity, 'asDone'>): string {
  const { finalDrill, edgeDistances = [], shopHead, rivetLengthDash, readings = [] } = asDone;
  return [
    finalDrill && `final drill ${finalDrill}`,
    edgeDistances.length > 0 && `edge ${edgeDistances.map(inches).join(', ')}`,
    shopHead && `shop head ${inches(shopHead.width)} × ${inches(shopHead.height)}`,
    rivetLengthDash !== undefined && `rivet length ${rivetLengthDash}`,
    ...readings.map(
      ({ what, value, unit, u }) => `${what} ${value}${u === undefined ? '' : ` ± ${u}`} ${unit}`,
    ),
  ]
    .filter(Boolean)
    .join('; ');
}

/** Found, did, basis, measured, left open: what an inspector reads first, as it stood when it was done. */
export function entryLines(
  { title }: Pick<Question, 'title'>,
  fix: Fix,
  completion: Pick<CompletionEntity, 'asDone' | 'conditionsMet' | 'conditionsLeft' | 'note'>,
): EntryLine[] {
  const stamps = fix.endorsements.filter(({ state }) => state === 'live');
  const basis = stamps
    .map(({ stampNumber, by, basis: on, reference, givenAt }) =>
      [`stamp ${stampNumber}, ${by.name}, ${givenAt.slice(0, 10)}, ${BASIS_WORDS[on]}`, reference]
        .filter(Boolean)
        .join(': '),
    )
    .join('; ');
  const lines = [
    { label: 'Found', text: title },
    { label: 'Did', text: fix.operations.map(({ no, text }) => `Op ${no} ${text}`).join(' ') },
    { label: 'Basis', text: basis },
    { label: 'Measured', text: measured(completion) },
    { label: 'Conditions met', text: completion.conditionsMet.join('; ') },
    { label: 'Left open', text: completion.conditionsLeft.join('; ') },
    { label: 'Note', text: completion.note ?? '' },
  ];
  return lines.filter(({ text }) => text !== '');
}

/** The fix's own conditions and those of the stamps that stand. */
export function conditionsOf(fix: Fix): string[] {
  const live = fix.endorsements.filter(({ state }) => state === 'live');
  return [...new Set([...fix.conditions, ...live.flatMap(({ conditions }) => conditions)])];
}
