import { hasDesk } from '@rivetside/shared';
import type { QueryClient } from '@tanstack/react-query';
import { NoPermissionPage } from '../components/pages/no-permission-page';
import { DeskRacks } from '../features/desk/desk-racks';
import { deskQuery } from '../features/desk/queries';
import { QuestionList } from '../features/questions/question-list';
import { useLiveQuestions } from '../features/questions/use-live-questions';
import { usePageTitle } from '../lib/page-title';
import { session, useActor } from '../lib/session';

export const handle = { crumbs: () => [{ label: 'Questions', to: '/questions' }, { label: 'Mentor desk' }] };

export const loader = (queryClient: QueryClient) => () => {
  const me = session.me();
  if (me && hasDesk(me)) void queryClient.prefetchQuery(deskQuery);
  return null;
};

export function Component() {
  usePageTitle('Mentor desk');
  return (
    <>
      <h1 className="unseen">Mentor desk</h1>
      {hasDesk(useActor()) ? <OwnDesk /> : <NoPermissionPage />}
    </>
  );
}

const MOVED = [deskQuery.queryKey];

function OwnDesk() {
  useLiveQuestions(MOVED);
  return <DeskRacks show={(rows, label) => <QuestionList rows={rows} label={label} />} />;
}
