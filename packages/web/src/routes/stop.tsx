import { useLocation } from 'react-router-dom';
import { StopPage } from '../features/stop/stop-page';
import { usePageTitle } from '../lib/page-title';

export const handle = { crumbs: () => [{ label: 'Bench', to: '/bench' }, { label: 'Something is wrong' }] };

export function Component() {
  usePageTitle('Something is wrong');
  return <StopPage search={useLocation().search} />;
}
