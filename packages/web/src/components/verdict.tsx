import { VERDICT_SIGNS, VERDICT_WORDS, type Verdict as VerdictWord } from '@rivetside/shared';
import type { ReactNode } from 'react';
import classes from './verdict.module.css';

/** Sign, colour and words together: a verdict is never told by colour alone. Without words of its own it says the verdict's. */
export function Verdict({ verdict, children }: { verdict: VerdictWord; children?: ReactNode }): ReactNode {
  return (
    <span className={`${classes['verdict']} ${classes[verdict]}`}>
      <i aria-hidden="true">{VERDICT_SIGNS[verdict]}</i>
      <span>{children ?? VERDICT_WORDS[verdict]}</span>
    </span>
  );
}
