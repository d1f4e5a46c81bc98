import { AboutYouForm } from '../features/accounts/about-you-form';
import { AccountCard, AccountCards } from '../features/accounts/form-parts';
import { EmailForm, PasswordForm } from '../features/accounts/credentials-forms';
import { SessionList } from '../features/accounts/session-list';
import { usePageTitle } from '../lib/page-title';
import { useMe } from '../lib/session';

export const handle = { crumbs: () => [{ label: 'Bench', to: '/bench' }, { label: 'Your account' }] };

export function Component() {
  usePageTitle('Your account');
  const me = useMe();
  if (!me) return null;
  return (
    <AccountCards>
      <AccountCard title="About you">
        <AboutYouForm key={me.id} me={me} />
      </AccountCard>
      <AccountCard title="Signed in on">
        <SessionList />
      </AccountCard>
      <AccountCard title="E-mail">
        <EmailForm email={me.email} />
      </AccountCard>
      <AccountCard title="Password">
        <PasswordForm />
      </AccountCard>
    </AccountCards>
  );
}
