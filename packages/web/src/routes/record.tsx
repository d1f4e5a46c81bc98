import type { Build } from '@rivetside/shared';
import type { QueryClient } from '@tanstack/react-query';
import { useQuery } from '@tanstack/react-query';
import { ErrorPage } from '../components/pages/error-page';
import { CardSkeleton } from '../components/skeletons';
import { NoBuildYet } from '../features/bench/first-things';
import { BuildSwitch, useChosenBuild } from '../features/bench/build-switch';
import { ownBuilds } from '../features/builds/queries';
import { useLiveQuestions } from '../features/questions/use-live-questions';
import { recordKeys } from '../features/record/queries';
import { EntriesCard, OpenItemsCard, RecordPage } from '../features/record/record-cards';
import { usePageTitle } from '../lib/page-title';

export const handle = { crumbs: () => [{ label: 'Bench', to: '/bench' }, { label: 'Record' }] };

export const loader = (queryClient: QueryClient) => () => {
  void queryClient.prefetchQuery(ownBuilds);
  return null;
};

export function Component() {
  usePageTitle('Record');
  const { data, error, refetch } = useQuery(ownBuilds);
  if (error && !data) return <ErrorPage error={error} onTryAgain={() => void refetch()} />;
  if (!data) return <CardSkeleton />;
  return data.items.length === 0 ? <NoBuildYet /> : <OwnRecord builds={data.items} />;
}

const MOVED = [recordKeys.all];

function OwnRecord({ builds }: { readonly builds: readonly Build[] }) {
  useLiveQuestions(MOVED);
  const build = useChosenBuild(builds);
  return (
    <>
      <h1 className="unseen">
        Record of {build.kitName}, kit serial {build.serial}
      </h1>
      <BuildSwitch builds={builds} chosen={build} />
      <RecordPage key={build.id}>
        <OpenItemsCard build={build} />
        <EntriesCard build={build} />
      </RecordPage>
    </>
  );
}
