import { canAskIn, type Kit, type SectionSummary } from '@rivetside/shared';
import type { QueryClient } from '@tanstack/react-query';
import { useQuery } from '@tanstack/react-query';
import {
  Link,
  type LoaderFunctionArgs,
  useLocation,
  useNavigate,
  useParams,
  useSearchParams,
} from 'react-router-dom';
import { PageCard } from '../components/page-card';
import { EmptyPage } from '../components/pages/empty-page';
import { ErrorPage } from '../components/pages/error-page';
import { NotFoundPage } from '../components/pages/not-found-page';
import { CardSkeleton, LinesSkeleton } from '../components/skeletons';
import { BY_HAND, ComesIntoSight, isByHand } from '../features/kits/comes-into-sight';
import { KitPlan } from '../features/kits/kit-plan';
import { kitKeys, kitList, kitSections, sectionById } from '../features/kits/queries';
import { SectionList } from '../features/kits/section-list';
import { SectionTabs } from '../features/kits/section-tabs';
import classes from '../features/kits/kits.module.css';
import { useLiveQuestions } from '../features/questions/use-live-questions';
import { usePageTitle } from '../lib/page-title';
import { useActor } from '../lib/session';

export const handle = {
  crumbs: (kitName: string | null) =>
    kitName ? [{ label: 'Kit', to: '/kit' }, { label: kitName }] : [{ label: 'Kit' }],
};

const pick = (kits: readonly Kit[], kitId: string | undefined) =>
  kitId === undefined ? kits[0] : kits.find(({ id }) => id === kitId);

/** Gives the kit's name. What could not be read the page itself says, and reads again. */
export const loader =
  (queryClient: QueryClient) =>
  async ({ params }: LoaderFunctionArgs): Promise<string | null> => {
    if (params['kitId']) void queryClient.prefetchQuery(kitSections(params['kitId']));
    const kits = await queryClient.ensureQueryData(kitList).catch(() => null);
    return pick(kits?.items ?? [], params['kitId'])?.name ?? null;
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
  const kit = pick(kits.items, asked);
  return kit ? <KitPage kitId={kit.id} name={kit.name} /> : <NotFoundPage what="kit" />;
}

function KitPage({ kitId, name }: { readonly kitId: string; readonly name: string }) {
  const { data, error, refetch } = useQuery(kitSections(kitId));
  if (error && !data) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!data) return <CardSkeleton lines={8} />;
  const sections = data.items;
  if (sections.length === 0)
    return (
      <EmptyPage title={`${name} has no sections yet.`}>
        <p>A kit steward puts in its sections, steps, parts and hole lines.</p>
      </EmptyPage>
    );
  return (
    <>
      <h1 className="unseen">{name}</h1>
      <KitInSections kitId={kitId} sections={sections} />
    </>
  );
}

interface KitInSectionsProps {
  readonly kitId: string;
  readonly sections: readonly SectionSummary[];
}

/** The section chosen stands in the address. */
function KitInSections({ kitId, sections }: KitInSectionsProps) {
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const { state } = useLocation();
  const chosen = sections.find(({ id }) => id === search.get('section'));
  const chosenId = chosen?.id ?? null;
  const addressOf = (sectionId: string) => `/kit/${kitId}?section=${sectionId}`;
  const choose = (sectionId: string) =>
    void navigate(addressOf(sectionId), { preventScrollReset: true, state: BY_HAND });
  return (
    <div className={classes['kit']}>
      <div className={classes['plan']}>
        <KitPlan sections={sections} chosenId={chosenId} onChoose={choose} />
      </div>
      <div className={classes['list']}>
        <SectionList sections={sections} chosenId={chosenId} addressOf={addressOf} state={BY_HAND} />
      </div>
      {chosen && <ChosenSection key={chosen.id} summary={chosen} isByHand={isByHand(state)} />}
    </div>
  );
}

interface ChosenSectionProps {
  readonly summary: SectionSummary;
  readonly isByHand: boolean;
}

function ChosenSection({ summary, isByHand }: ChosenSectionProps) {
  const me = useActor();
  const { data, error, refetch } = useQuery(sectionById(summary.id));
  const mayAsk = me.memberships.some(({ chapterId }) => canAskIn(me, chapterId));
  const open = <Link to={`/sections/${summary.id}`}>Open the section</Link>;
  const isRead = data !== undefined || error !== null;
  return (
    <ComesIntoSight isWanted={isByHand && isRead} className={classes['chosen']}>
      <PageCard title={summary.name} aside={open}>
        {error && !data ? (
          <ErrorPage error={error} onTryAgain={() => void refetch()} />
        ) : !data ? (
          <LinesSkeleton />
        ) : (
          <SectionTabs section={data} mayAsk={mayAsk} />
        )}
      </PageCard>
    </ComesIntoSight>
  );
}
