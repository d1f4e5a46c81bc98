import type { Endorsement } from '@rivetside/shared';
import { newId } from '../common/ids.js';
import { EndorsementEntity } from '../features/endorsements/endorsement.entity.js';
import type { QuestionEntity } from '../features/questions/question.entity.js';
import { personOf, type Telling } from './telling.js';
import type { SeedStamp } from './seed.schema.js';

/** One stamp from the day it was given. */
export class StampStory {
  private shown: Endorsement | null = null;

  constructor(
    private readonly telling: Telling,
    private readonly seed: SeedStamp,
    private readonly question: QuestionEntity,
  ) {}

  async give(fixId: string): Promise<Endorsement> {
    const { stampNumber, basis, reference, conditions, goodUntil, reason } = this.seed;
    const { keys, tx, clock } = this.telling;
    const { holeLines = [], ...where } = this.seed.scope;
    const scope = {
      ...where,
      ...(holeLines.length > 0 ? { holeLineIds: holeLines.map((code) => keys.of('holeLine', code)) } : {}),
    };
    const by = personOf(this.telling, this.seed.by);
    const { id: questionId, discipline } = this.question;
    const facts = {
      id: newId(),
      fixId,
      questionId,
      stampNumber,
      discipline,
      basis,
      reference,
      scope,
      conditions,
      goodUntil,
      reason,
    };
    const given = { ...facts, givenAt: clock.instant(), reviews: [] };
    const untouched = {
      heldAt: null,
      heldReason: null,
      heldByNoticeId: null,
      withdrawnAt: null,
      withdrawnReason: null,
      expiredAt: null,
    };
    await tx.manager.insert(EndorsementEntity, { ...given, ...untouched, byId: by.id } as EndorsementEntity);
    return this.show({ ...given, by, state: 'live', held: null, withdrawn: null });
  }

  async hold({ notice, reason }: NonNullable<SeedStamp['held']>): Promise<Endorsement> {
    const at = this.telling.clock.instant();
    const noticeId = this.telling.keys.of('notice', notice);
    await this.write({ heldAt: at, heldReason: reason, heldByNoticeId: noticeId });
    return this.show({ ...this.now(), state: 'held', held: { at, reason, noticeId } });
  }

  async review({ by: key, decision, reason }: SeedStamp['reviews'][number]): Promise<Endorsement> {
    const at = this.telling.clock.instant();
    const by = personOf(this.telling, key);
    const reviews = [...this.now().reviews, { at, by, decision, reason }];
    const rows = reviews.map(({ by: { id: byId }, ...look }) => ({ ...look, byId }));
    await this.write({ reviews: rows, heldAt: null, heldReason: null, heldByNoticeId: null });
    this.show({ ...this.now(), state: 'live', held: null, reviews });
    // As the app has it: what is not kept is gone, for a stamp is never edited.
    return decision === 'keep' ? this.now() : this.withdraw(reason);
  }

  async withdraw(reason: string): Promise<Endorsement> {
    const at = this.telling.clock.instant();
    await this.write({ withdrawnAt: at, withdrawnReason: reason });
    return this.show({ ...this.now(), state: 'withdrawn', withdrawn: { at, reason } });
  }

  private async write(facts: Partial<EndorsementEntity>): Promise<void> {
    await this.telling.tx.manager.update(EndorsementEntity, { id: this.now().id }, facts as never);
  }

  private now(): Endorsement {
    return this.shown!;
  }

  private show(endorsement: Endorsement): Endorsement {
    this.shown = endorsement;
    return endorsement;
  }
}
