import { Injectable } from '@nestjs/common';
import {
  type Actor,
  canTalk,
  canWithdrawQuestion,
  type Question,
  type ReasonBody,
  type SheetEvent,
  type WriteMessage,
} from '@rivetside/shared';
import type { PreparedDb } from '../../common/database/prepared.js';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { authorize, BadInput, Conflict } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { SearchIndexService } from '../search/search-index.service.js';
import { QuestionDoorService, wall } from './question-door.service.js';
import { QuestionLogService } from './question-log.service.js';
import { QuestionSheetService } from './question-sheet.service.js';
import { QuestionEntity } from './question.entity.js';
import { SEEN } from './questions.sql.js';

const ATTACH = 'INSERT INTO "photo_uses" ("photoId", "questionId", "usedIn", "position") VALUES (?, ?, ?, ?)';
const OWN_UNUSED = `SELECT count(*) AS "n" FROM "photos" p WHERE p."id" IN (SELECT value FROM json_each(?)) AND p."ownerId" = ?
  AND NOT EXISTS (SELECT 1 FROM "photo_uses" u WHERE u."photoId" = p."id")`;

@Injectable()
export class QuestionsService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly door: QuestionDoorService,
    private readonly log: QuestionLogService,
    private readonly sheets: QuestionSheetService,
    private readonly index: SearchIndexService,
    private readonly clock: Clock,
  ) {}

  async write(actor: Actor, id: string, { body, photoIds }: WriteMessage): Promise<SheetEvent> {
    const question = this.door.requireVisible(actor, id);
    authorize(canTalk(actor, question), 'The bench talk is for members of the chapter.');
    if (question.state === 'withdrawn')
      throw new Conflict('This question was withdrawn.', { state: question.state });
    const event = await this.unitOfWork.runPrepared((db, record) => {
      const messageId = newId();
      this.hang(db, { photoIds: photoIds ?? [], ownerId: actor.id, questionId: id, usedIn: messageId });
      const data = { id: messageId, body, ...(photoIds?.length ? { photoIds } : {}) };
      const by = { id: actor.id, name: actor.name };
      const written = this.log.appendPrepared(
        db,
        question,
        { type: 'message', by, data, id: messageId },
        record,
      );
      this.index.add(db, {
        kind: 'message',
        refId: messageId,
        questionId: id,
        kitId: question.kitId,
        chapterId: wall(question),
        title: '',
        words: body,
      });
      db.run(SEEN, [actor.id, id, written.seq]);
      return written;
    });
    return photoIds?.length
      ? this.sheets.after(id, event.seq - 1, 1)[0]!
      : { ...event, data: { ...event.data, photos: [] } };
  }

  async see(actor: Actor, id: string, seq: number): Promise<void> {
    const { lastSeq } = this.door.requireVisible(actor, id);
    await this.unitOfWork.runPrepared((db) => void db.run(SEEN, [actor.id, id, Math.min(seq, lastSeq)]));
  }

  async withdraw(actor: Actor, id: string, { reason }: ReasonBody): Promise<Question> {
    const question = this.door.requireVisible(actor, id);
    authorize(canWithdrawQuestion(actor, question), 'Only whoever asked withdraws a question.');
    await this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const { affected } = await tx.manager
        .createQueryBuilder()
        .update(QuestionEntity)
        .set({ withdrawnAt: at, withdrawnReason: reason })
        .where({ id })
        .andWhere(
          '"withdrawnAt" IS NULL AND NOT EXISTS (SELECT 1 FROM "completions" c WHERE c."questionId" = "questions"."id")',
        )
        .execute();
      if (affected === 0)
        throw new Conflict('It is carried out or withdrawn already.', { state: question.state });
      await this.log.append(tx, question, {
        type: 'withdrawn',
        by: { id: actor.id, name: actor.name },
        data: { reason },
      });
    });
    return this.sheets.read(actor, id);
  }

  private hang(
    db: PreparedDb,
    use: { photoIds: readonly string[]; ownerId: string; questionId: string; usedIn: string },
  ): void {
    if (use.photoIds.length === 0) return;
    const { n } = db.get<{ n: number }>(OWN_UNUSED, [JSON.stringify(use.photoIds), use.ownerId])!;
    if (n !== use.photoIds.length)
      throw new BadInput([{ path: 'photoIds', message: 'Name your own photos, each in one place only.' }]);
    for (const [position, photoId] of use.photoIds.entries())
      db.run(ATTACH, [photoId, use.questionId, use.usedIn, position]);
  }
}
