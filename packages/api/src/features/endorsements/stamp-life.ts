import { type Basis, type FixKind, STAMP_LIFE_MONTHS } from '@rivetside/shared';
import { addMonths, formatISO, parseISO } from 'date-fns';

/** What is only put off is looked at again sooner. House rule: product words, section 2. */
const PUT_OFF_MONTHS = 6;

/** The last day that a stamp given on a day may stand, by its basis and by what it stands under. */
export function lastGoodDay(givenOn: string, basis: Basis, kind: FixKind): string {
  const life = STAMP_LIFE_MONTHS[basis];
  const months = kind === 'defer' ? Math.min(life, PUT_OFF_MONTHS) : life;
  return formatISO(addMonths(parseISO(givenOn), months), { representation: 'date' });
}
