import type { QuestionRow as Row } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { StateWord } from '../../components/state-word';
import { useTimes } from '../../lib/times';
import { waitWords } from './wait-words';
import classes from './questions.module.css';

export function QuestionLine({ row }: { readonly row: Row }): ReactNode {
  const times = useTimes();
  return (
    <li className={classes['line']}>
      <div>
        <Link to={`/questions/${row.id}`}>{row.title}</Link>
        {row.unread && <span className={classes['unread']}>something new</span>}
        <small>
          <CallOut>{row.partNumber ?? row.holeLineCode ?? row.number}</CallOut> · {waitWords(row, times)}
        </small>
      </div>
      <StateWord state={row.state} size="small" />
    </li>
  );
}
