import type { ReactNode } from 'react';
import { isRouteErrorResponse, Link, useRevalidator, useRouteError } from 'react-router-dom';
import { usePageTitle } from '../../lib/page-title';
import { Problem } from '../../lib/problem';
import classes from './route-error.module.css';

interface Trouble {
  readonly title: string;
  readonly detail: string;
  readonly mayTryAgain: boolean;
}

const GONE: Trouble = {
  title: 'There is nothing at this address.',
  detail: 'The link may be old, or what it led to is not for you to see. Nothing of yours was changed.',
  mayTryAgain: false,
};
const NOT_YOURS: Trouble = {
  title: 'This page is not open to you.',
  detail: 'Your chapter admin can tell you who may see it, and can change that.',
  mayTryAgain: false,
};
const NO_NETWORK: Trouble = {
  title: 'There is no network.',
  detail: 'What you typed before is kept on this device. “Something is wrong” can be read without a network.',
  mayTryAgain: true,
};
const NEWER: Trouble = {
  title: 'This page could not be opened.',
  detail: 'What was sent before is kept. Try again; if it stays like this, load the page anew.',
  mayTryAgain: true,
};

export function troubleOf(error: unknown): Trouble {
  const isKnown = error instanceof Problem || isRouteErrorResponse(error);
  // A page whose script was never fetched fails like this too.
  if (!isKnown) return navigator.onLine ? NEWER : NO_NETWORK;
  if (error.status === 0) return NO_NETWORK;
  if (error.status === 404) return GONE;
  if (error.status === 403) return NOT_YOURS;
  return error instanceof Problem ? { ...NEWER, title: error.title } : NEWER;
}

/** What happened, what was kept, and what to do, in place of a page. */
export function RouteError(): ReactNode {
  const error = useRouteError();
  const { revalidate } = useRevalidator();
  // A script that did not come is not asked for twice by every browser; the page as a whole is.
  const isOfPage = !(error instanceof Problem) && !isRouteErrorResponse(error);
  const tryAgain = () => (isOfPage && navigator.onLine ? window.location.reload() : void revalidate());
  return <TroubleCard {...troubleOf(error)} onTryAgain={tryAgain} />;
}

export function NowherePage(): ReactNode {
  return <TroubleCard {...GONE} />;
}

function TroubleCard(props: Trouble & { readonly onTryAgain?: () => void }): ReactNode {
  const { title, detail, mayTryAgain, onTryAgain } = props;
  usePageTitle(title);
  return (
    <section className={classes['error']} role="alert">
      <h1>{title}</h1>
      <p>{detail}</p>
      <div>
        {mayTryAgain && (
          <button type="button" className="btn" onClick={onTryAgain}>
            Try again
          </button>
        )}
        <Link to="/" className="btn plain">
          To the start
        </Link>
        {mayTryAgain && (
          <Link to="/stop" className="btn plain">
            Something is wrong
          </Link>
        )}
      </div>
    </section>
  );
}
