import type { SignedIn } from '@rivetside/shared';
import { Problem } from './problem';

/** On the device: somebody was signed in here. Without it a first visit asks the server nothing and is refused nothing. */
const HINT = 'rivetside-signed-in';
const LOCK = 'rivetside-refresh';

let token: string | null = null;
let refreshing: Promise<SignedIn | null> | null = null;
let waiting: { promise: Promise<void>; resolve: () => void; reject: (why: Problem) => void } | null = null;
const listeners = new Set<() => void>();

function tell(): void {
  for (const listener of [...listeners]) listener();
}

function kept<T>(read: () => T): T | null {
  try {
    return read();
  } catch {
    // A browser that keeps nothing still lets one in, for as long as the page is open.
    return null;
  }
}

/** The access token lives in memory alone; the refresh cookie is out of reach of any script. */
export const access = {
  token: (): string | null => token,
  isLost: (): boolean => waiting !== null,
  wasSignedIn: (): boolean => kept(() => localStorage.getItem(HINT)) !== null,

  onChange(listener: () => void): () => void {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },

  take(signedIn: SignedIn): void {
    token = signedIn.accessToken;
    kept(() => localStorage.setItem(HINT, '1'));
    waiting?.resolve();
    waiting = null;
    tell();
  },

  drop(): void {
    token = null;
    kept(() => localStorage.removeItem(HINT));
    waiting?.reject(new Problem({ status: 401, title: 'You are signed out.' }));
    waiting = null;
    tell();
  },

  /**
   * A new token for one that was refused; null when the session has ended. Tabs take turns: two that show the same
   * cookie at once look like a stolen one, and the server then ends every session of the family.
   */
  refresh(refused: string | null): Promise<SignedIn | null | 'already'> {
    if (token !== refused) return Promise.resolve('already');
    refreshing ??= inTurn(askForNewToken).finally(() => (refreshing = null));
    return refreshing;
  },

  /** The session ended while somebody was working: whoever calls this goes on once they have signed in again. */
  lost(): Promise<void> {
    if (!waiting) {
      let resolve = (): void => undefined;
      let reject = (_: Problem): void => undefined;
      const promise = new Promise<void>((yes, no) => {
        resolve = yes;
        reject = no;
      });
      waiting = { promise, resolve, reject };
      tell();
    }
    return waiting.promise;
  },
};

function inTurn<T>(task: () => Promise<T>): Promise<T> {
  return navigator.locks ? navigator.locks.request(LOCK, task) : task();
}

async function askForNewToken(): Promise<SignedIn | null> {
  const answer = await fetch('/api/auth/refresh', { method: 'POST', credentials: 'same-origin' }).catch(
    () => {
      throw Problem.noNetwork();
    },
  );
  if (answer.status === 401) return null;
  const body: unknown = await answer.json().catch(() => null);
  if (!answer.ok) throw Problem.ofAnswer(answer.status, body);
  const { signedInSchema } = await import('./answers');
  const signedIn = signedInSchema.parse(body);
  access.take(signedIn);
  return signedIn;
}
