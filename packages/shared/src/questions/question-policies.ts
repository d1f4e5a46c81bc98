import { type Actor, isBuilderIn, isMember, isMentorIn } from '../access/roles.js';
import type { Discipline, QuestionState } from '../words/words.js';
import type { Audience } from './question.schema.js';

/** Whoever acts: as the server knows them and as the page knows its reader. */
export type Who = Pick<Actor, 'id' | 'siteRole' | 'memberships'>;

/** Who asked where: what every policy about a question needs. `kitChapterIds` are the chapters that build the kit. */
export interface QuestionStanding {
  readonly chapterId: string;
  readonly audience: Audience;
  readonly kitChapterIds: readonly string[];
  readonly discipline: Discipline;
  readonly askedById: string;
  /** Owner and crew of the build, the asker among them. */
  readonly builderIds: readonly string[];
  readonly state: QuestionState;
}

/** Chapters whose members see the question. */
function chaptersOf(
  question: Pick<QuestionStanding, 'chapterId' | 'audience' | 'kitChapterIds'>,
): readonly string[] {
  return question.audience === 'kit' ? [question.chapterId, ...question.kitChapterIds] : [question.chapterId];
}

/** Members of the chapter, of every chapter of the kit where it is shared with the kit, and those who keep the kit and the site. */
export function canSeeQuestion(
  actor: Who,
  question: Pick<QuestionStanding, 'chapterId' | 'audience' | 'kitChapterIds'>,
): boolean {
  return actor.siteRole !== null || chaptersOf(question).some((id) => isMember(actor, id));
}

/** A builder asks in a chapter where they are one. */
export function canAskIn(actor: Pick<Actor, 'memberships'>, chapterId: string): boolean {
  return isBuilderIn(actor, chapterId);
}

/** Any member who may see it joins the talk; keepers of kit and site read, they do not chat as members. */
export function canTalk(actor: Who, question: QuestionStanding): boolean {
  return chaptersOf(question).some((id) => isMember(actor, id));
}

/** A mentor of the discipline, in the chapter or in one that the question is shared with. */
export function isMentorFor(actor: Who, question: QuestionStanding): boolean {
  return chaptersOf(question).some((id) => isMentorIn(actor, id, question.discipline));
}

/** Past these nothing more is advised. */
const ENDED: readonly QuestionState[] = ['carriedOut', 'withdrawn'];

export function canProposeFix(actor: Who, question: QuestionStanding): boolean {
  return isMentorFor(actor, question);
}

/** Whether the question still takes fixes and stamps at all. */
export function takesAdvice(question: Pick<QuestionStanding, 'state'>): boolean {
  return !ENDED.includes(question.state);
}

/** Another mentor of the discipline: never one's own fix, never for one's own aircraft. */
export function canEndorse(actor: Who, question: QuestionStanding, fix: { readonly byId: string }): boolean {
  if (fix.byId === actor.id) return false;
  if (question.askedById === actor.id || question.builderIds.includes(actor.id)) return false;
  return isMentorFor(actor, question);
}

/** A mentor of the discipline may object, to another's fix as to a stamp under it. */
export function canObject(actor: Who, question: QuestionStanding, fix: { readonly byId: string }): boolean {
  return fix.byId !== actor.id && isMentorFor(actor, question);
}

/** Whoever proposed the fix answers, or another mentor of the discipline; the objector may take it back. */
export function canAnswerObjection(actor: Who, question: QuestionStanding): boolean {
  return isMentorFor(actor, question);
}

export function canWithdrawFix(
  actor: Who,
  question: QuestionStanding,
  fix: { readonly byId: string },
): boolean {
  return fix.byId === actor.id && takesAdvice(question);
}

/** The mentor who gave it; the kit steward where the ground is gone and the mentor cannot be had. */
export function canWithdrawStamp(actor: Who, stamp: { readonly byId: string }): boolean {
  return stamp.byId === actor.id || actor.siteRole === 'steward';
}

/** Another look at a held stamp is for whoever gave it. */
export function canReviewStamp(actor: Who, stamp: { readonly byId: string }): boolean {
  return stamp.byId === actor.id;
}

/** The builder carries out: the asker, or owner and crew of the build. */
export function canCarryOut(actor: Who, question: QuestionStanding): boolean {
  return question.askedById === actor.id || question.builderIds.includes(actor.id);
}

/** The asker, or a mentor of the discipline for them. */
export function canRefer(actor: Who, question: QuestionStanding): boolean {
  return question.askedById === actor.id || isMentorFor(actor, question);
}

/** The asker, until it is carried out. */
export function canWithdrawQuestion(actor: Who, question: QuestionStanding): boolean {
  return question.askedById === actor.id;
}

/** A mentor somewhere has a desk. */
export function hasDesk(actor: Pick<Actor, 'memberships'>): boolean {
  return actor.memberships.some((one) => one.status === 'active' && one.roles.includes('mentor'));
}
