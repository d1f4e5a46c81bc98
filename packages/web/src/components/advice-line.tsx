import { ADVICE_LINE } from '@rivetside/shared';
import type { ReactNode } from 'react';

/** Said on every sheet and beside every check. */
export function AdviceLine(): ReactNode {
  return <p className="muted">{ADVICE_LINE}</p>;
}
