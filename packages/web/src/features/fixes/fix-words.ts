import {
  canEndorse,
  canObject,
  canProposeFix,
  canWithdrawFix,
  type Fix,
  isMentorFor,
  type Me,
  type Question,
  type RemedyCheck,
  takesAdvice,
  type Verdict,
} from '@rivetside/shared';
import { standingOf } from '../../lib/standing';

const COUNTS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine'];

/** How a fix's frozen check stands, in a few words: "one line marginal". */
export function checkWords(check: RemedyCheck | null): { verdict: Verdict; words: string } {
  if (!check || check.checks.length === 0) return { verdict: 'unknown', words: 'no numbers for this kind' };
  for (const [verdict, word] of [
    ['outside', 'outside'],
    ['marginal', 'marginal'],
    ['unknown', 'not known'],
  ] as const) {
    const count = check.checks.filter((line) => line.verdict === verdict).length;
    if (count > 0)
      return { verdict, words: `${COUNTS[count] ?? count} ${count === 1 ? 'line' : 'lines'} ${word}` };
  }
  return { verdict: 'inside', words: 'inside published numbers' };
}

export function hasOutsideLine({ check }: Fix): boolean {
  return check?.checks.some(({ verdict }) => verdict === 'outside') ?? false;
}

export function openObjections({ objections }: Fix) {
  return objections.filter(({ answered }) => answered === null);
}

/** Conditions of the fix and of the stamps that stand, each once: what is ticked when it is carried out. */
export function conditionsOf({ conditions, endorsements }: Fix): string[] {
  const live = endorsements.filter(({ state }) => state === 'live');
  return [...new Set([...conditions, ...live.flatMap((stamp) => stamp.conditions)])];
}

/** Why the reader, a mentor, cannot stamp this fix; null when they can. Readers who are no mentors are told nothing. */
export function whyNoStamp(sheet: Question, fix: Fix, me: Me): string | null {
  const standing = standingOf(sheet, me);
  if (!takesAdvice(standing)) return 'It is carried out or withdrawn: no more stamps.';
  if (fix.withdrawn) return 'This fix was withdrawn.';
  if (fix.by.id === me.id) return 'Nobody stamps their own fix: another mentor does.';
  if (!canEndorse(me, standing, { byId: fix.by.id })) return 'Nobody stamps a fix for their own aircraft.';
  if (openObjections(fix).length > 0) return 'An objection waits for its answer: no stamps until then.';
  if (fix.endorsements.some(({ by, state }) => by.id === me.id && (state === 'live' || state === 'held')))
    return 'Your stamp stands under this fix.';
  return null;
}

/** A mentor of the discipline here. */
export function isMentorHere(sheet: Question, me: Me): boolean {
  return isMentorFor(me, standingOf(sheet, me));
}

/** Why the reader, who mentors somewhere, cannot propose a fix here; null when they can. */
export function whyNoFix(sheet: Question, me: Me): string | null {
  const standing = standingOf(sheet, me);
  if (!canProposeFix(me, standing))
    return 'A fix is proposed by a mentor of this discipline in this chapter.';
  return takesAdvice(standing) ? null : 'It is carried out or withdrawn: nothing more is proposed.';
}

/** A mentor with an objection that waits says nothing more until it is answered. */
export function mayObjectTo(sheet: Question, fix: Fix, me: Me): boolean {
  if (fix.withdrawn || sheet.state === 'withdrawn') return false;
  if (openObjections(fix).some(({ by }) => by.id === me.id)) return false;
  return canObject(me, standingOf(sheet, me), { byId: fix.by.id });
}

export function mayTakeBack(sheet: Question, fix: Fix, me: Me): boolean {
  return fix.withdrawn === null && canWithdrawFix(me, standingOf(sheet, me), { byId: fix.by.id });
}
