import { Injectable } from '@nestjs/common';
import {
  type Actor,
  canProposeFix,
  canSeeQuestion,
  canWithdrawFix,
  ENGINE_VERSION,
  type Fix,
  fitCheck,
  type HoleCard,
  type ProposeFix,
  type ReasonBody,
  type RemedyCheck,
  takesAdvice,
} from '@rivetside/shared';
import { IsNull } from 'typeorm';
import { writeAudit } from '../../common/audit/audit.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { authorize, Conflict, NotFound } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { type KnownQuestion, QuestionDoorService, wall } from '../questions/question-door.service.js';
import { QuestionLogService } from '../questions/question-log.service.js';
import { QuestionSheetService } from '../questions/question-sheet.service.js';
import { SearchIndexService } from '../search/search-index.service.js';
import { FixEntity } from './fix.entity.js';

const QUESTION_OF_FIX = 'SELECT "questionId" FROM "fixes" WHERE "id" = ?';
const NEXT_NUMBER = 'SELECT coalesce(max("number"), 0) + 1 AS "number" FROM "fixes" WHERE "questionId" = ?';

export interface FixOnSheet {
  readonly question: KnownQuestion;
  readonly fix: Fix;
}

@Injectable()
export class FixesService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: PreparedReader,
    private readonly door: QuestionDoorService,
    private readonly log: QuestionLogService,
    private readonly sheets: QuestionSheetService,
    private readonly index: SearchIndexService,
    private readonly clock: Clock,
  ) {}

  async propose(actor: Actor, questionId: string, input: ProposeFix): Promise<Fix> {
    const question = this.door.requireVisible(actor, questionId);
    authorize(
      canProposeFix(actor, question),
      'A fix is proposed by a mentor of the discipline in this chapter.',
    );
    const card = cardOf(question, input);
    const check = card ? remedyOf(card, input.kind) : null;
    return this.unitOfWork.run(async (tx) => {
      await this.log.requireState(
        tx,
        questionId,
        takesAdvice,
        'It is carried out or withdrawn: nothing more is proposed.',
      );
      const fix = Object.assign(new FixEntity(), {
        id: newId(),
        questionId,
        number: await this.nextNumber(tx, questionId),
        kind: input.kind,
        summary: input.summary,
        operations: input.operations,
        conditions: input.conditions ?? [],
        holeCard: input.holeCard ? card : null,
        check,
        engineVersion: check ? ENGINE_VERSION : null,
        byId: actor.id,
        at: this.clock.instant(),
        withdrawnAt: null,
        withdrawnReason: null,
      });
      await tx.manager.insert(FixEntity, fix);
      const shown = presentNew(fix, actor);
      await this.log.append(tx, question, {
        type: 'fix',
        by: { id: actor.id, name: actor.name },
        data: { fix: shown },
      });
      await this.remember(tx, question, fix);
      return shown;
    });
  }

  async withdraw(actor: Actor, id: string, { reason }: ReasonBody): Promise<Fix> {
    const { question, fix } = this.requireVisible(actor, id);
    authorize(
      canWithdrawFix(actor, question, { byId: fix.by.id }),
      'Whoever proposed a fix withdraws it, until it is carried out.',
    );
    const at = this.clock.instant();
    return this.unitOfWork.run(async (tx) => {
      await this.log.requireState(tx, question.id, takesAdvice, 'It is carried out or withdrawn already.');
      const facts = { withdrawnAt: at, withdrawnReason: reason };
      const { affected } = await tx.manager.update(FixEntity, { id, withdrawnAt: IsNull() }, facts);
      if (affected === 0) throw new Conflict('This fix is withdrawn already.', { state: question.state });
      await writeAudit(tx.manager, {
        at,
        byId: actor.id,
        what: 'fix.withdrawn',
        subject: ['fix', id],
        detail: { reason },
      });
      const withdrawn: Fix = { ...fix, withdrawn: { at, reason } };
      const by = { id: actor.id, name: actor.name };
      await this.log.append(tx, question, { type: 'fixWithdrawn', by, data: { fix: withdrawn } });
      return withdrawn;
    });
  }

  /** A fix with its question; hidden with the question from whoever may not see that. */
  requireVisible(actor: Actor, fixId: string): FixOnSheet {
    const found = this.find(fixId);
    if (!found || !canSeeQuestion(actor, found.question)) throw new NotFound('fix');
    return found;
  }

  /** For the app itself: whoever asks for somebody asks `requireVisible`. */
  requireById(fixId: string): FixOnSheet {
    const found = this.find(fixId);
    if (!found) throw new NotFound('fix');
    return found;
  }

  private find(fixId: string): FixOnSheet | null {
    const row = this.reader.get<{ questionId: string }>(QUESTION_OF_FIX, [fixId]);
    if (!row) return null;
    const fix = this.sheets.fixes(row.questionId).find(({ id }) => id === fixId)!;
    return { question: this.door.find(row.questionId)!, fix };
  }

  private async nextNumber(tx: Tx, questionId: string): Promise<number> {
    const rows = (await tx.manager.query(NEXT_NUMBER, [questionId])) as { number: number }[];
    return rows[0]!.number;
  }

  private async remember(tx: Tx, question: KnownQuestion, fix: FixEntity): Promise<void> {
    const words = [...fix.operations.map(({ text }) => text), ...fix.conditions].join(' ');
    const { kitId, id: questionId } = question;
    await this.index.addIn(tx, {
      kind: 'fix',
      refId: fix.id,
      questionId,
      kitId,
      chapterId: wall(question),
      title: fix.summary,
      words,
    });
  }
}

/** Its own numbers where it brings them, under the same limits of the kit maker; else those of the question. */
function cardOf(question: KnownQuestion, { holeCard }: ProposeFix): HoleCard | null {
  const asked = question.holeCardText === null ? null : (JSON.parse(question.holeCardText) as HoleCard);
  if (!holeCard) return asked;
  return holeCard.limits || !asked?.limits ? holeCard : { ...holeCard, limits: asked.limits };
}

/** Frozen with the fix: what stands beside it later is what its proposer saw. */
function remedyOf(card: HoleCard, kind: ProposeFix['kind']): RemedyCheck | null {
  return fitCheck(card).remedies.find((remedy) => remedy.kind === kind) ?? null;
}

function presentNew(fix: FixEntity, actor: Actor): Fix {
  const { byId, withdrawnAt: _at, withdrawnReason: _reason, ...facts } = fix;
  return { ...facts, by: { id: byId, name: actor.name }, withdrawn: null, endorsements: [], objections: [] };
}
