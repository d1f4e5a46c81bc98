import type { Endorse, Fix } from '@rivetside/shared';
import type { FieldFault } from '../../common/errors/app-error.js';
import { lastGoodDay } from './stamp-life.js';

interface StampAsked {
  readonly input: Endorse;
  readonly fix: Fix;
  readonly critical: boolean;
  /** Calendar day, UTC. */
  readonly today: string;
  /** Hole lines of the scope that the kit does not have, by their place in the list. */
  readonly strangeLines: readonly number[];
}

/** Why a stamp cannot be given as it was asked for, each fault at its field. */
export function stampFaults({ input, fix, critical, today, strangeLines }: StampAsked): FieldFault[] {
  const faults: FieldFault[] = [];
  if (critical && input.basis === 'experience')
    faults.push({
      path: 'basis',
      message: 'This section is critical: a stamp here needs a basis other than experience.',
    });
  if (!input.reason && fix.check?.checks.some(({ verdict }) => verdict === 'outside'))
    faults.push({
      path: 'reason',
      message: 'A line of the check is outside published numbers: say why it stands all the same.',
    });
  faults.push(...dayFaults(input, fix, today));
  for (const at of strangeLines)
    faults.push({ path: `scope.holeLineIds.${at}`, message: 'There is no such hole line in this kit.' });
  return faults;
}

function dayFaults({ goodUntil, basis }: Endorse, { kind }: Fix, today: string): FieldFault[] {
  if (!goodUntil) return [];
  if (goodUntil < today) return [{ path: 'goodUntil', message: 'This day is past.' }];
  const last = lastGoodDay(today, basis, kind);
  if (goodUntil <= last) return [];
  return [{ path: 'goodUntil', message: `On this basis a stamp stands until ${last} at most.` }];
}
