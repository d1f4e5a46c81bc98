import type { ReactNode } from 'react';
import { Link, useLocation } from 'react-router-dom';
import { Icon, Mark } from './icons';
import { isAt, usePlaces } from './places';
import classes from './rail.module.css';

/** Left at a desk, at the foot of a phone: the same places in the same order. */
export function Rail({ more }: { readonly more: ReactNode }): ReactNode {
  const { pathname } = useLocation();
  const places = usePlaces();
  return (
    <nav className={classes['rail']} aria-label="Places">
      <Link to="/bench" className={classes['mark']} aria-label="Rivetside, to your bench">
        <Mark size={26} />
      </Link>
      {places.map((place) => (
        <Link
          key={place.to}
          to={place.to}
          className={classes['place']}
          aria-current={isAt(place, pathname) ? 'page' : undefined}
        >
          <Icon name={place.icon} />
          {place.label}
        </Link>
      ))}
      <span className={classes['more']}>{more}</span>
    </nav>
  );
}
