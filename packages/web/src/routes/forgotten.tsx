import { Link } from 'react-router-dom';
import { ForgottenForm } from '../features/accounts/forgotten-form';
import { Door, OtherDoors } from '../features/accounts/form-parts';
import { usePageTitle } from '../lib/page-title';

export function Component() {
  usePageTitle('Forgotten password');
  return (
    <Door title="Forgotten password">
      <p>A link to choose a new one goes to the address of your account.</p>
      <ForgottenForm />
      <OtherDoors>
        <Link to="/sign-in">Sign in</Link>
      </OtherDoors>
    </Door>
  );
}
