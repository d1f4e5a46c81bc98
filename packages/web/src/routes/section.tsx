import { type Build, canAskIn, type Section, type Step } from '@rivetside/shared';
import type { QueryClient } from '@tanstack/react-query';
import { useQuery } from '@tanstack/react-query';
import { Link, type LoaderFunctionArgs, useParams } from 'react-router-dom';
import { PageCard } from '../components/page-card';
import { ErrorPage } from '../components/pages/error-page';
import { NotFoundPage } from '../components/pages/not-found-page';
import { PlanLocator } from '../components/plan-locator';
import { CardSkeleton } from '../components/skeletons';
import { ownBuilds, sectionProgress, useSetProgress } from '../features/builds/queries';
import { StepState } from '../features/builds/step-state';
import { sectionLine } from '../features/kits/plan-fills';
import { kitKeys, sectionById } from '../features/kits/queries';
import { SectionTabs } from '../features/kits/section-tabs';
import classes from '../features/kits/kits.module.css';
import { useLiveQuestions } from '../features/questions/use-live-questions';
import { usePageTitle } from '../lib/page-title';
import { Problem, sentenceOf } from '../lib/problem';
import { useActor } from '../lib/session';

export const handle = {
  crumbs: (section: Section | null) =>
    section
      ? [{ label: section.kitName, to: `/kit/${section.kitId}` }, { label: section.name }]
      : [{ label: 'Kit', to: '/kit' }, { label: 'Section' }],
};

/** What could not be read the page itself says, and reads again. */
export const loader =
  (queryClient: QueryClient) =>
  ({ params }: LoaderFunctionArgs): Promise<Section | null> => {
    void queryClient.prefetchQuery(ownBuilds);
    return queryClient.ensureQueryData(sectionById(params['sectionId']!)).catch(() => null);
  };

const MOVED = [kitKeys.sections];

export function Component() {
  const sectionId = useParams()['sectionId']!;
  useLiveQuestions(MOVED);
  const { data: section, error, refetch } = useQuery(sectionById(sectionId));
  usePageTitle(section?.name ?? 'Section');
  if (error instanceof Problem && error.status === 404) return <NotFoundPage what="section" />;
  if (error && !section) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!section) return <CardSkeleton lines={8} />;
  return <SectionPage section={section} />;
}

function SectionPage({ section }: { readonly section: Section }) {
  const me = useActor();
  const builds = useQuery(ownBuilds).data?.items ?? [];
  const build = builds.find(({ kitId, mine }) => mine && kitId === section.kitId);
  const own = useOwnSteps(build, section.id);
  const mayAsk = me.memberships.some(({ chapterId }) => canAskIn(me, chapterId));
  return (
    <div className={classes['column']}>
      <PageCard
        title={section.kitName}
        aside={<Link to={`/kit/${section.kitId}?section=${section.id}`}>On the plan</Link>}
      >
        <div className={classes['head']}>
          <PlanLocator regions={section.regions} size={150} />
          <div className={classes['grow']}>
            <h1>{section.name}</h1>
            <p>
              {section.code} · {sectionLine(section)}
              {section.steward ? ` · kept by ${section.steward}` : ''}
            </p>
            {section.critical && <p>Critical: a fix here needs two stamps, none of them on experience.</p>}
          </div>
          <Link className="btn plain" to={`/questions?sectionId=${section.id}`}>
            Questions here
          </Link>
          {mayAsk && (
            <Link className="btn" to={`/stop?sectionId=${section.id}`}>
              Something is wrong here
            </Link>
          )}
        </div>
      </PageCard>
      <PageCard title="What there is here" aside={build && `your build, serial ${build.serial}`}>
        {own.refusal && (
          <p className={classes['refused']} role="alert">
            {own.refusal}
          </p>
        )}
        <SectionTabs
          section={section}
          mayAsk={mayAsk}
          progressOf={own.progressOf}
          serial={build?.serial}
          first="steps"
        />
      </PageCard>
    </div>
  );
}

/** How far the reader's own build has come, to be set step by step; nothing for whoever builds no such kit. */
function useOwnSteps(build: Build | undefined, sectionId: string) {
  const buildId = build?.id ?? '';
  const { data, error } = useQuery({ ...sectionProgress(buildId, sectionId), enabled: build !== undefined });
  const set = useSetProgress(buildId, sectionId);
  if (!build) return { progressOf: undefined, refusal: null };
  const states = data && new Map(data.steps.map(({ stepId, state }) => [stepId, state]));
  const progressOf = (step: Step) => (
    <StepState
      step={step}
      state={states ? (states.get(step.id) ?? 'todo') : null}
      onSet={(state) => set.mutate({ steps: [{ stepId: step.id, state }] })}
    />
  );
  const unread =
    data || !error ? null : `How far your build has come could not be read. ${sentenceOf(error)}`;
  return { progressOf, refusal: set.error ? `The step was not set. ${sentenceOf(set.error)}` : unread };
}
