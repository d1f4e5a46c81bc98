import {
  type Build,
  isBuilderIn,
  hasDesk,
  type Me,
  type Section,
  type SectionSummary,
} from '@rivetside/shared';
import type { QueryClient } from '@tanstack/react-query';
import { useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { ErrorPage } from '../components/pages/error-page';
import { PlanKey } from '../components/plan-key';
import { PlanView } from '../components/plan-view';
import { CardSkeleton } from '../components/skeletons';
import { AllDriven, BenchPage, onePerKit, TwoColumns } from '../features/bench/bench-parts';
import { aircraftWords, BuildSwitch, useChosenBuild } from '../features/bench/build-switch';
import { MentorsCard } from '../features/bench/chapter-card';
import { NoBuildYet, NoChapterYet } from '../features/bench/first-things';
import { KitNoticesCard } from '../features/bench/kit-notices-card';
import { OnTheBench } from '../features/bench/on-the-bench';
import { regionsOnPlan, sectionAt } from '../features/bench/regions-on-plan';
import { sectionInHand } from '../features/bench/section-in-hand';
import { ownBuilds } from '../features/builds/queries';
import { MostNeededCard } from '../features/desk/most-needed-card';
import { deskQuery } from '../features/desk/queries';
import { kitNotices, kitSections, sectionById } from '../features/kits/queries';
import { firstQuestions } from '../features/questions/queries';
import { LINES_SHOWN, QuestionLinesCard } from '../features/questions/question-lines-card';
import { QuestionLines } from '../features/questions/question-list';
import { useLiveQuestions } from '../features/questions/use-live-questions';
import { BeforeClosingCard } from '../features/record/before-closing-card';
import { buildOpenItems, recordKeys } from '../features/record/queries';
import { usePageTitle } from '../lib/page-title';
import { session, useActor } from '../lib/session';

export const handle = { crumbs: () => [{ label: 'Bench' }] };

const MINE = { mine: 'true' } as const;

export const loader = (queryClient: QueryClient) => () => {
  const me = session.me();
  void queryClient.prefetchQuery(ownBuilds);
  if (me && hasDesk(me)) void queryClient.prefetchQuery(deskQuery);
  return null;
};

const MOVED = [deskQuery.queryKey, recordKeys.all];

export function Component() {
  usePageTitle('Bench');
  useLiveQuestions(MOVED);
  const me = useActor();
  const isIn = me.siteRole !== null || me.memberships.some(({ status }) => status === 'active');
  return (
    <BenchPage>
      <h1 className="unseen">Bench of {me.name}</h1>
      {isIn ? <Parts me={me} /> : <NoChapterYet memberships={me.memberships} />}
    </BenchPage>
  );
}

/** One part for each thing that somebody is in their chapters; those who wait for them come first. */
function Parts({ me }: { readonly me: Me }) {
  const isBuilder = me.memberships.some(({ chapterId }) => isBuilderIn(me, chapterId));
  const runs = me.memberships.filter(
    ({ status, roles }) => status === 'active' && roles.includes('chapterAdmin'),
  );
  return (
    <>
      {hasDesk(me) && <MostNeededCard show={(rows, label) => <QuestionLines rows={rows} label={label} />} />}
      <BuilderPart me={me} isBuilder={isBuilder} />
      {runs.map(({ chapterId, chapterName }) => (
        <ChapterPart key={chapterId} chapterId={chapterId} chapterName={chapterName} />
      ))}
    </>
  );
}

/** Whoever helps on a build without being a builder of the chapter has a bench too. */
function BuilderPart({ me, isBuilder }: { readonly me: Me; readonly isBuilder: boolean }) {
  const { data, error, refetch } = useQuery(ownBuilds);
  if (error && !data) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!data) return <CardSkeleton />;
  if (data.items.length > 0) return <BuildsPart builds={onePerKit(data.items, me.id)} />;
  return isBuilder ? (
    <>
      <NoBuildYet />
      <OwnQuestions />
    </>
  ) : null;
}

function BuildsPart({ builds }: { readonly builds: readonly Build[] }) {
  const build = useChosenBuild(builds);
  const { data, error, refetch } = useQuery(kitSections(build.kitId));
  return (
    <>
      <BuildSwitch builds={builds} chosen={build} />
      {error && !data ? (
        <ErrorPage error={error} onTryAgain={() => void refetch()} />
      ) : !data ? (
        <CardSkeleton />
      ) : (
        <BuildPart key={build.id} build={build} sections={data.items} />
      )}
    </>
  );
}

interface BuildPartProps {
  readonly build: Build;
  readonly sections: readonly SectionSummary[];
}

function BuildPart({ build, sections }: BuildPartProps) {
  const inHand = sectionInHand(sections);
  const notices = useQuery(kitNotices(build.kitId));
  return (
    <>
      {inHand ? (
        <InHand build={build} sections={sections} inHand={inHand} />
      ) : (
        <AllDriven kitName={build.kitName} />
      )}
      <TwoColumns
        left={
          <>
            {inHand && <BeforeClosingCard build={build} section={inHand} />}
            <OwnQuestions />
          </>
        }
        right={<KitNoticesCard notices={notices} serial={build.serial} />}
      />
    </>
  );
}

function InHand({ build, sections, inHand }: BuildPartProps & { readonly inHand: SectionSummary }) {
  const me = useActor();
  const { data: section, error, refetch } = useQuery(sectionById(inHand.id));
  const questions = useQuery(firstQuestions(MINE, LINES_SHOWN)).data?.items ?? [];
  const openItems = useQuery(buildOpenItems(build.id)).data?.items ?? [];
  if (error && !section) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!section) return <CardSkeleton />;
  return (
    <OnTheBench
      aircraft={aircraftWords(build, me.id)}
      plan={<KitPlan sections={sections} section={section} />}
      section={section}
      sections={sections}
      questions={questions}
      openItems={openItems}
    />
  );
}

function KitPlan({
  sections,
  section,
}: {
  readonly sections: readonly SectionSummary[];
  readonly section: Section;
}) {
  const navigate = useNavigate();
  const handleChoose = (region: string) => {
    const there = sectionAt(sections, section, region);
    if (there) void navigate(`/sections/${there.id}`);
  };
  return (
    <>
      <PlanView
        name="The kit, with what is on the bench"
        regions={regionsOnPlan(sections, section)}
        onChoose={handleChoose}
      />
      <PlanKey shows={['waits', 'held']} />
    </>
  );
}

function OwnQuestions() {
  return (
    <QuestionLinesCard
      title="Your questions"
      filter={MINE}
      empty={<p>You have asked nothing yet. When a hole does not fit: stop, measure, then ask.</p>}
    />
  );
}

function ChapterPart({
  chapterId,
  chapterName,
}: {
  readonly chapterId: string;
  readonly chapterName: string;
}) {
  return (
    <TwoColumns
      left={
        <QuestionLinesCard
          title={`No fix yet in ${chapterName}`}
          filter={{ chapterId, state: 'open', sort: 'waiting' }}
          empty={<p>Every question of the chapter has a fix to look at.</p>}
        />
      }
      right={<MentorsCard chapterId={chapterId} chapterName={chapterName} />}
    />
  );
}
