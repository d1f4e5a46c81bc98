import type { Question } from '@rivetside/shared';
import { useEffect, useState } from 'react';
import { sheetWire } from './queries';

const LOOKED_MS = 1_200;

/**
 * Writes back how far the reader has come, once the sheet was in view for a moment. Gives the number up to which they
 * had seen it when they came, for the mark before what is new.
 */
export function useSeen({ id, lastSeq, seenSeq }: Question): number {
  const [seenBefore] = useState(seenSeq);
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const look = () => {
      clearTimeout(timer);
      if (document.visibilityState !== 'visible') return;
      // A reader without a network has still read it: told with the next event.
      timer = setTimeout(() => void sheetWire.see(id, lastSeq).catch(() => undefined), LOOKED_MS);
    };
    look();
    document.addEventListener('visibilitychange', look);
    return () => {
      clearTimeout(timer);
      document.removeEventListener('visibilitychange', look);
    };
  }, [id, lastSeq]);
  return seenBefore;
}
