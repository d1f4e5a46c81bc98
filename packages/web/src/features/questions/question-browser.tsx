import { keepPreviousData, useInfiniteQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { EmptyPage } from '../../components/pages/empty-page';
import { ErrorPage } from '../../components/pages/error-page';
import { LinesSkeleton } from '../../components/skeletons';
import { narrowings } from './filter-of-address';
import { questionPages } from './queries';
import { QuestionFilters, type QuestionFiltersProps } from './question-filters';
import { QuestionList } from './question-list';
import classes from './questions.module.css';

interface QuestionBrowserProps extends QuestionFiltersProps {
  readonly mayAsk: boolean;
}

/** What narrows the list, and the list with more of it on request. */
export function QuestionBrowser(props: QuestionBrowserProps): ReactNode {
  const { filter, mayAsk } = props;
  return (
    <>
      <QuestionFilters {...props} />
      <FoundQuestions filter={filter} mayAsk={mayAsk} />
    </>
  );
}

function FoundQuestions({ filter, mayAsk }: Pick<QuestionBrowserProps, 'filter' | 'mayAsk'>): ReactNode {
  const query = useInfiniteQuery({ ...questionPages(filter), placeholderData: keepPreviousData });
  const { data, error, isPlaceholderData, refetch } = query;
  if (error && !data) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!data) return <LinesSkeleton />;
  const rows = data.pages.flatMap(({ items }) => items);
  if (rows.length === 0) return <NoneFound filter={filter} mayAsk={mayAsk} />;
  return (
    <div aria-busy={isPlaceholderData}>
      <QuestionList rows={rows} label="Questions" />
      <ListFoot query={query} count={rows.length} />
    </div>
  );
}

interface ListFootProps {
  readonly count: number;
  readonly query: {
    readonly hasNextPage: boolean;
    readonly isFetchingNextPage: boolean;
    readonly isFetchNextPageError: boolean;
    readonly fetchNextPage: () => unknown;
  };
}

function ListFoot({ count, query }: ListFootProps): ReactNode {
  const { hasNextPage, isFetchingNextPage, isFetchNextPageError, fetchNextPage } = query;
  const shown = count === 1 ? 'One question.' : `${count} questions.`;
  return (
    <div className={classes['foot']}>
      {hasNextPage && (
        <button
          type="button"
          className="btn plain"
          aria-disabled={isFetchingNextPage || undefined}
          onClick={() => !isFetchingNextPage && void fetchNextPage()}
        >
          Show more
        </button>
      )}
      <p role="status">
        {isFetchNextPageError
          ? 'The next ones did not come. Those above are still here; try again.'
          : hasNextPage
            ? `${count} shown, there are more.`
            : shown}
      </p>
    </div>
  );
}

function NoneFound({ filter, mayAsk }: Pick<QuestionBrowserProps, 'filter' | 'mayAsk'>): ReactNode {
  if (narrowings(filter) > 0)
    return (
      <EmptyPage title="No question here fits all of that.">
        <p>Leave one of the filters out, or look with a part number, a drill or a number alone.</p>
        <Link className="btn plain" to="/questions">
          Show every question
        </Link>
      </EmptyPage>
    );
  return (
    <EmptyPage title="No question has been asked yet.">
      <p>A question begins at the bench: stop, measure, take a photo, then ask.</p>
      {mayAsk && (
        <Link className="btn" to="/stop">
          Something is wrong
        </Link>
      )}
    </EmptyPage>
  );
}
