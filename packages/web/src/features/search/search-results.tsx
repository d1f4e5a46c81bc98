import { useInfiniteQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { CallOut } from '../../components/call-out';
import { EmptyPage } from '../../components/pages/empty-page';
import { ErrorPage } from '../../components/pages/error-page';
import { PageCard } from '../../components/page-card';
import { LinesSkeleton } from '../../components/skeletons';
import { groupHits, KIND_WORDS } from './group-hits';
import { searchPages } from './queries';
import { SearchHit } from './search-hit';
import classes from './search.module.css';

export function SearchResults({ q }: { readonly q: string }): ReactNode {
  const query = useInfiniteQuery(searchPages(q));
  const { data, error, refetch, hasNextPage, isFetchingNextPage, fetchNextPage } = query;
  if (q === '') return <HowToSearch title="What are you looking for?" />;
  if (error && !data) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!data) return <LinesSkeleton />;
  const hits = data.pages.flatMap(({ items }) => items);
  if (hits.length === 0) return <HowToSearch title={`Nothing was found for “${q}”.`} />;
  return (
    <>
      <p role="status" className="unseen">
        {hits.length === 1 ? 'One place found.' : `${hits.length} places found.`}
      </p>
      {groupHits(hits).map(({ kind, hits: those }) => (
        <PageCard key={kind} title={KIND_WORDS[kind]}>
          <ul className={classes['hits']} aria-label={KIND_WORDS[kind]}>
            {those.map((hit) => (
              <SearchHit key={hit.id} hit={hit} />
            ))}
          </ul>
        </PageCard>
      ))}
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
    </>
  );
}

const EXAMPLES: readonly { readonly q: string; readonly means: string }[] = [
  { q: 'STB/dr-03', means: 'a part by its number' },
  { q: '#30', means: 'a drill, also as “No 30” or “0.1285”' },
  { q: '0.387 AD6', means: 'numbers as measured, with the rivet' },
  { q: 'doubler edge', means: 'words, in any order' },
];

function HowToSearch({ title }: { readonly title: string }): ReactNode {
  return (
    <EmptyPage title={title}>
      <p>One field looks through questions, fixes, sections, steps, parts, hole lines and notices. Try:</p>
      <ul className={classes['examples']}>
        {EXAMPLES.map(({ q, means }) => (
          <li key={q}>
            <Link to={{ pathname: '/search', search: new URLSearchParams({ q }).toString() }}>
              <CallOut>{q}</CallOut>
            </Link>{' '}
            {means}
          </li>
        ))}
      </ul>
    </EmptyPage>
  );
}
