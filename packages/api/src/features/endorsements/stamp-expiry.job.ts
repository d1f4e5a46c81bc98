import { Injectable, Logger, type OnApplicationBootstrap } from '@nestjs/common';
import { Cron, CronExpression } from '@nestjs/schedule';
import type { Person } from '@rivetside/shared';
import { IsNull } from 'typeorm';
import { writeAudit } from '../../common/audit/audit.js';
import { Settings } from '../../common/config/settings.js';
import { PreparedReader } from '../../common/database/prepared-reader.js';
import { UnitOfWork } from '../../common/database/unit-of-work.js';
import { Clock } from '../../common/time/clock.js';
import { FixesService } from '../fixes/fixes.service.js';
import { QuestionLogService } from '../questions/question-log.service.js';
import { EndorsementEntity } from './endorsement.entity.js';
import { StampFollowUp } from './stamp-follow-up.js';

const RAN_OUT = `SELECT e."id", e."fixId", e."byId", u."name" AS "byName" FROM "endorsements" e JOIN "users" u ON u."id" = e."byId"
  WHERE e."goodUntil" < ? AND e."expiredAt" IS NULL AND e."withdrawnAt" IS NULL ORDER BY e."goodUntil" LIMIT 200`;

interface RanOut {
  id: string;
  fixId: string;
  byId: string;
  byName: string;
}

/** A stamp stops counting on its day by itself; this tells its sheet and those who relied on it, once. */
@Injectable()
export class StampExpiryJob implements OnApplicationBootstrap {
  private readonly logger = new Logger(StampExpiryJob.name);

  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly reader: PreparedReader,
    private readonly fixes: FixesService,
    private readonly log: QuestionLogService,
    private readonly followUp: StampFollowUp,
    private readonly settings: Settings,
    private readonly clock: Clock,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    await this.expire();
  }

  @Cron(CronExpression.EVERY_HOUR)
  async expire(): Promise<void> {
    if (!this.settings.writes) return;
    const today = this.clock.instant().slice(0, 10);
    for (;;) {
      const stamps = this.reader.all<RanOut>(RAN_OUT, [today]);
      for (const stamp of stamps) await this.tell(stamp);
      if (stamps.length === 0) return;
      this.logger.log({ stamps: stamps.length }, 'stamps ran out');
    }
  }

  private async tell({ id, fixId, byId, byName }: RanOut): Promise<void> {
    const { question, fix } = this.fixes.requireById(fixId);
    const endorsement = fix.endorsements.find((one) => one.id === id)!;
    const by: Person = { id: byId, name: byName };
    await this.unitOfWork.run(async (tx) => {
      const at = this.clock.instant();
      const { affected } = await tx.manager.update(
        EndorsementEntity,
        { id, expiredAt: IsNull() },
        { expiredAt: at },
      );
      if (affected === 0) return;
      await writeAudit(tx.manager, { at, byId: null, what: 'stamp.expired', subject: ['endorsement', id] });
      const { stampNumber, goodUntil } = endorsement;
      await this.followUp.raise(tx, question, { fixId }, `stamp ${stampNumber} ran out on ${goodUntil}`);
      await this.log.append(tx, question, { type: 'endorsementExpired', by, data: { endorsement } });
    });
  }
}
