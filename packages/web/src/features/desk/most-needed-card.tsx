import type { QuestionRow } from '@rivetside/shared';
import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { ErrorPage } from '../../components/pages/error-page';
import { PageCard } from '../../components/page-card';
import { LinesSkeleton } from '../../components/skeletons';
import { needsMost } from './desk-words';
import { deskQuery } from './queries';
import classes from './desk.module.css';

const SHOWN = 4;

interface MostNeededCardProps {
  readonly show: (rows: readonly QuestionRow[], label: string) => ReactNode;
}

/** The top of the desk, on the bench of a mentor. */
export function MostNeededCard({ show }: MostNeededCardProps): ReactNode {
  const { data, error, refetch } = useQuery(deskQuery);
  const rows = data ? needsMost(data, SHOWN) : [];
  return (
    <PageCard title="What needs you most">
      {error && !data ? (
        <ErrorPage error={error} onTryAgain={() => void refetch()} />
      ) : !data ? (
        <LinesSkeleton />
      ) : rows.length === 0 ? (
        <p className={classes['quiet']}>Nothing waits for a fix, a stamp or another look of yours.</p>
      ) : (
        show(rows, 'What needs you most')
      )}
      <div className={classes['foot']}>
        <Link className="btn plain" to="/desk">
          To the mentor desk
        </Link>
      </div>
    </PageCard>
  );
}
