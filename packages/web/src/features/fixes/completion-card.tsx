import type { Completion, Fix, Question } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CheckLines } from '../../components/fit-check-lines';
import { PageCard } from '../../components/page-card';
import { PhotoStrip } from '../../components/photo-strip';
import { Verdict } from '../../components/verdict';
import { useTimes } from '../../lib/times';
import { useUnits } from '../../lib/units';
import classes from './fixes.module.css';

/** What was really done, by whom, and where it stands in the record. */
export function CompletionCard({
  sheet,
  isBuilder,
}: {
  readonly sheet: Question;
  readonly isBuilder: boolean;
}): ReactNode {
  const { dateTime } = useTimes();
  const units = useUnits();
  const { completion, fixes } = sheet;
  if (!completion) return null;
  const { by, at, check, photos, entryId } = completion;
  return (
    <PageCard title="Carried out" aside={`${by.name}, ${dateTime(at)}`}>
      <div className={classes['done']}>
        <DoneWords completion={completion} fix={fixes.find(({ id }) => id === completion.fixId)} />
        {check && (
          <details className={classes['check']}>
            <summary>
              As done: <Verdict verdict={check.verdict} />
            </summary>
            <CheckLines lines={check.checks} units={units} />
          </details>
        )}
        {photos.length > 0 && <PhotoStrip photos={photos} label="Photos as done" />}
        {entryId && isBuilder && <Link to="/record">In your record</Link>}
      </div>
    </PageCard>
  );
}

function DoneWords({
  completion,
  fix,
}: {
  readonly completion: Completion;
  readonly fix: Fix | undefined;
}): ReactNode {
  const { minutes, helpers, note, conditionsMet, conditionsLeft } = completion;
  const withWhom = helpers.length > 0 ? `, with ${helpers.join(' and ')}` : '';
  return (
    <>
      {fix && (
        <p>
          Fix {fix.number}, {fix.summary}: {minutes} minutes{withWhom}.
        </p>
      )}
      {note && <p className={classes['note']}>{note}</p>}
      {conditionsMet.length > 0 && <p>Conditions met: {conditionsMet.join('; ')}.</p>}
      {conditionsLeft.length > 0 && (
        <p className={classes['caution']}>Left open: {conditionsLeft.join('; ')}.</p>
      )}
    </>
  );
}
