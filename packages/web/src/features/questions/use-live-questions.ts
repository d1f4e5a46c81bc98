import { type QueryKey, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { live } from '../../lib/live';
import { questionKeys } from './queries';

/** A stamp brings an event for the fix and one for the question; they are read again once. */
const TOGETHER_MS = 250;

/**
 * Reads the lists again when a question changes anywhere the reader may look, or when the connection was broken and
 * changes may have been missed. `besides` are keys that follow from questions, such as open items.
 */
export function useLiveQuestions(besides: readonly QueryKey[] = []): void {
  const queryClient = useQueryClient();
  const told = JSON.stringify(besides);
  useEffect(() => {
    let due: ReturnType<typeof setTimeout> | undefined;
    const read = () => {
      due = undefined;
      for (const queryKey of [questionKeys.lists, ...(JSON.parse(told) as QueryKey[])])
        void queryClient.invalidateQueries({ queryKey });
    };
    const soon = () => void (due ??= setTimeout(read, TOGETHER_MS));
    const stops = [live.on('question.changed', soon), live.onReconnect(soon)];
    return () => {
      clearTimeout(due);
      for (const stop of stops) stop();
    };
  }, [queryClient, told]);
}
