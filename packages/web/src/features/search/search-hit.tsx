import type { SearchHit as Hit } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { StateWord } from '../../components/state-word';
import { Fragments } from './fragments';
import { addressOfHit } from './group-hits';
import classes from './search.module.css';

const STANDING_WORDS: Readonly<Record<NonNullable<Hit['standing']>, string>> = {
  withdrawn: 'stamp withdrawn',
  held: 'stamp held',
  expired: 'stamp past its date',
};

/** A line of the answer: what it is, where, the words found, and how far it can be leant on. */
export function SearchHit({ hit }: { readonly hit: Hit }): ReactNode {
  const address = addressOfHit(hit);
  const title = <Fragments of={hit.title} />;
  return (
    <li className={classes['hit']}>
      <div>
        <h3>{address ? <Link to={address}>{title}</Link> : title}</h3>
        <p className={classes['place']}>{hit.place}</p>
        <p className={classes['excerpt']}>
          <Fragments of={hit.excerpt} />
        </p>
      </div>
      {(hit.state || hit.standing) && (
        <div className={classes['standing']}>
          {hit.state && <StateWord state={hit.state} size="small" />}
          {hit.standing && <b data-standing={hit.standing}>{STANDING_WORDS[hit.standing]}</b>}
        </div>
      )}
    </li>
  );
}
