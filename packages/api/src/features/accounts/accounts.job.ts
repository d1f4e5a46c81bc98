import { Injectable } from '@nestjs/common';
import { Cron, CronExpression } from '@nestjs/schedule';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { Clock } from '../../common/time/clock.js';

const DAY_MS = 86_400_000;
/** What has ended is kept so long for whoever asks what happened. */
const ENDED_DAYS = 90;
/** Signed up with, and the link never pressed. */
const UNCONFIRMED_DAYS = 30;
/** More than happen while a process is busy; the sockets look twice a second. */
const STANDINGS_KEPT = 1_000;

const DEAD_LINKS = 'DELETE FROM "mail_tokens" WHERE "expiresAt" < ?';
/** Used ones stay while their session lives: they are what a copied one is known by. */
const ENDED_SESSIONS = 'DELETE FROM "sessions" WHERE coalesce("endedAt", "lastUsedAt") < ?';
const NEVER_CONFIRMED = `DELETE FROM "users" WHERE "emailConfirmedAt" IS NULL AND "createdAt" < ?
  AND NOT EXISTS (SELECT 1 FROM "sessions" s WHERE s."userId" = "users"."id")
  AND NOT EXISTS (SELECT 1 FROM "memberships" m WHERE m."userId" = "users"."id")`;
const OLD_STANDINGS =
  'DELETE FROM "standing_changes" WHERE "seq" <= (SELECT max("seq") FROM "standing_changes") - ?';

/** Nothing about a person is kept longer than it serves. */
@Injectable()
export class AccountsJob {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  @Cron(CronExpression.EVERY_HOUR)
  async forgetOld(): Promise<void> {
    const now = this.clock.now().getTime();
    const daysAgo = (days: number) => new Date(now - days * DAY_MS).toISOString();
    await this.unitOfWork.runPrepared((db) => {
      db.run(DEAD_LINKS, [daysAgo(1)]);
      db.run(ENDED_SESSIONS, [daysAgo(ENDED_DAYS)]);
      db.run(NEVER_CONFIRMED, [daysAgo(UNCONFIRMED_DAYS)]);
      db.run(OLD_STANDINGS, [STANDINGS_KEPT]);
    });
  }
}
