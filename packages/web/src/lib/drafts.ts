import { del, get, set } from 'idb-keyval';
import { useCallback, useEffect, useRef, useState } from 'react';
import { Problem } from './problem';
import { randomKey } from './random-key';

const KEEP_AFTER_MS = 300;
const TRY_AGAIN_MS = 15_000;
const nameOf = (key: string) => `draft:${key}`;
const sendingNameOf = (key: string) => `sending:${key}`;

interface KeptDraft {
  readonly value: unknown;
  readonly savedAt: number;
}

/** Where the device keeps nothing (a private window), a draft lives as long as its page and nobody is stopped. */
async function quietly<T>(work: () => Promise<T>): Promise<T | undefined> {
  try {
    return await work();
  } catch {
    return undefined;
  }
}

async function readKept(key: string): Promise<KeptDraft | undefined> {
  return quietly(() => get<KeptDraft>(nameOf(key)));
}

export async function readDraft<T>(key: string): Promise<T | undefined> {
  return (await readKept(key))?.value as T | undefined;
}

/** When it was kept, or null where the device keeps nothing. Values may hold photos as Blobs. */
export async function keepDraft(key: string, value: unknown): Promise<Date | null> {
  const savedAt = Date.now();
  const kept = await quietly(async () => {
    await set(nameOf(key), { value, savedAt } satisfies KeptDraft);
    return true;
  });
  return kept ? new Date(savedAt) : null;
}

export async function dropDraft(key: string): Promise<void> {
  await quietly(() => del(nameOf(key)));
  await quietly(() => del(sendingNameOf(key)));
}

export interface Draft<T> {
  readonly value: T;
  readonly set: (next: T | ((before: T) => T)) => void;
  /** When the value as it stands was kept on this device. */
  readonly savedAt: Date | null;
  /** What was kept earlier has been read: before that, show no form. */
  readonly loaded: boolean;
  readonly drop: () => Promise<void>;
}

/** A value that survives a closed tab: kept shortly after each change and when the page is left. */
export function useDraft<T>(key: string, initial: T): Draft<T> {
  const [state, setState] = useState<{ value: T; loaded: boolean }>({ value: initial, loaded: false });
  const [savedAt, setSavedAt] = useState<Date | null>(null);
  const first = useRef(initial);
  const latest = useRef(initial);
  const unsaved = useRef(false);

  useEffect(() => {
    let here = true;
    void readKept(key).then((kept) => {
      // Whoever types before it is read has begun anew.
      if (!here || unsaved.current) return;
      latest.current = kept ? (kept.value as T) : first.current;
      setSavedAt(kept ? new Date(kept.savedAt) : null);
      setState({ value: latest.current, loaded: true });
    });
    return () => void (here = false);
  }, [key]);

  const save = useCallback(async () => {
    if (!unsaved.current) return;
    unsaved.current = false;
    setSavedAt(await keepDraft(key, latest.current));
  }, [key]);

  useEffect(() => {
    if (!unsaved.current) return;
    const timer = setTimeout(() => void save(), KEEP_AFTER_MS);
    return () => clearTimeout(timer);
  }, [state.value, save]);

  useEffect(() => {
    const leave = () => void save();
    window.addEventListener('pagehide', leave);
    document.addEventListener('visibilitychange', leave);
    return () => {
      window.removeEventListener('pagehide', leave);
      document.removeEventListener('visibilitychange', leave);
      leave();
    };
  }, [save]);

  const change = useCallback((next: T | ((before: T) => T)) => {
    latest.current = typeof next === 'function' ? (next as (before: T) => T)(latest.current) : next;
    unsaved.current = true;
    setState({ value: latest.current, loaded: true });
  }, []);

  const drop = useCallback(async () => {
    unsaved.current = false;
    setSavedAt(null);
    await dropDraft(key);
  }, [key]);

  return { ...state, set: change, savedAt, drop };
}

/**
 * Sends what a draft holds exactly once: the Idempotency-Key is kept beside the draft until the server has answered, so
 * that neither a lost answer nor a closed tab sends it twice. Without a network it waits for one. A refusal is thrown
 * and gives up the key, for what is sent next will be something else.
 */
export async function sendWhenOnline<T>(
  key: string,
  send: (idempotencyKey: string) => Promise<T>,
): Promise<T> {
  const name = sendingNameOf(key);
  const idempotencyKey = (await quietly(() => get<string>(name))) ?? randomKey();
  await quietly(() => set(name, idempotencyKey));
  for (;;) {
    try {
      const answer = await send(idempotencyKey);
      await quietly(() => del(name));
      return answer;
    } catch (error) {
      if (!(error instanceof Problem && error.isOffline)) {
        await quietly(() => del(name));
        throw error;
      }
      await networkOrPatience();
    }
  }
}

/** The browser tells of its own network only: a server that is away is asked again after a while. */
function networkOrPatience(): Promise<void> {
  return new Promise((resolve) => {
    const goOn = () => {
      clearTimeout(timer);
      window.removeEventListener('online', goOn);
      resolve();
    };
    const timer = setTimeout(goOn, TRY_AGAIN_MS);
    window.addEventListener('online', goOn);
  });
}
