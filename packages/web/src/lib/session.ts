import { queryOptions } from '@tanstack/react-query';
import type { Me, SignedIn, SignIn } from '@rivetside/shared';
import { useSyncExternalStore } from 'react';
import { access } from './access';
import { api } from './api';
import { createStore } from './store';

const me = createStore<Me | null>(null);
/** Somebody was signed in on this device and the server has not said yet whether they still are. */
const resuming = createStore(access.wasSignedIn());
let starting: Promise<Me | null> | null = null;
let isLeaving = false;

function enter(signedIn: SignedIn): Me {
  access.take(signedIn);
  resuming.set(false);
  me.set(signedIn.user);
  return signedIn.user;
}

async function resume(): Promise<Me | null> {
  if (!access.wasSignedIn()) return null;
  const signedIn = await access.refresh(null);
  if (signedIn === null) access.drop();
  else if (signedIn !== 'already') me.set(signedIn.user);
  return me.get();
}

/** Who is signed in on this page. */
export const session = {
  me: (): Me | null => (isLeaving ? null : me.get()),
  onChange: me.subscribe,

  /** Takes up an earlier session, once; a failed try, as without a network, may be made again. */
  start(): Promise<Me | null> {
    starting ??= resume()
      .catch((error: unknown) => {
        starting = null;
        throw error;
      })
      .finally(() => resuming.set(false));
    return starting;
  },

  async signIn(input: SignIn): Promise<Me> {
    const { signedInSchema } = await import('./answers');
    const signedIn = await api.post('/auth/sign-in', { body: input, answer: signedInSchema });
    starting = Promise.resolve(signedIn.user);
    return enter(signedIn);
  },

  /** Out on this page whatever the server says: a shared machine in a hangar must not stay signed in. */
  async signOut(goAway: () => void | Promise<void>): Promise<void> {
    await api.post('/auth/sign-out').catch(() => undefined);
    await session.leave(goAway);
  },

  /** The page shown is left first: it could not be drawn without whoever it is for. */
  async leave(goAway: () => void | Promise<void>): Promise<void> {
    isLeaving = true;
    try {
      await goAway();
    } finally {
      session.end();
    }
  },

  end(): void {
    isLeaving = false;
    starting = Promise.resolve(null);
    access.drop();
    me.set(null);
  },

  /** The session ended under somebody's hands: resolves when they have signed in again in the dialog. */
  lost: access.lost,

  /** The account changed, here or by a fresh reading. */
  changed(next: Me): Me {
    me.set(next);
    return next;
  },
};

export function useMe(): Me | null {
  return useSyncExternalStore(me.subscribe, me.get);
}

/** The shell of whoever was signed in stands before the answer has come: else it would be built twice. */
export function useIsResuming(): boolean {
  return useSyncExternalStore(resuming.subscribe, resuming.get);
}

export function useIsLost(): boolean {
  return useSyncExternalStore(access.onChange, access.isLost);
}

/** Whoever is signed in, as the shared policies ask for them. Only below a route that asks for a sign-in. */
export function useActor(): Me {
  const actor = useMe();
  if (!actor) throw new Error('This page is only for whoever is signed in.');
  return actor;
}

export const meQuery = queryOptions({
  queryKey: ['me'] as const,
  queryFn: async ({ signal }) => {
    const { meSchema } = await import('./answers');
    return session.changed(await api.get('/me', { answer: meSchema, signal }));
  },
});
