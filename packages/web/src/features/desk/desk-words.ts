import { type Actor, type Desk, DISCIPLINE_WORDS, DISCIPLINES, type QuestionRow } from '@rivetside/shared';

/** The disciplines somebody advises in, in the order of the trade's list. */
export function disciplinesOf({ memberships }: Pick<Actor, 'memberships'>): string[] {
  const held = new Set(
    memberships
      .filter(({ status, roles }) => status === 'active' && roles.includes('mentor'))
      .flatMap(({ disciplines }) => disciplines),
  );
  return DISCIPLINES.filter((one) => held.has(one)).map((one) => DISCIPLINE_WORDS[one]);
}

/** What needs a mentor most: ground that moved, then nobody's answer yet, then a second pair of eyes; the longest waiting first. */
export function needsMost({ review, firstFix, stamp }: Desk, count: number): QuestionRow[] {
  return [...review, ...firstFix, ...stamp].slice(0, count);
}
