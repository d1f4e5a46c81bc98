import type { ServerToClient, SheetEvent, SheetPresence } from '@rivetside/shared';
import { live, type SheetListener } from '../lib/live';

/**
 * Takes the place of the live connection for one test: nothing connects, and the test says what happens. Undone with
 * jest.restoreAllMocks().
 */
export function fakeLive() {
  const sheets = new Map<string, Set<SheetListener>>();
  const handlers = new Map<keyof ServerToClient, Set<(said: never) => void>>();
  const reconnected = new Set<() => void>();
  const written: boolean[] = [];
  const each = (questionId: string, tell: (listener: SheetListener) => void) =>
    [...(sheets.get(questionId) ?? [])].forEach(tell);

  jest.spyOn(live, 'joinSheet').mockImplementation((questionId, listener) => {
    sheets.set(questionId, (sheets.get(questionId) ?? new Set()).add(listener));
    return {
      leave: () => void sheets.get(questionId)?.delete(listener),
      writing: (on) => void written.push(on),
    };
  });
  jest.spyOn(live, 'on').mockImplementation((name, handler) => {
    const those = handlers.get(name) ?? new Set();
    handlers.set(name, those.add(handler as (said: never) => void));
    return () => void those.delete(handler as (said: never) => void);
  });
  jest.spyOn(live, 'onReconnect').mockImplementation((tell) => {
    reconnected.add(tell);
    return () => void reconnected.delete(tell);
  });

  return {
    /** What the page said about writing, in order. */
    written,
    joined: (questionId: string) => (sheets.get(questionId)?.size ?? 0) > 0,
    afterSeq: (questionId: string) => [...(sheets.get(questionId) ?? [])][0]?.afterSeq(),
    event: (event: SheetEvent) => each(event.questionId, (one) => one.onEvent(event)),
    presence: ({ questionId, people }: SheetPresence) => each(questionId, (one) => one.onPresence(people)),
    state: (questionId: string, state: 'live' | 'cutOff') => each(questionId, (one) => one.onState(state)),
    gap: (questionId: string) => each(questionId, (one) => one.onGap?.()),
    say<N extends keyof ServerToClient>(name: N, said: Parameters<ServerToClient[N]>[0]): void {
      handlers.get(name)?.forEach((handler) => handler(said as never));
    },
    reconnect: () => reconnected.forEach((tell) => tell()),
  };
}
