import { fitCheck, type FitCheck, type HoleCard, type Units } from '@rivetside/shared';
import { useDeferredValue, useMemo, useState } from 'react';
import type { HoleCardFields } from './hole-card-fields';
import { readHoleCard, type HoleCardReading } from './read-hole-card';

export interface HoleCardAtHand {
  /** What the rest here is of. */
  readonly fields: HoleCardFields;
  /** Of what was typed a moment ago: it gives way to the typing hand. */
  readonly reading: HoleCardReading;
  /** The card as last understood, so that drawing and check stand while a number is half typed. */
  readonly card: HoleCard | null;
  readonly check: FitCheck | null;
  /** The form says more than the card shown does: something in it is not understood. */
  readonly isBehind: boolean;
}

/** Reads and checks the card beside the typing, never before it. */
export function useHoleCard(fields: HoleCardFields, units: Units): HoleCardAtHand {
  const settled = useDeferredValue(fields);
  const reading = useMemo(() => readHoleCard(settled, units), [settled, units]);
  const [last, setLast] = useState<HoleCard | null>(null);
  const card = reading.card ?? (reading.isBlank ? null : last);
  if (card !== last) setLast(card);
  const check = useMemo(() => card && fitCheck(card), [card]);
  return useMemo(
    () => ({ fields: settled, reading, card, check, isBehind: card !== null && reading.card === null }),
    [settled, reading, card, check],
  );
}
