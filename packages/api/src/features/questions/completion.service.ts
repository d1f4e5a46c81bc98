import { Injectable } from '@nestjs/common';
import {
  type Actor,
  asDoneCheck,
  canCarryOut,
  type Complete,
  type Fix,
  type HoleCard,
  isFixEndorsed,
  type Question,
} from '@rivetside/shared';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { authorize, BadInput, Conflict } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { BuildsService } from '../builds/builds.service.js';
import { PhotosService } from '../photos/photos.service.js';
import { CompletionEntity } from './completion.entity.js';
import { conditionsOf, entryLines } from './completion-entry.js';
import { type KnownQuestion, QuestionDoorService } from './question-door.service.js';
import { QuestionLogService } from './question-log.service.js';
import { QuestionSheetService } from './question-sheet.service.js';
import { presentCompletion } from './sheet-rows.js';

/** What the builder really did: checked again, kept, and written into the record. */
@Injectable()
export class CompletionService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly door: QuestionDoorService,
    private readonly sheets: QuestionSheetService,
    private readonly log: QuestionLogService,
    private readonly builds: BuildsService,
    private readonly photos: PhotosService,
    private readonly clock: Clock,
  ) {}

  async carryOut(actor: Actor, id: string, input: Complete): Promise<Question> {
    const question = this.door.requireVisible(actor, id);
    authorize(canCarryOut(actor, question), 'The builder of this aircraft carries it out.');
    const fix = this.requireEndorsed(question, input.fixId);
    const card =
      fix.holeCard ??
      (question.holeCardText === null ? null : (JSON.parse(question.holeCardText) as HoleCard));
    const check = card ? asDoneCheck(card, input.asDone, fix.check) : null;
    const left = conditionsOf(fix).filter((condition) => !input.conditionsMet?.includes(condition));
    await this.unitOfWork.run(async (tx) => {
      if (await tx.manager.existsBy(CompletionEntity, { questionId: id }))
        throw new Conflict('This is carried out already.', { state: 'carriedOut' });
      const completion = this.completion(actor, id, { input, check, left });
      completion.entryId = await this.writeEntry(tx, { actor, question, fix, completion });
      await tx.manager.insert(CompletionEntity, completion);
      await this.photos.attach(tx, {
        photoIds: input.photoIds ?? [],
        ownerId: actor.id,
        questionId: id,
        usedIn: completion.id,
      });
      await this.raiseWhatIsLeft(tx, question, left);
      const by = { id: actor.id, name: actor.name };
      const shown = presentCompletion({ ...completion, byName: actor.name, ...asText(completion) }, []);
      await this.log.append(tx, question, { type: 'completion', by, data: { completion: shown } });
    });
    return this.sheets.read(actor, id);
  }

  private requireEndorsed(question: KnownQuestion, fixId: string): Fix {
    const fix = this.sheets.fixes(question.id).find((one) => one.id === fixId);
    if (!fix) throw new BadInput([{ path: 'fixId', message: 'This fix is not on the sheet.' }]);
    if (question.state === 'underReview')
      throw new Conflict('A stamp is under review: wait until it is decided before the next rivet goes in.', {
        state: question.state,
      });
    const facts = {
      withdrawn: fix.withdrawn !== null,
      openObjection: fix.objections.some(({ answered }) => answered === null),
      stamps: fix.endorsements.map(({ state, basis, by }) => ({ state, basis, byId: by.id })),
    };
    if (!isFixEndorsed(facts, question.critical)) {
      const needed = question.critical
        ? 'two stamps, none on experience: this section is critical'
        : 'a stamp';
      throw new Conflict(`This fix still needs ${needed}.`, { state: question.state });
    }
    return fix;
  }

  private completion(
    actor: Actor,
    questionId: string,
    { input, check, left }: { input: Complete; check: CompletionEntity['check']; left: string[] },
  ): CompletionEntity {
    return Object.assign(new CompletionEntity(), {
      id: newId(),
      questionId,
      fixId: input.fixId,
      asDone: input.asDone,
      check,
      minutes: input.minutes,
      conditionsMet: input.conditionsMet ?? [],
      conditionsLeft: left,
      helpers: input.helpers ?? [],
      note: input.note ?? null,
      byId: actor.id,
      at: this.clock.instant(),
      entryId: null,
    });
  }

  private async writeEntry(
    tx: Tx,
    {
      actor,
      question,
      fix,
      completion,
    }: { actor: Actor; question: KnownQuestion; fix: Fix; completion: CompletionEntity },
  ): Promise<string | null> {
    if (question.buildId === null) return null;
    const sheet = this.sheets.read(actor, question.id);
    return this.builds.writeEntry(tx, {
      buildId: question.buildId,
      kind: 'fix',
      sectionId: question.sectionId,
      stepId: sheet.step?.id ?? null,
      questionId: question.id,
      title: fix.summary,
      lines: entryLines(sheet, fix, completion),
      minutes: completion.minutes,
      byId: completion.byId,
      helpers: completion.helpers,
      photoIds: [],
      doneAt: completion.at,
    });
  }

  private async raiseWhatIsLeft(tx: Tx, question: KnownQuestion, left: readonly string[]): Promise<void> {
    if (question.buildId === null) return;
    const { buildId, sectionId, id: questionId } = question;
    for (const condition of left) {
      const text = `${question.number}: ${condition}`;
      await this.builds.raiseOpenItem(tx, {
        buildId,
        sectionId,
        questionId,
        text,
        due: 'before the section is closed',
      });
    }
  }
}

function asText({ asDone, check, conditionsMet, conditionsLeft, helpers }: CompletionEntity) {
  return {
    asDone: JSON.stringify(asDone),
    check: check === null ? null : JSON.stringify(check),
    conditionsMet: JSON.stringify(conditionsMet),
    conditionsLeft: JSON.stringify(conditionsLeft),
    helpers: JSON.stringify(helpers),
  };
}
