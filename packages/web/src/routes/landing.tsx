import { Welcome } from '../features/welcome/welcome';
import { usePageTitle } from '../lib/page-title';

export function Component() {
  usePageTitle('');
  return <Welcome />;
}
