import type { Basis, QuestionState } from '../words/words.js';
import type { StampState } from '../endorsements/endorsement.schema.js';
import type { Wait } from './question.schema.js';

/** What the state of a question is judged from: no more than this. */
export interface QuestionFacts {
  /** The section is critical, so one stamp is not enough. */
  readonly critical: boolean;
  readonly withdrawn: boolean;
  readonly completed: boolean;
  readonly referralWaiting: boolean;
  readonly fixes: readonly FixFacts[];
}

export interface FixFacts {
  readonly withdrawn: boolean;
  readonly openObjection: boolean;
  readonly stamps: readonly { readonly state: StampState; readonly basis: Basis; readonly byId: string }[];
}

export const STAMPS_NEEDED = 1;
export const STAMPS_NEEDED_CRITICAL = 2;

/**
 * Tells whether a fix carries enough live stamps: one; in a critical section two, of two people, none of them on
 * experience. A held, expired or withdrawn stamp counts for nothing.
 */
export function isFixEndorsed(fix: FixFacts, critical: boolean): boolean {
  if (fix.withdrawn) return false;
  const live = fix.stamps.filter((stamp) => stamp.state === 'live');
  if (!critical) return live.length >= STAMPS_NEEDED;
  const grounded = live.filter((stamp) => stamp.basis !== 'experience');
  return new Set(grounded.map((stamp) => stamp.byId)).size >= STAMPS_NEEDED_CRITICAL;
}

/** A stamp that would count is on hold: by a notice, or by an objection against the fix that it stands under. */
function isHeld(fix: FixFacts): boolean {
  if (fix.withdrawn) return false;
  if (fix.stamps.some((stamp) => stamp.state === 'held')) return true;
  return fix.openObjection && fix.stamps.some((stamp) => stamp.state === 'live');
}

/**
 * The state of a question, derived from its fixes, stamps, referral, completion and holds and from nothing else.
 * A hold outranks a completion: who already carried the fix out must see first that its ground moved.
 */
export function questionState(facts: QuestionFacts): QuestionState {
  if (facts.withdrawn) return 'withdrawn';
  if (facts.fixes.some(isHeld)) return 'underReview';
  if (facts.completed) return 'carriedOut';
  if (facts.referralWaiting) return 'referred';
  const standing = facts.fixes.filter((fix) => !fix.withdrawn);
  if (standing.length === 0) return 'open';
  return standing.some((fix) => isFixEndorsed(fix, facts.critical)) ? 'endorsed' : 'advised';
}

const WAITS_BY_STATE: Readonly<Record<Exclude<QuestionState, 'advised'>, Wait>> = {
  open: 'firstFix',
  endorsed: 'builder',
  carriedOut: 'nothing',
  referred: 'kitMaker',
  underReview: 'review',
  withdrawn: 'nothing',
};

/** What a question waits for. An advised one waits for its first stamp, or in a critical section for the second. */
export function questionWaitsFor(facts: QuestionFacts): Wait {
  const state = questionState(facts);
  if (state !== 'advised') return WAITS_BY_STATE[state];
  const stamped = facts.fixes.some(
    (fix) =>
      !fix.withdrawn && fix.stamps.some((stamp) => stamp.state === 'live' && stamp.basis !== 'experience'),
  );
  return facts.critical && stamped ? 'secondStamp' : 'stamp';
}
