import type { QuestionRow as Row } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { QuestionRow } from './question-row';
import { QuestionLine } from './question-line';
import classes from './questions.module.css';

interface QuestionListProps {
  readonly rows: readonly Row[];
  readonly label: string;
}

export function QuestionList({ rows, label }: QuestionListProps): ReactNode {
  return (
    <ul className={classes['list']} aria-label={label}>
      {rows.map((row) => (
        <QuestionRow key={row.id} row={row} />
      ))}
    </ul>
  );
}

/** The same questions in a narrow card: title, place, state. */
export function QuestionLines({ rows, label }: QuestionListProps): ReactNode {
  return (
    <ul className={classes['list']} aria-label={label}>
      {rows.map((row) => (
        <QuestionLine key={row.id} row={row} />
      ))}
    </ul>
  );
}
