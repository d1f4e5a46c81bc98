import type { Me, Question, QuestionStanding } from '@rivetside/shared';

/**
 * What the policies ask of a question. Where it is shared with the kit, the reader sees it through a chapter of their
 * own that builds the kit: those are what counts for them.
 */
export function standingOf(sheet: Question, me: Me): QuestionStanding {
  const { chapterId, audience, discipline, askedBy, builderIds, state } = sheet;
  const kitChapterIds = me.memberships.map((membership) => membership.chapterId);
  return { chapterId, audience, kitChapterIds, discipline, askedById: askedBy.id, builderIds, state };
}
