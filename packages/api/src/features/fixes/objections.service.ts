import { Injectable } from '@nestjs/common';
import {
  type Actor,
  type AnswerObjection,
  canAnswerObjection,
  canObject,
  type Objection,
  type ReasonBody,
} from '@rivetside/shared';
import { IsNull } from 'typeorm';
import { writeAudit } from '../../common/audit/audit.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { authorize, Conflict, NotFound } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { QuestionLogService } from '../questions/question-log.service.js';
import { FixEntity } from './fix.entity.js';
import { FixesService } from './fixes.service.js';
import { ObjectionEntity } from './objection.entity.js';

const FIX_OF_OBJECTION = 'SELECT "fixId" FROM "objections" WHERE "id" = ?';

/** A mentor's dated reason against a fix: no more stamps until it is answered. */
@Injectable()
export class ObjectionsService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: PreparedReader,
    private readonly fixes: FixesService,
    private readonly log: QuestionLogService,
    private readonly clock: Clock,
  ) {}

  async object(actor: Actor, fixId: string, { reason }: ReasonBody): Promise<Objection> {
    const { question, fix } = this.fixes.requireVisible(actor, fixId);
    authorize(
      canObject(actor, question, { byId: fix.by.id }),
      'A mentor of the discipline objects, and not to a fix of their own: that is withdrawn.',
    );
    const by = { id: actor.id, name: actor.name };
    return this.unitOfWork.run(async (tx) => {
      const notWithdrawn = ({ state }: { state: string }) => state !== 'withdrawn';
      await this.log.requireState(tx, question.id, notWithdrawn, 'This question was withdrawn.');
      if (!(await tx.manager.existsBy(FixEntity, { id: fixId, withdrawnAt: IsNull() })))
        throw new Conflict('This fix is withdrawn already.', { state: question.state });
      if (await tx.manager.existsBy(ObjectionEntity, { fixId, byId: actor.id, answeredAt: IsNull() }))
        throw new Conflict('Your objection to this fix still waits for its answer.', {
          state: question.state,
        });
      const row = { id: newId(), fixId, byId: actor.id, at: this.clock.instant(), reason, ...UNANSWERED };
      await tx.manager.insert(ObjectionEntity, row);
      const objection: Objection = { id: row.id, fixId, by, at: row.at, reason, answered: null };
      await writeAudit(tx.manager, {
        at: row.at,
        byId: actor.id,
        what: 'objection.raised',
        subject: ['fix', fixId],
        detail: { reason },
      });
      await this.log.append(tx, question, { type: 'objection', by, data: { objection } });
      return objection;
    });
  }

  async answer(actor: Actor, id: string, { answer }: AnswerObjection): Promise<Objection> {
    const known = this.reader.get<{ fixId: string }>(FIX_OF_OBJECTION, [id]);
    if (!known) throw new NotFound('objection');
    const { question, fix } = this.fixes.requireVisible(actor, known.fixId);
    authorize(canAnswerObjection(actor, question), 'A mentor of the discipline answers an objection.');
    const raised = fix.objections.find((one) => one.id === id)!;
    const by = { id: actor.id, name: actor.name };
    return this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const facts = { answeredAt: at, answeredById: actor.id, answer };
      const { affected } = await tx.manager.update(ObjectionEntity, { id, answeredAt: IsNull() }, facts);
      if (affected === 0)
        throw new Conflict('This objection is answered already.', { state: question.state });
      const objection: Objection = { ...raised, answered: { at, by, answer } };
      await writeAudit(tx.manager, {
        at,
        byId: actor.id,
        what: 'objection.answered',
        subject: ['fix', fix.id],
        detail: { answer },
      });
      await this.log.append(tx, question, { type: 'objectionAnswered', by, data: { objection } });
      return objection;
    });
  }
}

const UNANSWERED = { answeredAt: null, answeredById: null, answer: null };
