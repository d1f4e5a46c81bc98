import type { Me } from '@rivetside/shared';
import { useCallback, useSyncExternalStore } from 'react';
import { api } from './api';
import { session } from './session';
import { createStore } from './store';

export type Units = Me['units'];
const KEPT = 'rivetside-units';

function onDevice(): Units {
  try {
    return localStorage.getItem(KEPT) === 'mm' ? 'mm' : 'inch';
  } catch {
    return 'inch';
  }
}

function keepOnDevice(units: Units): void {
  try {
    localStorage.setItem(KEPT, units);
  } catch {
    // Kept in the account then, or for this page alone.
  }
}

const units = createStore<Units>(onDevice());
let followed: string | null = null;

/** The account's units count on whichever device its owner signs in; a change on this page counts at once. */
function followAccount(): void {
  const me = session.me();
  if (me && me.id !== followed) set(me.units);
  followed = me?.id ?? null;
}
session.onChange(followAccount);

function set(next: Units): void {
  keepOnDevice(next);
  units.set(next);
}

export function useUnits(): Units {
  return useSyncExternalStore(units.subscribe, units.get);
}

export function useSetUnits(): (next: Units) => void {
  return useCallback((next: Units) => {
    set(next);
    if (!session.me()) return;
    void keepInAccount(next);
  }, []);
}

/** A network that is away must not turn the switch back under the reader's hand. */
async function keepInAccount(next: Units): Promise<void> {
  const { meSchema } = await import('./answers');
  await api
    .patch('/me', { body: { units: next }, answer: meSchema })
    .then(session.changed)
    .catch(() => undefined);
}
