import { Link, useNavigate, useSearchParams } from 'react-router-dom';
import { DemoPeople } from '../features/accounts/demo-people';
import { Door, OtherDoors } from '../features/accounts/form-parts';
import { SignInForm } from '../features/accounts/sign-in-form';
import { usePageTitle } from '../lib/page-title';
import { pageWanted } from '../lib/page-wanted';

export function Component() {
  usePageTitle('Sign in');
  const navigate = useNavigate();
  const [query] = useSearchParams();
  const goOn = () => void navigate(pageWanted(query.get('next')), { replace: true });
  return (
    <Door title="Sign in">
      <SignInForm onSignedIn={goOn} />
      <OtherDoors>
        <Link to="/forgotten">Forgotten password</Link>
        <Link to="/sign-up">Make an account</Link>
      </OtherDoors>
      <DemoPeople onSignedIn={goOn} />
    </Door>
  );
}
