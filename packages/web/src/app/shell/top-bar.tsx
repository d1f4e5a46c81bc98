import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { useIsResuming, useMe } from '../../lib/session';
import { AccountMenu } from './account-menu';
import { Crumbs, PhoneCrumbs, useCrumbs } from './crumbs';
import { FindField } from './find-field';
import { Mark } from './icons';
import { UnitsSwitch } from './units-switch';
import classes from './top-bar.module.css';

export function TopBar(): ReactNode {
  const crumbs = useCrumbs();
  const me = useMe();
  const isResuming = useIsResuming();
  return me || isResuming ? (
    <header className={classes['top']}>
      <Crumbs crumbs={crumbs} />
      <PhoneCrumbs crumbs={crumbs} />
      <div className={classes['tools']}>
        <FindField />
        <UnitsSwitch />
        <AccountMenu shownAs="initials" />
      </div>
    </header>
  ) : (
    <GuestBar />
  );
}

function GuestBar(): ReactNode {
  return (
    <header className={`${classes['top']} ${classes['guest']}`}>
      <Link to="/" className={classes['home']}>
        <Mark size={36} />
        Rivetside
      </Link>
      <nav aria-label="Places">
        <Link to="/stop">Something is wrong</Link>
        <Link to="/sign-in">Sign in</Link>
      </nav>
    </header>
  );
}
