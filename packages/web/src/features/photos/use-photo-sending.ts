import { useCallback, useEffect, useRef, useState, type RefObject } from 'react';
import type { DraftPhoto } from './draft-photo';
import { sendPhoto, type PhotoWire } from './send-photos';

/** How far one photo is. A photo that is not told here is either sent or waits for its turn. */
export type Sending =
  | { readonly kind: 'sending'; readonly part: number }
  | { readonly kind: 'failed'; readonly reason: string }
  /** The network is gone: it is tried again by itself. */
  | { readonly kind: 'held' };

export interface PhotoSending {
  readonly of: (key: string) => Sending | null;
  readonly isBusy: boolean;
  readonly cancel: (key: string) => void;
  readonly retry: (key: string) => void;
}

interface SendingOptions {
  readonly photos: readonly DraftPhoto[];
  readonly onSent: (photo: DraftPhoto) => void;
  readonly isOnline: boolean;
  readonly wire: PhotoWire;
  /** What to tell of a failure, or null where the network alone is gone and the photo simply waits. */
  readonly reasonOf: (error: unknown) => string | null;
}

const AT_ONCE = 2;
const TRY_AGAIN_MS = 5_000;
const STOPPED = 'Stopped. It is kept here and was not sent.';

/** Nothing is sent, and nothing waits to be sent again, once the page is left. */
function useStopAtEnd(
  running: RefObject<Map<string, AbortController>>,
  timers: RefObject<Set<ReturnType<typeof setTimeout>>>,
) {
  useEffect(() => {
    const [stops, waits] = [running.current, timers.current];
    return () => {
      stops.forEach((stop) => stop.abort());
      waits.forEach(clearTimeout);
    };
  }, [running, timers]);
}

/** Sends photos as they are added, two at a time; without a network they wait, kept in the draft. */
export function usePhotoSending({ photos, onSent, isOnline, wire, reasonOf }: SendingOptions): PhotoSending {
  const [states, setStates] = useState<Readonly<Record<string, Sending>>>({});
  const running = useRef(new Map<string, AbortController>());
  const timers = useRef(new Set<ReturnType<typeof setTimeout>>());

  const tell = useCallback((key: string, sending: Sending | null) => {
    setStates(({ [key]: _old, ...rest }) => (sending ? { ...rest, [key]: sending } : rest));
  }, []);

  const start = useCallback(
    async (photo: DraftPhoto) => {
      const { key } = photo;
      const stop = new AbortController();
      running.current.set(key, stop);
      tell(key, { kind: 'sending', part: 0 });
      try {
        const onProgress = (part: number) => tell(key, { kind: 'sending', part });
        const sent = await sendPhoto(wire, photo, { onProgress, signal: stop.signal });
        running.current.delete(key);
        tell(key, null);
        onSent(sent);
      } catch (error) {
        running.current.delete(key);
        const reason = stop.signal.aborted ? STOPPED : reasonOf(error);
        if (reason !== null) return tell(key, { kind: 'failed', reason });
        tell(key, { kind: 'held' });
        timers.current.add(setTimeout(() => tell(key, null), TRY_AGAIN_MS));
      }
    },
    [onSent, reasonOf, tell, wire],
  );

  useEffect(() => {
    if (!isOnline) return;
    const waiting = photos.filter(({ key, sent }) => !sent && !running.current.has(key) && !states[key]);
    waiting.slice(0, AT_ONCE - running.current.size).forEach((photo) => void start(photo));
  }, [isOnline, photos, start, states]);

  // A photo taken out of the draft is not sent to its end.
  useEffect(() => {
    for (const [key, stop] of running.current) if (!photos.some((photo) => photo.key === key)) stop.abort();
  }, [photos]);

  useStopAtEnd(running, timers);

  return {
    of: (key) => states[key] ?? null,
    isBusy: Object.values(states).some(({ kind }) => kind === 'sending'),
    cancel: (key) => running.current.get(key)?.abort(),
    retry: (key) => tell(key, null),
  };
}
