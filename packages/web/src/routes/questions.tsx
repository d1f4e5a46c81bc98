import { canAskIn, hasDesk, type Me } from '@rivetside/shared';
import type { QueryClient } from '@tanstack/react-query';
import { useQueries, useQuery } from '@tanstack/react-query';
import { type LoaderFunctionArgs, useSearchParams } from 'react-router-dom';
import type { Choice } from '../components/field';
import { PageCard } from '../components/page-card';
import { chapterList } from '../features/bench/queries';
import { kitList, kitSections } from '../features/kits/queries';
import { addressOfFilter, filterOfAddress } from '../features/questions/filter-of-address';
import { type QuestionFilter, questionPages } from '../features/questions/queries';
import { QuestionBrowser } from '../features/questions/question-browser';
import { Ways } from '../features/questions/ways';
import { useLiveQuestions } from '../features/questions/use-live-questions';
import { usePageTitle } from '../lib/page-title';
import { useActor } from '../lib/session';

export const handle = { crumbs: () => [{ label: 'Questions' }] };

/** Begun, not waited for: the page stands at once and its lines come. */
export const loader =
  (queryClient: QueryClient) =>
  ({ request }: LoaderFunctionArgs) => {
    const { searchParams } = new URL(request.url);
    void queryClient.prefetchInfiniteQuery(questionPages(filterOfAddress(searchParams)));
    return null;
  };

export function Component() {
  usePageTitle('Questions');
  useLiveQuestions();
  const me = useActor();
  const [search, setSearch] = useSearchParams();
  const filter = filterOfAddress(search);
  const chapters = useQuery(chapterList).data?.items ?? [];
  const handleChange = (next: QuestionFilter) =>
    setSearch(addressOfFilter(next), { replace: true, preventScrollReset: true });
  return (
    <>
      <h1 className="unseen">Questions</h1>
      <PageCard title="By what they wait for" aside={<Ways mayAsk={mayAsk(me)} hasDesk={hasDesk(me)} />}>
        <QuestionBrowser
          filter={filter}
          onChange={handleChange}
          sections={useSectionChoices()}
          chapters={chapters.map(({ id, name }) => ({ value: id, label: name }))}
          mayAsk={mayAsk(me)}
        />
      </PageCard>
    </>
  );
}

function mayAsk(me: Me): boolean {
  return me.memberships.some(({ chapterId }) => canAskIn(me, chapterId));
}

/** Where there is more than one kit a section is named with its own. */
function useSectionChoices(): Choice[] {
  const kits = useQuery(kitList).data?.items ?? [];
  const answers = useQueries({ queries: kits.map(({ id }) => kitSections(id)) });
  return kits.flatMap((kit, at) =>
    (answers[at]?.data?.items ?? []).map(({ id, name }) => ({
      value: id,
      label: kits.length > 1 ? `${kit.name}, ${name}` : name,
    })),
  );
}
