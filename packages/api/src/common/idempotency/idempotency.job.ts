import { Injectable } from '@nestjs/common';
import { Cron, CronExpression } from '@nestjs/schedule';
import { UnitOfWork } from '../database/unit-of-work.js';
import { Clock } from '../time/clock.js';

const KEPT_HOURS = 24;

/** Kept answers are for retries, and nobody retries after a day. */
@Injectable()
export class IdempotencyJob {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  @Cron(CronExpression.EVERY_HOUR)
  async forgetOld(): Promise<void> {
    const before = new Date(this.clock.now().getTime() - KEPT_HOURS * 3_600_000).toISOString();
    await this.unitOfWork.runPrepared((db) => {
      db.run('DELETE FROM "idempotency_keys" WHERE "createdAt" < ?', [before]);
    });
  }
}
