import { canAskIn, type SectionSummary } from '@rivetside/shared';
import type { QueryClient } from '@tanstack/react-query';
import { useQuery } from '@tanstack/react-query';
import { type LoaderFunctionArgs, Link, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import { PageCard } from '../components/page-card';
import { EmptyPage } from '../components/pages/empty-page';
import { ErrorPage } from '../components/pages/error-page';
import { NotFoundPage } from '../components/pages/not-found-page';
import { CardSkeleton, LinesSkeleton } from '../components/skeletons';
import { KitPlan } from '../features/kits/kit-plan';
import { kitKeys, kitList, kitSections, sectionById } from '../features/kits/queries';
import { SectionList } from '../features/kits/section-list';
import { SectionTabs } from '../features/kits/section-tabs';
import classes from '../features/kits/kits.module.css';
import { useLiveQuestions } from '../features/questions/use-live-questions';
import { usePageTitle } from '../lib/page-title';
import { useActor } from '../lib/session';

export const handle = { crumbs: () => [{ label: 'Kit' }] };

export const loader =
  (queryClient: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void queryClient.prefetchQuery(kitList);
    if (params['kitId']) void queryClient.prefetchQuery(kitSections(params['kitId']));
    return null;
  };

const MOVED = [kitKeys.all, kitKeys.sections];

export function Component() {
  usePageTitle('Kit');
  useLiveQuestions(MOVED);
  const asked = useParams()['kitId'];
  const { data: kits, error, refetch } = useQuery(kitList);
  if (error && !kits) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!kits) return <CardSkeleton lines={8} />;
  if (kits.items.length === 0)
    return (
      <EmptyPage title="There is no kit here yet.">
        <p>A kit steward puts in the sections, steps, parts and hole lines of a kit.</p>
      </EmptyPage>
    );
  const kit = asked ? kits.items.find(({ id }) => id === asked) : kits.items[0];
  return kit ? <KitPage kitId={kit.id} name={kit.name} /> : <NotFoundPage what="kit" />;
}

function KitPage({ kitId, name }: { readonly kitId: string; readonly name: string }) {
  const { data, error, refetch } = useQuery(kitSections(kitId));
  const [search] = useSearchParams();
  const navigate = useNavigate();
  if (error && !data) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!data) return <CardSkeleton lines={8} />;
  const sections = data.items;
  const chosen = sections.find(({ id }) => id === search.get('section')) ?? null;
  const addressOf = (sectionId: string) => `/kit/${kitId}?section=${sectionId}`;
  const choose = (sectionId: string) => void navigate(addressOf(sectionId), { preventScrollReset: true });
  return (
    <>
      <h1 className="unseen">{name}</h1>
      <div className={classes['kit']}>
        <div className={classes['column']}>
          <KitPlan sections={sections} chosenId={chosen?.id ?? null} onChoose={choose} />
          {chosen && <ChosenSection key={chosen.id} summary={chosen} />}
        </div>
        <SectionList sections={sections} chosenId={chosen?.id ?? null} addressOf={addressOf} />
      </div>
    </>
  );
}

function ChosenSection({ summary }: { readonly summary: SectionSummary }) {
  const me = useActor();
  const { data, error, refetch } = useQuery(sectionById(summary.id));
  const mayAsk = me.memberships.some(({ chapterId }) => canAskIn(me, chapterId));
  const open = <Link to={`/sections/${summary.id}`}>Open the section</Link>;
  return (
    <PageCard title={summary.name} aside={open}>
      {error && !data ? (
        <ErrorPage error={error} onTryAgain={() => void refetch()} />
      ) : !data ? (
        <LinesSkeleton />
      ) : (
        <SectionTabs section={data} mayAsk={mayAsk} />
      )}
    </PageCard>
  );
}
