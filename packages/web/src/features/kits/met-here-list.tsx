import type { Section } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { StateWord } from '../../components/state-word';
import { useTimes } from '../../lib/times';
import classes from './kits.module.css';

/** What others met here, and what they did about it. */
export function MetHereList({ section: { metHere, name } }: { readonly section: Section }): ReactNode {
  const { date } = useTimes();
  if (metHere.length === 0)
    return (
      <p className={classes['quiet']}>Nobody has an endorsed fix in {name} yet, as far as you may see.</p>
    );
  return metHere.map(({ questionId, number, title, state, place, fixSummary, carriedOutAt }) => (
    <div key={questionId} className={classes['line']}>
      <h3>
        <Link to={`/questions/${questionId}`}>{title}</Link>
      </h3>
      <p>
        <CallOut>{number}</CallOut> {place} <StateWord state={state} size="small" />
      </p>
      {fixSummary && (
        <p>
          {fixSummary}
          {carriedOutAt ? `, carried out ${date(carriedOutAt)}` : ''}
        </p>
      )}
    </div>
  ));
}
