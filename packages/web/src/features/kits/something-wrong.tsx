import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { queryString } from '../../lib/api';
import classes from './kits.module.css';

interface SomethingWrongProps {
  readonly place: Readonly<Record<string, string>>;
  /** The part, step or hole line, so that many such links are told apart. */
  readonly about: string;
}

/** To the stop page first, which hands the place on to Ask. */
export function SomethingWrong({ place, about }: SomethingWrongProps): ReactNode {
  return (
    <Link className={classes['wrong']} to={`/stop${queryString(place)}`}>
      Something is wrong here<span className="unseen"> at {about}</span>
    </Link>
  );
}
