import type { ReactNode } from 'react';
import { Link, useMatches } from 'react-router-dom';
import classes from './top-bar.module.css';

export interface Crumb {
  readonly label: string;
  readonly to?: string;
}
/** What a route file may export as `handle`. */
export interface RouteHandle {
  readonly crumbs?: (data: never, params: Readonly<Record<string, string | undefined>>) => readonly Crumb[];
}

/** Whatever lies above the page shown, and the page itself last. */
export function useCrumbs(): readonly Crumb[] {
  const matches = useMatches();
  return matches.flatMap(({ handle, loaderData, params }) => {
    const crumbs = (handle as RouteHandle | undefined)?.crumbs;
    return crumbs ? crumbs(loaderData as never, params) : [];
  });
}

export function Crumbs({ crumbs }: { readonly crumbs: readonly Crumb[] }): ReactNode {
  if (crumbs.length === 0) return <span />;
  return (
    <nav className={classes['crumbs']} aria-label="Where this is">
      <ol>
        {crumbs.map(({ label, to }, at) => (
          <li key={`${at} ${label}`}>
            {at === crumbs.length - 1 ? (
              <b aria-current="page">{label}</b>
            ) : to ? (
              <Link to={to}>{label}</Link>
            ) : (
              <span>{label}</span>
            )}
          </li>
        ))}
      </ol>
    </nav>
  );
}

/** On a phone there is room for the way back and the name of the page. */
export function PhoneCrumbs({ crumbs }: { readonly crumbs: readonly Crumb[] }): ReactNode {
  const above = crumbs.slice(0, -1).findLast(({ to }) => to !== undefined);
  return (
    <div className={classes['phoneCrumbs']}>
      {above?.to ? <Link to={above.to}>‹ {above.label}</Link> : <Link to="/">Rivetside</Link>}
      <b>{crumbs.at(-1)?.label}</b>
    </div>
  );
}
