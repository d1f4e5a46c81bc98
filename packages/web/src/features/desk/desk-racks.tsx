import type { Desk, QuestionRow } from '@rivetside/shared';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { EmptyPage } from '../../components/pages/empty-page';
import { ErrorPage } from '../../components/pages/error-page';
import { PageCard } from '../../components/page-card';
import { LinesSkeleton } from '../../components/skeletons';
import { useActor } from '../../lib/session';
import { disciplinesOf } from './desk-words';
import { deskQuery } from './queries';
import classes from './desk.module.css';

const RACKS: readonly { readonly rack: keyof Desk; readonly title: string; readonly says: string }[] = [
  { rack: 'review', title: 'To be looked at again', says: 'a notice or an objection touched them' },
  { rack: 'firstFix', title: 'No fix yet', says: 'nobody has advised' },
  { rack: 'stamp', title: 'Wait for a stamp', says: 'a fix of somebody else stands' },
];

interface DeskRacksProps {
  /** How a question is shown; the desk only says which ones wait. */
  readonly show: (rows: readonly QuestionRow[], label: string) => ReactNode;
}

/** What waits for this mentor, by what it waits for, the longest waiting first. */
export function DeskRacks({ show }: DeskRacksProps): ReactNode {
  const { data, error, refetch } = useQuery(deskQuery);
  const own = disciplinesOf(useActor());
  return (
    <div className={classes['desk']}>
      <p className={classes['own']}>
        {own.length > 0
          ? `Your disciplines: ${own.join(', ')}.`
          : 'You mentor in no discipline yet: your chapter admin grants them.'}
      </p>
      {error && !data ? (
        <ErrorPage error={error} onTryAgain={() => void refetch()} />
      ) : !data ? (
        <PageCard title="What needs you most">
          <LinesSkeleton />
        </PageCard>
      ) : (
        <Racks desk={data} show={show} />
      )}
    </div>
  );
}

function Racks({ desk, show }: DeskRacksProps & { readonly desk: Desk }): ReactNode {
  const filled = RACKS.filter(({ rack }) => desk[rack].length > 0);
  if (filled.length === 0) return <NothingWaits />;
  return filled.map(({ rack, title, says }) => (
    <PageCard key={rack} title={title} aside={says}>
      {show(desk[rack], title)}
    </PageCard>
  ));
}

function NothingWaits(): ReactNode {
  return (
    <EmptyPage title="Nothing waits for you.">
      <p>
        Every question in your disciplines has a fix and its stamps. A new one, or one that a notice touches,
        comes here by itself.
      </p>
      <Link className="btn plain" to="/questions">
        To all questions
      </Link>
    </EmptyPage>
  );
}
