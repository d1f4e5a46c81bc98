import { statfsSync } from 'node:fs';
import { Controller, Get, ServiceUnavailableException } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import {
  HealthCheckService,
  type HealthCheckResult,
  type HealthIndicatorResult,
  HealthIndicatorService,
} from '@nestjs/terminus';
import { z } from 'zod';
import { Public } from '../access/access.decorator.js';
import { Settings } from '../config/settings.js';
import { PreparedReader } from '../database/prepared-reader.js';
import { NotReady } from '../errors/app-error.js';

/** Below this SQLite may not finish a checkpoint. */
const FREE_BYTES_MIN = 16 * 1024 * 1024;
const WAITING = 'SELECT count(*) AS "n" FROM "outbox" WHERE "sentAt" IS NULL AND "attempts" > 0';

const liveSchema = z.strictObject({ status: z.literal('ok') });
const readySchema = z.strictObject({ status: z.literal('ok'), notes: z.array(z.string()) });

@ApiTags('health')
@Controller('health')
export class HealthController {
  constructor(
    private readonly health: HealthCheckService,
    private readonly indicator: HealthIndicatorService,
    private readonly reader: PreparedReader,
    private readonly settings: Settings,
  ) {}

  @Get('live')
  @Public()
  @ApiOkResponse({ standardSchema: liveSchema })
  live(): z.infer<typeof liveSchema> {
    return { status: 'ok' };
  }

  /** May people be sent here? Where not, the problem names each thing that is wrong. */
  @Get('ready')
  @Public()
  @ApiOkResponse({ standardSchema: readySchema })
  async ready(): Promise<z.infer<typeof readySchema>> {
    try {
      await this.health.check([() => this.database(), () => this.disk()]);
    } catch (error) {
      throw new NotReady(faultsOf(error));
    }
    return { status: 'ok', notes: this.notes() };
  }

  private database(): HealthIndicatorResult {
    const check = this.indicator.check('database');
    try {
      this.reader.get('SELECT count(*) AS "n" FROM "migrations"');
      return check.up();
    } catch {
      return check.down('it cannot be read');
    }
  }

  private disk(): HealthIndicatorResult {
    const check = this.indicator.check('disk');
    try {
      const { bavail, bsize } = statfsSync(this.settings.dataDir);
      return bavail * bsize >= FREE_BYTES_MIN ? check.up() : check.down('it is full: reading goes on');
    } catch {
      return check.down('the data folder is gone');
    }
  }

  /** Waiting mail is no reason to send nobody here, but it is said. */
  private notes(): string[] {
    const waiting = this.reader.get<{ n: number }>(WAITING)?.n ?? 0;
    return [
      ...(waiting > 0 ? [`Mails refused so far and waiting: ${waiting}.`] : []),
      ...(this.settings.production && !this.settings.env.SMTP_URL
        ? ['SMTP_URL is not set: mails wait.']
        : []),
    ];
  }
}

function faultsOf(error: unknown): Record<string, string> {
  if (!(error instanceof ServiceUnavailableException)) return { check: 'it could not be made' };
  const { error: down = {} } = error.getResponse() as HealthCheckResult;
  return Object.fromEntries(
    Object.entries(down).map(([what, result]) => [
      what,
      String((result as { message?: string }).message ?? 'down'),
    ]),
  );
}
