import { Injectable } from '@nestjs/common';
import {
  type Actor,
  canReviewStamp,
  canWithdrawStamp,
  type Endorsement,
  type ReasonBody,
  type ReviewStamp,
} from '@rivetside/shared';
import { IsNull } from 'typeorm';
import { writeAudit } from '../../common/audit/audit.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { authorize, Conflict, NotFound } from '../../common/errors/app-error.js';
import { Clock } from '../../common/time/clock.js';
import { FixesService } from '../fixes/fixes.service.js';
import { type KnownQuestion } from '../questions/question-door.service.js';
import { QuestionLogService } from '../questions/question-log.service.js';
import { EndorsementEntity } from './endorsement.entity.js';
import { StampFollowUp } from './stamp-follow-up.js';

const FIX_OF_STAMP = 'SELECT "fixId" FROM "endorsements" WHERE "id" = ?';

interface KnownStamp {
  readonly question: KnownQuestion;
  readonly stamp: Endorsement;
}

/** What may still happen to a stamp: another look when it is on hold, and its withdrawal. Never a change in it. */
@Injectable()
export class StampReviewService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: PreparedReader,
    private readonly fixes: FixesService,
    private readonly log: QuestionLogService,
    private readonly followUp: StampFollowUp,
    private readonly clock: Clock,
  ) {}

  async withdraw(actor: Actor, id: string, { reason }: ReasonBody): Promise<Endorsement> {
    const known = this.requireVisible(actor, id);
    authorize(
      canWithdrawStamp(actor, { byId: known.stamp.by.id }),
      'Whoever gave a stamp withdraws it, or the kit steward.',
    );
    return this.unitOfWork.run(async (tx) => {
      const withdrawn = await this.takeBack(tx, known, reason);
      const { at } = withdrawn.withdrawn!;
      await writeAudit(tx.manager, {
        at,
        byId: actor.id,
        what: 'stamp.withdrawn',
        subject: ['endorsement', id],
        detail: { reason },
      });
      const by = { id: actor.id, name: actor.name };
      await this.log.append(tx, known.question, {
        type: 'endorsementWithdrawn',
        by,
        data: { endorsement: withdrawn },
      });
      return withdrawn;
    });
  }

  /** Kept: the hold ends. Changed or withdrawn: the stamp goes, for it is never edited; a changed fix gets a new one. */
  async review(actor: Actor, id: string, { decision, reason }: ReviewStamp): Promise<Endorsement> {
    const known = this.requireVisible(actor, id);
    authorize(canReviewStamp(actor, { byId: known.stamp.by.id }), 'Whoever gave a stamp looks at it again.');
    return this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const row = await tx.manager.findOneByOrFail(EndorsementEntity, { id });
      if (row.heldAt === null || row.withdrawnAt !== null)
        throw new Conflict('This stamp is not on hold.', { state: known.question.state });
      const reviews = [...row.reviews, { at, byId: actor.id, decision, reason }];
      await tx.manager.update(
        EndorsementEntity,
        { id },
        { reviews, heldAt: null, heldReason: null, heldByNoticeId: null },
      );
      const by = { id: actor.id, name: actor.name };
      const looked: Endorsement = {
        ...known.stamp,
        state: 'live',
        held: null,
        reviews: [...known.stamp.reviews, { at, by, decision, reason }],
      };
      const endorsement =
        decision === 'keep' ? looked : await this.takeBack(tx, { ...known, stamp: looked }, reason);
      await writeAudit(tx.manager, {
        at,
        byId: actor.id,
        what: 'stamp.reviewed',
        subject: ['endorsement', id],
        detail: { decision, reason },
      });
      await this.log.append(tx, known.question, { type: 'endorsementReviewed', by, data: { endorsement } });
      return endorsement;
    });
  }

  private async takeBack(tx: Tx, { question, stamp }: KnownStamp, reason: string): Promise<Endorsement> {
    const at = this.clock.instant();
    const facts = { withdrawnAt: at, withdrawnReason: reason };
    const { affected } = await tx.manager.update(
      EndorsementEntity,
      { id: stamp.id, withdrawnAt: IsNull() },
      facts,
    );
    if (affected === 0) throw new Conflict('This stamp is withdrawn already.', { state: question.state });
    await this.followUp.raise(tx, question, stamp, `stamp ${stamp.stampNumber} was withdrawn: ${reason}`);
    return { ...stamp, state: 'withdrawn', withdrawn: { at, reason } };
  }

  private requireVisible(actor: Actor, id: string): KnownStamp {
    const row = this.reader.get<{ fixId: string }>(FIX_OF_STAMP, [id]);
    if (!row) throw new NotFound('stamp');
    const { question, fix } = this.fixes.requireVisible(actor, row.fixId);
    return { question, stamp: fix.endorsements.find((one) => one.id === id)! };
  }
}
