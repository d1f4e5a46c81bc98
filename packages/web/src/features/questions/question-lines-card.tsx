import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { ErrorPage } from '../../components/pages/error-page';
import { PageCard } from '../../components/page-card';
import { LinesSkeleton } from '../../components/skeletons';
import { addressOfFilter } from './filter-of-address';
import { firstQuestions, type QuestionFilter } from './queries';
import { QuestionLines } from './question-list';
import classes from './questions.module.css';

/** Enough to see where things stand; the rest is on the page of questions. */
export const LINES_SHOWN = 6;

interface QuestionLinesCardProps {
  readonly title: string;
  readonly filter: QuestionFilter;
  readonly empty: ReactNode;
}

/** The first few questions of a list, and the way to all of them. */
export function QuestionLinesCard({ title, filter, empty }: QuestionLinesCardProps): ReactNode {
  const { data, error, refetch } = useQuery(firstQuestions(filter, LINES_SHOWN));
  const isEmpty = data?.items.length === 0;
  return (
    <PageCard title={title}>
      {error && !data ? (
        <ErrorPage error={error} onTryAgain={() => void refetch()} />
      ) : !data ? (
        <LinesSkeleton />
      ) : isEmpty ? (
        <div className={classes['foot']}>{empty}</div>
      ) : (
        <QuestionLines rows={data.items} label={title} />
      )}
      {data?.nextCursor && (
        <div className={classes['foot']}>
          <Link
            className="btn plain"
            to={{ pathname: '/questions', search: addressOfFilter(filter).toString() }}
          >
            Show all
          </Link>
        </div>
      )}
    </PageCard>
  );
}
