import type { Question, SheetEvent, SheetPresence } from '@rivetside/shared';
import { useQueryClient } from '@tanstack/react-query';
import { useCallback, useEffect, useRef, useState } from 'react';
import { type JoinedSheet, live } from '../../lib/live';
import { questionSheet, sheetKeys, sheetWire } from './queries';
import { applySheetEvents } from './sheet-events';

type People = SheetPresence['people'];

export interface LiveSheet {
  readonly people: People;
  /** The connection is broken: what is shown may be old, and catches up by itself. */
  readonly isCutOff: boolean;
  readonly writing: (on: boolean) => void;
  /** Puts down what this page has just written, before it is heard. */
  readonly take: (event: SheetEvent) => void;
}

/** Keeps a sheet as it happens: events in their order, none twice, and whatever was missed fetched by its number. */
export function useLiveSheet(questionId: string): LiveSheet {
  const queryClient = useQueryClient();
  const [people, setPeople] = useState<People>([]);
  const [isCutOff, setCutOff] = useState(false);
  const joined = useRef<JoinedSheet | null>(null);

  const take = useCallback(
    (event: SheetEvent) => {
      const queryKey = sheetKeys.one(questionId);
      const known = () => queryClient.getQueryData<Question>(queryKey);
      const apply = (events: readonly SheetEvent[]): number | null => {
        const sheet = known();
        if (!sheet) return null;
        const applied = applySheetEvents(sheet, events);
        if (applied.sheet !== sheet) queryClient.setQueryData(queryKey, applied.sheet);
        return applied.missingAfter;
      };
      const fill = async (after: number): Promise<void> => {
        const { items, nextCursor } = await sheetWire.eventsAfter(questionId, after);
        apply(items);
        if (nextCursor !== null) await fill(Number(nextCursor));
      };
      const missingAfter = apply([event]);
      if (missingAfter === null) return;
      fill(missingAfter)
        .then(() => apply([event]))
        .catch(() => queryClient.invalidateQueries({ queryKey }));
    },
    [queryClient, questionId],
  );

  useEffect(() => {
    const { queryKey } = questionSheet(questionId);
    const readAnew = () => void queryClient.invalidateQueries({ queryKey });
    joined.current = live.joinSheet(questionId, {
      afterSeq: () => queryClient.getQueryData<Question>(queryKey)?.lastSeq ?? 0,
      onEvent: take,
      onPresence: setPeople,
      onState: (state) => setCutOff(state === 'cutOff'),
      onGap: readAnew,
    });
    return () => joined.current?.leave();
  }, [queryClient, questionId, take]);

  const writing = useCallback((on: boolean) => joined.current?.writing(on), []);
  return { people, isCutOff, writing, take };
}
