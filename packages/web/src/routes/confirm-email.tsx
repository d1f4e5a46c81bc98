import { Link, useSearchParams } from 'react-router-dom';
import { ConfirmButton } from '../features/accounts/confirm-button';
import { Door } from '../features/accounts/form-parts';
import { usePageTitle } from '../lib/page-title';

export function Component() {
  usePageTitle('Confirm your e-mail');
  const token = useSearchParams()[0].get('token');
  return (
    <Door title="Confirm your e-mail">
      {token ? (
        <>
          <p>One press, and mails about your questions and your build come to this address.</p>
          <ConfirmButton token={token} />
        </>
      ) : (
        <p>
          The link is not whole: open it from the mail once more, or{' '}
          <Link to="/sign-up">make the account again</Link>.
        </p>
      )}
    </Door>
  );
}
