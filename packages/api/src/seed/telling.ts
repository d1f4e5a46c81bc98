import { newId } from '../common/ids.js';
import { wall } from '../features/questions/question-door.service.js';
import type { QuestionLogService } from '../features/questions/question-log.service.js';
import type { QuestionEntity } from '../features/questions/question.entity.js';
import type { Loading } from './load-kit.js';
import type { StoredPhoto } from './load-photos.js';
import type { StoryClock } from './story-clock.js';

export interface Telling extends Loading {
  readonly clock: StoryClock;
  readonly log: QuestionLogService;
  readonly photos: ReadonlyMap<string, StoredPhoto>;
}

export const personOf = ({ world, keys }: Loading, key: string) => ({
  id: keys.of('person', key),
  name: world.people.find((person) => person.key === key)!.name,
});

export async function say(
  telling: Telling,
  question: QuestionEntity,
  { by, body }: { by: string; body: string },
): Promise<void> {
  const { tx, log, index, clock } = telling;
  const id = newId();
  const message = { type: 'message' as const, by: personOf(telling, by), data: { id, body } };
  const { id: questionId, kitId } = question;
  await tx.manager.query('UPDATE "questions" SET "lastActivityAt" = ? WHERE "id" = ?', [
    clock.instant(),
    questionId,
  ]);
  await log.append(tx, question, message);
  await index.addIn(tx, {
    kind: 'message',
    refId: id,
    questionId,
    kitId,
    chapterId: wall(question),
    title: '',
    words: body,
  });
}
