import { type Basis, type FixKind, STAMP_LIFE_MONTHS } from '@rivetside/shared';
import { addMonths, formatISO } from 'date-fns';

/** What is only put off is looked at again sooner; the server holds to the same. */
const PUT_OFF_MONTHS = 6;

/** The last calendar day that a stamp may be given until, today. */
export function lastGoodDay(basis: Basis, kind: FixKind, today = new Date()): string {
  const months =
    kind === 'defer' ? Math.min(STAMP_LIFE_MONTHS[basis], PUT_OFF_MONTHS) : STAMP_LIFE_MONTHS[basis];
  return formatISO(addMonths(today, months), { representation: 'date' });
}
