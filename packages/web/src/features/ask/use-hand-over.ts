import type { Question } from '@rivetside/shared';
import { useCallback, useEffect, useRef, useState } from 'react';
import { Problem } from '../../lib/problem';
import { useOnline } from '../../lib/online';
import { handOver, takeBack, TakenBack } from './hand-over';

interface HandingOver {
  readonly draftKey: string;
  /** The draft says that it was put to the mentors: so a closed tab goes on where it was. */
  readonly isHandedOver: boolean;
  readonly post: (key: string) => Promise<Question>;
  readonly onAsked: (question: Question) => void;
  readonly onRefused: (error: unknown) => void;
}

export type Standing = 'writing' | 'sending' | 'waiting';

/** Sends the draft once it was handed over, and tells how it stands. */
export function useHandOver(handing: HandingOver): { standing: Standing; takeBack: () => void } {
  const { draftKey, isHandedOver } = handing;
  const isOnline = useOnline();
  const [isCutOff, setCutOff] = useState(false);
  const latest = useRef(handing);
  useEffect(() => {
    latest.current = handing;
  });

  useEffect(() => {
    if (!isHandedOver) return;
    let isHere = true;
    const told = (tell: () => void) => isHere && tell();
    const post = async (key: string) => {
      try {
        return await latest.current.post(key);
      } catch (error) {
        told(() => setCutOff(error instanceof Problem && error.isOffline));
        throw error;
      }
    };
    handOver(draftKey, post).then(
      (question) => told(() => latest.current.onAsked(question)),
      (error: unknown) => told(() => !(error instanceof TakenBack) && latest.current.onRefused(error)),
    );
    return () => {
      isHere = false;
      setCutOff(false);
    };
  }, [draftKey, isHandedOver]);

  const waiting = !isOnline || isCutOff;
  return {
    standing: !isHandedOver ? 'writing' : waiting ? 'waiting' : 'sending',
    takeBack: useCallback(() => takeBack(draftKey), [draftKey]),
  };
}
