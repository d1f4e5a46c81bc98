import { Injectable } from '@nestjs/common';
import { type Actor, canRefer, type Question, type Refer, type ReferralAnswer } from '@rivetside/shared';
import { IsNull } from 'typeorm';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { authorize, Conflict } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { QuestionDoorService } from './question-door.service.js';
import { QuestionLogService } from './question-log.service.js';
import { QuestionSheetService } from './question-sheet.service.js';
import { ReferralEntity } from './referral.entity.js';
import { presentReferral } from './sheet-rows.js';

/** Sending the question to the kit maker, and filing the answer back. */
@Injectable()
export class ReferralService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly door: QuestionDoorService,
    private readonly log: QuestionLogService,
    private readonly sheets: QuestionSheetService,
    private readonly clock: Clock,
  ) {}

  async refer(actor: Actor, id: string, { note }: Refer): Promise<Question> {
    const question = this.door.requireVisible(actor, id);
    authorize(canRefer(actor, question), 'The asker or a mentor of the discipline refers a question.');
    if (['carriedOut', 'withdrawn'].includes(question.state))
      throw new Conflict('It is carried out or withdrawn already.', { state: question.state });
    await this.unitOfWork.run(async (tx) => {
      if (await tx.manager.existsBy(ReferralEntity, { questionId: id, answeredAt: IsNull() }))
        throw new Conflict('It waits for the kit maker already.', { state: 'referred' });
      const row = {
        id: newId(),
        questionId: id,
        at: this.clock.instant(),
        byId: actor.id,
        note: note ?? null,
        ...UNANSWERED,
      };
      await tx.manager.insert(ReferralEntity, row);
      const referral = presentReferral({ ...row, byName: actor.name, answeredByName: null });
      await this.log.append(tx, question, {
        type: 'referral',
        by: { id: actor.id, name: actor.name },
        data: { referral },
      });
    });
    return this.sheets.read(actor, id);
  }

  async answer(actor: Actor, id: string, { answer, reference }: ReferralAnswer): Promise<Question> {
    const question = this.door.requireVisible(actor, id);
    authorize(canRefer(actor, question), 'The asker or a mentor of the discipline files the answer.');
    await this.unitOfWork.run(async (tx) => {
      const waiting = await tx.manager.findOneBy(ReferralEntity, { questionId: id, answeredAt: IsNull() });
      if (!waiting) throw new Conflict('Nothing waits for the kit maker here.', { state: question.state });
      const facts = { answeredAt: this.clock.instant(), answeredById: actor.id, answer, reference };
      await tx.manager.update(ReferralEntity, { id: waiting.id }, facts);
      const names = { byName: await this.nameOf(tx.manager, waiting.byId), answeredByName: actor.name };
      const referral = presentReferral({ ...waiting, ...facts, ...names });
      await this.log.append(tx, question, {
        type: 'referralAnswer',
        by: { id: actor.id, name: actor.name },
        data: { referral },
      });
    });
    return this.sheets.read(actor, id);
  }

  private async nameOf(
    manager: { query(sql: string, params: string[]): Promise<unknown> },
    userId: string,
  ): Promise<string> {
    const rows = (await manager.query('SELECT "name" FROM "users" WHERE "id" = ?', [userId])) as {
      name: string;
    }[];
    return rows[0]?.name ?? '';
  }
}

const UNANSWERED = { answeredAt: null, answeredById: null, answer: null, reference: null };
