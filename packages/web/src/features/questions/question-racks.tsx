import type { QuestionState } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { addressOfFilter } from './filter-of-address';
import type { QuestionFilter } from './queries';
import classes from './questions.module.css';

const RACKS: readonly { readonly label: string; readonly state: QuestionState | undefined }[] = [
  { label: 'All', state: undefined },
  { label: 'No fix yet', state: 'open' },
  { label: 'Wait for a stamp', state: 'advised' },
  { label: 'To be carried out', state: 'endorsed' },
  { label: 'At the kit maker', state: 'referred' },
  { label: 'Under review', state: 'underReview' },
  { label: 'Carried out', state: 'carriedOut' },
  { label: 'Withdrawn', state: 'withdrawn' },
];

/** Where questions lie by what they wait for. */
export function QuestionRacks({ filter }: { readonly filter: QuestionFilter }): ReactNode {
  return (
    <nav className={classes['racks']} aria-label="By what they wait for">
      {RACKS.map(({ label, state }) => (
        <Link
          key={label}
          to={{ search: addressOfFilter({ ...filter, state }).toString() }}
          aria-current={filter.state === state ? 'true' : undefined}
          preventScrollReset
        >
          {label}
        </Link>
      ))}
    </nav>
  );
}
