import { Injectable } from '@nestjs/common';
import { Cron, CronExpression } from '@nestjs/schedule';
import { UnitOfWork } from '../database/unit-of-work.js';
import { Clock } from '../time/clock.js';

const KEPT_MS = 30 * 86_400_000;

/** That a mail was sent is worth knowing for a while. */
@Injectable()
export class MailJob {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  @Cron(CronExpression.EVERY_HOUR)
  async forgetSent(): Promise<void> {
    const before = new Date(this.clock.now().getTime() - KEPT_MS).toISOString();
    await this.unitOfWork.runPrepared((db) => {
      db.run('DELETE FROM "outbox" WHERE "sentAt" < ?', [before]);
    });
  }
}
