import type { Build } from '@rivetside/shared';
import type { ReactNode } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { useActor } from '../../lib/session';
import classes from './bench.module.css';

/** The build of the address, else the reader's own before one they help on. */
export function useChosenBuild(builds: readonly Build[]): Build {
  const [search] = useSearchParams();
  const asked = builds.find(({ id }) => id === search.get('build'));
  const me = useActor();
  return asked ?? builds.find(({ owner }) => owner.id === me.id) ?? builds[0]!;
}

/** "Fellwisp Two, kit serial 141", and whose it is where it is not the reader's. */
export function aircraftWords({ kitName, serial, owner }: Build, meId: string): string {
  const words = `${kitName}, kit serial ${serial}`;
  return owner.id === meId ? words : `${words}, ${owner.name}`;
}

interface BuildSwitchProps {
  readonly builds: readonly Build[];
  readonly chosen: Build;
}

/** Nothing to choose with one build. */
export function BuildSwitch({ builds, chosen }: BuildSwitchProps): ReactNode {
  if (builds.length < 2) return null;
  return (
    <nav className={classes['builds']} aria-label="Builds">
      {builds.map(({ id, kitName, serial, owner }) => (
        <Link key={id} to={{ search: `?build=${id}` }} aria-current={id === chosen.id ? 'true' : undefined}>
          {kitName} {serial}, {owner.name}
        </Link>
      ))}
    </nav>
  );
}
