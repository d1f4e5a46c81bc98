import { canProposeFix, type Me, type Question, takesAdvice } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { standingOf } from '../../lib/standing';
import classes from './talk.module.css';

interface AskBackProps {
  readonly sheet: Question;
  readonly me: Me;
  readonly onAsk: (words: string) => void;
}

const MOST = 3;

/** One tap asks the builder for a number that is missing and would decide. */
export function AskBack({ sheet, me, onAsk }: AskBackProps): ReactNode {
  const missing = sheet.fitCheck?.missing.slice(0, MOST) ?? [];
  const standing = standingOf(sheet, me);
  const isAsker = sheet.askedBy.id === me.id;
  if (missing.length === 0 || isAsker || !canProposeFix(me, standing) || !takesAdvice(standing)) return null;
  return (
    <div className={classes['askBack']}>
      <span className="muted">Ask for</span>
      {missing.map((what) => (
        <button
          key={what}
          type="button"
          className="btn plain"
          onClick={() => onAsk(`Please measure: ${what}.`)}
        >
          {what}
        </button>
      ))}
    </div>
  );
}
