import { Link } from 'react-router-dom';
import { Door, OtherDoors } from '../features/accounts/form-parts';
import { SignUpForm } from '../features/accounts/sign-up-form';
import { usePageTitle } from '../lib/page-title';

export function Component() {
  usePageTitle('Make an account');
  return (
    <Door title="Make an account">
      <SignUpForm />
      <OtherDoors>
        <Link to="/sign-in">Sign in instead</Link>
      </OtherDoors>
    </Door>
  );
}
