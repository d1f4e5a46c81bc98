import type { Entry } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { useTimes } from '../../lib/times';
import { lineWords } from './line-words';
import { minutesInWords } from './minutes-in-words';
import classes from './record.module.css';

const KIND_WORDS: Readonly<Record<Entry['kind'], string>> = {
  work: 'Work',
  fix: 'Fix',
  visit: 'Shop visit',
  closeUp: 'Close-up',
};

/** A dated entry as it was written when it was done. */
export function EntryCard({ entry }: { readonly entry: Entry }): ReactNode {
  const times = useTimes();
  const { kind, sectionName, title, lines, questionId, questionNumber, doneAt } = entry;
  return (
    <li className={classes['entry']}>
      <p className={classes['when']}>
        <time dateTime={doneAt}>{times.dateTime(doneAt)}</time>
        <span>{[KIND_WORDS[kind], sectionName].filter(Boolean).join(' · ')}</span>
      </p>
      <div>
        <h3>{title}</h3>
        {lines.length > 0 && (
          <dl>
            {lines.map(({ label, text }, at) => (
              <div key={at}>
                <dt>{label}</dt>
                <dd>{lineWords(text, times)}</dd>
              </div>
            ))}
          </dl>
        )}
        <p className={classes['by']}>
          {byWords(entry)}
          {questionId && (
            <>
              {' · '}
              <Link to={`/questions/${questionId}`}>
                {questionNumber ? <CallOut>{questionNumber}</CallOut> : 'its question'}
              </Link>
            </>
          )}
        </p>
      </div>
    </li>
  );
}

function byWords({ by, helpers, minutes, photoCount }: Entry): string {
  const photos = photoCount === 1 ? 'one photo' : `${photoCount} photos`;
  return [
    helpers.length > 0 ? `${by.name}, with ${helpers.join(', ')}` : by.name,
    minutes !== null && minutesInWords(minutes),
    photoCount > 0 && photos,
  ]
    .filter(Boolean)
    .join(' · ');
}
