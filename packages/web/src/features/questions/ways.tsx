import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import classes from './questions.module.css';

interface WaysProps {
  readonly mayAsk: boolean;
  readonly hasDesk: boolean;
}

/** From the list on: to one's desk, or to asking, which begins with stopping. */
export function Ways({ mayAsk, hasDesk }: WaysProps): ReactNode {
  return (
    <span className={classes['actions']}>
      {hasDesk && (
        <Link className="btn plain" to="/desk">
          Mentor desk
        </Link>
      )}
      {mayAsk && (
        <Link className="btn" to="/stop">
          Something is wrong
        </Link>
      )}
    </span>
  );
}
