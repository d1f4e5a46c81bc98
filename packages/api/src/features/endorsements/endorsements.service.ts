import { Injectable } from '@nestjs/common';
import {
  type Actor,
  canEndorse,
  type Endorse,
  type Endorsement,
  type Fix,
  isMentorFor,
  takesAdvice,
} from '@rivetside/shared';
import { writeAudit } from '../../common/audit/audit.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { authorize, BadInput, Conflict } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { FixesService } from '../fixes/fixes.service.js';
import type { KnownQuestion } from '../questions/question-door.service.js';
import { QuestionLogService } from '../questions/question-log.service.js';
import { EndorsementEntity } from './endorsement.entity.js';
import { stampFaults } from './stamp-faults.js';
import { lastGoodDay } from './stamp-life.js';

const LINE_OF_KIT = `SELECT 1 AS "yes" FROM "hole_lines" h JOIN "sections" s ON s."id" = h."sectionId" WHERE h."id" = ? AND s."kitId" = ?`;
const STAMP_NUMBER = `SELECT "stampNumber" FROM "memberships" WHERE "userId" = ? AND "status" = 'active' AND "stampNumber" IS NOT NULL
  ORDER BY ("chapterId" = ?) DESC, "joinedAt" LIMIT 1`;
const OPEN_OBJECTION =
  'SELECT 1 AS "yes" FROM "objections" WHERE "fixId" = ? AND "answeredAt" IS NULL LIMIT 1';
const LIVE_STAMP = `SELECT 1 AS "yes" FROM "endorsements" WHERE "fixId" = ? AND "byId" = ? AND "withdrawnAt" IS NULL AND "goodUntil" >= ?`;
const STILL_PROPOSED = 'SELECT 1 AS "yes" FROM "fixes" WHERE "id" = ? AND "withdrawnAt" IS NULL';

@Injectable()
export class EndorsementsService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: PreparedReader,
    private readonly fixes: FixesService,
    private readonly log: QuestionLogService,
    private readonly clock: Clock,
  ) {}

  async endorse(actor: Actor, fixId: string, input: Endorse): Promise<Endorsement> {
    const { question, fix } = this.fixes.requireVisible(actor, fixId);
    authorize(canEndorse(actor, question, { byId: fix.by.id }), whyNot(actor, question, fix));
    this.refuseFaults(question, fix, input);
    const stamp = this.stamp(actor, question, { fix, input });
    return this.unitOfWork.run(async (tx) => {
      await this.log.requireState(
        tx,
        question.id,
        takesAdvice,
        'It is carried out or withdrawn: no more stamps.',
      );
      await this.refuseClash(tx, actor, { fixId, state: question.state });
      await tx.manager.insert(EndorsementEntity, stamp);
      const detail = {
        questionId: question.id,
        fixId,
        basis: stamp.basis,
        goodUntil: stamp.goodUntil,
        reason: stamp.reason,
      };
      await writeAudit(tx.manager, {
        at: stamp.givenAt,
        byId: actor.id,
        what: 'stamp.given',
        subject: ['endorsement', stamp.id],
        detail,
      });
      const endorsement = presentGiven(stamp, actor);
      const by = { id: actor.id, name: actor.name };
      await this.log.append(tx, question, { type: 'endorsement', by, data: { endorsement } });
      return endorsement;
    });
  }

  private refuseFaults(question: KnownQuestion, fix: Fix, input: Endorse): void {
    const lines = input.scope?.holeLineIds ?? [];
    const strangeLines = lines.flatMap((id, at) =>
      this.reader.get(LINE_OF_KIT, [id, question.kitId]) ? [] : [at],
    );
    const faults = stampFaults({
      input,
      fix,
      critical: question.critical,
      today: this.today(),
      strangeLines,
    });
    if (faults.length > 0) throw new BadInput(faults);
  }

  /** Asked inside the unit: what two mentors do at once is settled in turn. */
  private async refuseClash(
    tx: Tx,
    actor: Actor,
    { fixId, state }: { fixId: string; state: string },
  ): Promise<void> {
    const found = async (sql: string, params: string[]) =>
      ((await tx.manager.query(sql, params)) as unknown[]).length > 0;
    if (!(await found(STILL_PROPOSED, [fixId]))) throw new Conflict('This fix was withdrawn.', { state });
    if (await found(OPEN_OBJECTION, [fixId]))
      throw new Conflict('An objection to this fix waits for its answer: no stamps until then.', { state });
    if (await found(LIVE_STAMP, [fixId, actor.id, this.today()]))
      throw new Conflict('Your stamp stands under this fix already.', { state });
  }

  private stamp(
    actor: Actor,
    question: KnownQuestion,
    { fix, input }: { fix: Fix; input: Endorse },
  ): EndorsementEntity {
    return Object.assign(new EndorsementEntity(), {
      id: newId(),
      fixId: fix.id,
      questionId: question.id,
      stampNumber: this.stampNumberOf(actor, question),
      byId: actor.id,
      discipline: question.discipline,
      basis: input.basis,
      reference: input.reference ?? null,
      scope: input.scope ?? null,
      conditions: input.conditions ?? [],
      givenAt: this.clock.instant(),
      goodUntil: input.goodUntil ?? lastGoodDay(this.today(), input.basis, fix.kind),
      reason: input.reason ?? null,
      reviews: [],
      ...UNTOUCHED,
    });
  }

  private stampNumberOf(actor: Actor, question: KnownQuestion): string {
    const row = this.reader.get<{ stampNumber: string }>(STAMP_NUMBER, [actor.id, question.chapterId]);
    return row?.stampNumber ?? `M-${actor.id.slice(-4).toUpperCase()}`;
  }

  private today(): string {
    return this.clock.instant().slice(0, 10);
  }
}

const UNTOUCHED = {
  heldAt: null,
  heldReason: null,
  heldByNoticeId: null,
  withdrawnAt: null,
  withdrawnReason: null,
  expiredAt: null,
};

function whyNot(actor: Actor, question: KnownQuestion, fix: Fix): string {
  if (!isMentorFor(actor, question)) return 'A stamp is given by a mentor of the discipline in this chapter.';
  if (fix.by.id === actor.id) return 'Nobody stamps their own fix.';
  return 'Nobody stamps a fix for their own aircraft.';
}

function presentGiven(stamp: EndorsementEntity, actor: Actor): Endorsement {
  const { id, fixId, questionId, stampNumber, discipline, basis, reference } = stamp;
  const { scope, conditions, givenAt, goodUntil, reason } = stamp;
  return {
    id,
    fixId,
    questionId,
    stampNumber,
    by: { id: actor.id, name: actor.name },
    discipline,
    basis,
    reference,
    scope,
    conditions,
    givenAt,
    goodUntil,
    reason,
    state: 'live',
    held: null,
    withdrawn: null,
    reviews: [],
  };
}
