import type { Build, OpenItem } from '@rivetside/shared';
import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { EmptyPage } from '../../components/pages/empty-page';
import { ErrorPage } from '../../components/pages/error-page';
import { PageCard } from '../../components/page-card';
import { LinesSkeleton } from '../../components/skeletons';
import { useTimes } from '../../lib/times';
import { EntryCard } from './entry-card';
import { openCount } from './open-count';
import { ClearedItems, OpenItems } from './open-items';
import { buildOpenItems, entryPages } from './queries';
import classes from './record.module.css';

/** The dated entries, newest first. */
export function EntriesCard({ build }: { readonly build: Build }): ReactNode {
  const { date } = useTimes();
  return (
    <PageCard title="Entries" aside={`begun ${date(build.startedOn)}`}>
      <Entries buildId={build.id} />
    </PageCard>
  );
}

function Entries({ buildId }: { readonly buildId: string }): ReactNode {
  const query = useInfiniteQuery(entryPages(buildId));
  const { data, error, refetch, hasNextPage, isFetchingNextPage, fetchNextPage } = query;
  if (error && !data) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!data) return <LinesSkeleton />;
  const entries = data.pages.flatMap(({ items }) => items);
  if (entries.length === 0) return <NoEntries />;
  return (
    <>
      <ol className={classes['list']} aria-label="Entries, newest first">
        {entries.map((entry) => (
          <EntryCard key={entry.id} entry={entry} />
        ))}
      </ol>
      {hasNextPage && (
        <div className={classes['foot']}>
          <button
            type="button"
            className="btn plain"
            aria-disabled={isFetchingNextPage || undefined}
            onClick={() => !isFetchingNextPage && void fetchNextPage()}
          >
            Show more
          </button>
        </div>
      )}
    </>
  );
}

function NoEntries(): ReactNode {
  return (
    <EmptyPage title="Nothing is written here yet.">
      <p>When you carry out a fix, what you did and measured becomes the first entry.</p>
      <Link className="btn plain" to="/questions?mine=true">
        To your questions
      </Link>
    </EmptyPage>
  );
}

/** What is still open on the whole build, and below it what was cleared. */
export function OpenItemsCard({ build }: { readonly build: Build }): ReactNode {
  const { data, error, refetch } = useQuery(buildOpenItems(build.id));
  const open = data?.items.filter(({ clearedAt }) => clearedAt === null);
  return (
    <PageCard title="Open items" aside={open && openCount(open.length)}>
      {data ? (
        <ItemsOfBuild items={data.items} mayClear={build.mine} />
      ) : error ? (
        <ErrorPage error={error} onTryAgain={() => void refetch()} />
      ) : (
        <LinesSkeleton />
      )}
    </PageCard>
  );
}

interface ItemsOfBuildProps {
  readonly items: readonly OpenItem[];
  readonly mayClear: boolean;
}

function ItemsOfBuild({ items, mayClear }: ItemsOfBuildProps): ReactNode {
  const open = items.filter(({ clearedAt }) => clearedAt === null);
  const cleared = items.filter(({ clearedAt }) => clearedAt !== null);
  return (
    <>
      {open.length === 0 && <p className={classes['quiet']}>Nothing is open on this build.</p>}
      <OpenItems items={open} label="Open items" mayClear={mayClear} />
      {cleared.length > 0 && <ClearedItems items={cleared} />}
    </>
  );
}

/** What is still open comes first where there is one column, and stands at the right where there are two. */
export function RecordPage({ children }: { readonly children: ReactNode }): ReactNode {
  return <div className={classes['page']}>{children}</div>;
}
