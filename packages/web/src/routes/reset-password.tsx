import { Link, useSearchParams } from 'react-router-dom';
import { Door } from '../features/accounts/form-parts';
import { ResetForm } from '../features/accounts/reset-form';
import { usePageTitle } from '../lib/page-title';

export function Component() {
  usePageTitle('New password');
  const token = useSearchParams()[0].get('token');
  return (
    <Door title="Choose a new password">
      {token ? (
        <ResetForm token={token} />
      ) : (
        <p>
          The link is not whole: open it from the mail once more, or{' '}
          <Link to="/forgotten">ask for a new one</Link>.
        </p>
      )}
    </Door>
  );
}
