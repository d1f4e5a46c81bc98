import { Injectable } from '@nestjs/common';
import { Cron, CronExpression } from '@nestjs/schedule';
import { UnitOfWork } from '../database/unit-of-work.js';
import { ANSWERS_KEPT_MS } from './idempotency.interceptor.js';
import { Clock } from '../time/clock.js';

/** Kept answers are for retries. */
@Injectable()
export class IdempotencyJob {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  @Cron(CronExpression.EVERY_HOUR)
  async forgetOld(): Promise<void> {
    const before = new Date(this.clock.now().getTime() - ANSWERS_KEPT_MS).toISOString();
    await this.unitOfWork.runPrepared((db) => {
      db.run('DELETE FROM "idempotency_keys" WHERE "createdAt" < ?', [before]);
    });
  }
}
