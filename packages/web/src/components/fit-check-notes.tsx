import { STOP_WORDS, type StopCode } from '@rivetside/shared';
import type { ReactNode } from 'react';
import classes from './fit-check-table.module.css';

/** Reasons to stop and ask the kit maker, or a licensed engineer or mechanic, before anything is drilled. */
export function StopNotes({ codes }: { codes: readonly StopCode[] }): ReactNode {
  if (codes.length === 0) return null;
  return (
    <div className={classes['stop']} role="note" aria-label="Stop and ask">
      <b>Stop, and ask the kit maker or a licensed engineer or mechanic first:</b>
      <ul>
        {codes.map((code) => (
          <li key={code}>{STOP_WORDS[code]}</li>
        ))}
      </ul>
    </div>
  );
}

interface CheckNotesProps {
  readonly assumptions: readonly string[];
  readonly missing: readonly string[];
  /** What opens the sums. */
  readonly opener: 'figure' | 'result';
}

/** What nobody measured yet, what was taken as given, and what the whole check is not. */
export function CheckNotes({ assumptions, missing, opener }: CheckNotesProps): ReactNode {
  return (
    <div className={classes['notes']}>
      {missing.length > 0 && (
        <>
          <b>Not measured yet, and it would decide:</b>
          <ul>
            {missing.map((what) => (
              <li key={what}>{what}</li>
            ))}
          </ul>
        </>
      )}
      {assumptions.length > 0 && (
        <>
          <b>Taken as given:</b>
          <ul>
            {assumptions.map((what) => (
              <li key={what}>{what}</li>
            ))}
          </ul>
        </>
      )}
      <p>
        Each {opener} opens its formula, its source and its limit. Inside published numbers is not approval.
      </p>
    </div>
  );
}
