import { type QuestionState, STATE_WORDS } from '@rivetside/shared';
import type { ReactNode } from 'react';
import classes from './state-word.module.css';

/** How far a question has come, as a rubber stamp says it. */
export function StateWord({
  state,
  size = 'large',
}: {
  readonly state: QuestionState;
  readonly size?: 'small' | 'large';
}): ReactNode {
  return (
    <span className={classes['word']} data-state={state} data-size={size}>
      {STATE_WORDS[state]}
    </span>
  );
}
