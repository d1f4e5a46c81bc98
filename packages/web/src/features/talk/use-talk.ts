import { type Photo, type SheetEvent, sheetEventSchema } from '@rivetside/shared';
import { useCallback, useEffect, useRef, useState } from 'react';
import { api } from '../../lib/api';
import { useDraft } from '../../lib/drafts';
import { Problem, sentenceOf } from '../../lib/problem';
import { randomKey } from '../../lib/random-key';

const TRY_AGAIN_MS = 10_000;

/** A line that was written here and is not yet on the sheet. */
export interface WaitingLine {
  /** Its Idempotency-Key too: however often it is sent, it stands there once. */
  readonly key: string;
  readonly body: string;
  readonly photos: readonly Photo[];
  readonly at: string;
  /** Why the server did not take it; it stays until its writer decides. */
  readonly refused: string | null;
}

export interface Talk {
  readonly waiting: readonly WaitingLine[];
  readonly say: (body: string, photos: readonly Photo[]) => void;
  readonly tryAgain: (key: string) => void;
  /** Gives the words back to the field. */
  readonly takeBack: (key: string) => WaitingLine | undefined;
}

/** Lines are kept on the device until the sheet has them, and sent one after the other in the order written. */
export function useTalk(questionId: string, onSent: (event: SheetEvent) => void): Talk {
  const { value: waiting, set, loaded } = useDraft<readonly WaitingLine[]>(`talk-waiting:${questionId}`, []);
  const isSending = useRef(false);
  const [turn, setTurn] = useState(0);
  const next = waiting.find(({ refused }) => refused === null);

  const change = useCallback(
    (key: string, line: (old: WaitingLine) => WaitingLine | null) =>
      set((old) => old.flatMap((one) => (one.key === key ? (line(one) ?? []) : [one]))),
    [set],
  );

  useEffect(() => {
    if (!loaded || !next || isSending.current) return;
    isSending.current = true;
    const { key, body, photos } = next;
    const photoIds = photos.map(({ id }) => id);
    const sent = { body, ...(photoIds.length > 0 ? { photoIds } : {}) };
    const goOn = () => {
      isSending.current = false;
      setTurn((count) => count + 1);
    };
    api
      .post(`/questions/${questionId}/messages`, { body: sent, key, answer: sheetEventSchema })
      .then((event) => {
        change(key, () => null);
        onSent(event);
        goOn();
      })
      .catch((error: unknown) => {
        if (error instanceof Problem && error.isOffline) return void whenOnline(goOn);
        change(key, (old) => ({ ...old, refused: sentenceOf(error) }));
        goOn();
      });
  }, [loaded, next, turn, questionId, change, onSent]);

  return {
    waiting,
    say: (body, photos) =>
      set((old) => [...old, { key: randomKey(), body, photos, at: new Date().toISOString(), refused: null }]),
    tryAgain: (key) => change(key, (old) => ({ ...old, refused: null })),
    takeBack: (key) => {
      const line = waiting.find((one) => one.key === key);
      change(key, () => null);
      return line;
    },
  };
}

/** The browser tells of its own network only; a server that is away is asked again after a while. */
function whenOnline(goOn: () => void): void {
  const go = () => {
    clearTimeout(timer);
    window.removeEventListener('online', go);
    goOn();
  };
  const timer = setTimeout(go, TRY_AGAIN_MS);
  window.addEventListener('online', go);
}
