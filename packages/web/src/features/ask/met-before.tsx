import { STATE_WORDS, type SimilarQuestion } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { HoleDrawingMini } from '../../components/hole-drawing-mini';
import classes from './ask.module.css';

function alikeWords({ alikeIn, differsIn, question }: SimilarQuestion): string {
  return [
    alikeIn.length > 0 && `alike in ${alikeIn.join(', ')}`,
    differsIn.length > 0 && `differs in ${differsIn.join(', ')}`,
    STATE_WORDS[question.state].toLowerCase(),
  ]
    .filter(Boolean)
    .join(' · ');
}

interface MetBeforeProps {
  readonly found: readonly SimilarQuestion[] | undefined;
  readonly isError: boolean;
}

/** Questions met before that are like this one, drawn to one scale, with what is alike and what differs in words. */
export function MetBefore({ found, isError }: MetBeforeProps): ReactNode {
  if (isError && !found) return <p className={classes['quiet']}>Could not be looked for just now.</p>;
  if (!found) return <p className={classes['quiet']}>Looked for as you type.</p>;
  if (found.length === 0) return <p className={classes['quiet']}>Nothing like it was met here yet.</p>;
  return (
    <ul className={classes['met']}>
      {found.map((one) => (
        <li key={one.question.id}>
          {one.holeCard && (
            <HoleDrawingMini card={one.holeCard} label={`Hole card of ${one.question.number}`} />
          )}
          <div>
            <Link to={`/questions/${one.question.id}`} target="_blank" rel="noopener">
              {one.question.title}
            </Link>
            <p>{alikeWords(one)}</p>
          </div>
        </li>
      ))}
    </ul>
  );
}
