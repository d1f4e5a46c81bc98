import { Injectable } from '@nestjs/common';
import {
  type Actor,
  type AskQuestion,
  canAskIn,
  fitCheck,
  headlineTrouble,
  type Question,
} from '@rivetside/shared';
import { type Tx, UnitOfWork } from '../../common/database/unit-of-work.js';
import { authorize } from '../../common/errors/app-error.js';
import { newId } from '../../common/ids.js';
import { Clock } from '../../common/time/clock.js';
import { PhotosService } from '../photos/photos.service.js';
import { SearchIndexService } from '../search/search-index.service.js';
import { wall } from './question-door.service.js';
import { QuestionLogService } from './question-log.service.js';
import { QuestionNumberEntity } from './question-number.entity.js';
import { cardWithLimits, type Place, QuestionPlaceService } from './question-place.service.js';
import { QuestionSheetService } from './question-sheet.service.js';
import { QuestionEntity } from './question.entity.js';
import { SEEN } from './questions.sql.js';

const WHOLE_BUILD = 'KIT';

@Injectable()
export class AskService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly places: QuestionPlaceService,
    private readonly log: QuestionLogService,
    private readonly sheets: QuestionSheetService,
    private readonly index: SearchIndexService,
    private readonly photos: PhotosService,
    private readonly clock: Clock,
  ) {}

  async ask(actor: Actor, input: AskQuestion): Promise<Question> {
    authorize(canAskIn(actor, input.chapterId), 'You ask in a chapter where you are a builder.');
    const place = this.places.find(actor, input);
    const draft = this.draft(actor, input, place);
    await this.unitOfWork.run(async (tx) => {
      const number = await this.nextNumber(tx, input.kitId, place.sectionCode ?? WHOLE_BUILD);
      const question = Object.assign(new QuestionEntity(), draft, { number });
      const { id } = question;
      await tx.manager.insert(QuestionEntity, question);
      const photoIds = input.photoIds ?? [];
      await this.photos.attach(tx, { photoIds, ownerId: actor.id, questionId: id, usedIn: 'question' });
      const by = { id: actor.id, name: actor.name };
      await this.log.append(tx, question, { type: 'asked', by, data: {} });
      await tx.manager.query(SEEN, [actor.id, id, 1]);
      await this.remember(tx, question, place);
    });
    return this.sheets.read(actor, draft.id);
  }

  private draft(
    actor: Actor,
    { photoIds: _hungLater, ...asked }: AskQuestion,
    place: Place,
  ): Omit<QuestionEntity, 'number'> {
    const at = this.clock.instant();
    const holeCard = cardWithLimits(asked.holeCard, place.limits);
    const check = holeCard ? fitCheck(holeCard) : null;
    return {
      ...asked,
      id: newId(),
      sectionId: asked.sectionId ?? null,
      stepId: asked.stepId ?? null,
      partId: asked.partId ?? null,
      holeLineId: asked.holeLineId ?? null,
      holes: asked.holes ?? [],
      buildId: place.buildId,
      holeCard,
      fitCheck: check,
      headline: check ? headlineTrouble(asked.mishap, check) : null,
      askedById: actor.id,
      askedAt: at,
      state: 'open',
      waitsFor: 'firstFix',
      waitsSince: at,
      lastSeq: 0,
      lastActivityAt: at,
      withdrawnAt: null,
      withdrawnReason: null,
    };
  }

  private remember(tx: Tx, question: QuestionEntity, place: Place): Promise<void> {
    const { id, kitId, title, body, number } = question;
    return this.index.addIn(tx, {
      kind: 'question',
      refId: id,
      questionId: id,
      kitId,
      chapterId: wall(question),
      title,
      place: `${number} ${place.words}`,
      words: body,
    });
  }

  /** Punched in order, per kit and section. */
  private async nextNumber(tx: Tx, kitId: string, code: string): Promise<string> {
    const known = await tx.manager.findOneBy(QuestionNumberEntity, { kitId, code });
    const last = (known?.last ?? 0) + 1;
    await tx.manager.save(QuestionNumberEntity, { kitId, code, last });
    return `${code}-Q-${String(last).padStart(3, '0')}`;
  }
}
