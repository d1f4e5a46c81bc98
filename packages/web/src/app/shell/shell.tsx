import { lazy, type ReactNode, Suspense, useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation, useNavigation } from 'react-router-dom';
import { useIsLost, useIsResuming, useMe } from '../../lib/session';
import { AccountMenu } from './account-menu';
import { OfflineBanner } from './offline-banner';
import { Rail } from './rail';
import { TopBar } from './top-bar';
import classes from './shell.module.css';

const LostSession = lazy(async () => ({ default: (await import('./lost-session')).LostSession }));

export function Shell(): ReactNode {
  const me = useMe();
  const isLost = useIsLost();
  const isResuming = useIsResuming();
  const hasPlaces = isResuming || me !== null;
  const main = useFocusOnArrival();
  const isGoing = useNavigation().state === 'loading';
  return (
    <div className={hasPlaces ? classes['shell'] : undefined}>
      <a href="#page" className={classes['skip']}>
        Skip to the page
      </a>
      {hasPlaces && <Rail more={<AccountMenu shownAs="place" />} />}
      <div className={classes['beside']}>
        <TopBar />
        <OfflineBanner />
        {isGoing && <div className={classes['going']} role="progressbar" aria-label="Opening the page" />}
        <main id="page" ref={main} tabIndex={-1} className={classes['page']} aria-busy={isGoing || undefined}>
          <Outlet />
        </main>
      </div>
      {me && isLost && (
        <Suspense>
          <LostSession me={me} />
        </Suspense>
      )}
      <ScrollRestoration />
    </div>
  );
}

/** A new page begins at its beginning for whoever listens to it as well. */
function useFocusOnArrival() {
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const last = useRef(pathname);
  useEffect(() => {
    if (last.current === pathname) return;
    last.current = pathname;
    if (!main.current?.contains(document.activeElement)) main.current?.focus({ preventScroll: true });
  }, [pathname]);
  return main;
}
