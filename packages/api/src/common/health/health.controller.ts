import { Controller, Get } from '@nestjs/common';
import { ApiTags } from '@nestjs/swagger';
import {
  HealthCheck,
  HealthCheckService,
  type HealthIndicatorResult,
  HealthIndicatorService,
} from '@nestjs/terminus';
import { Public } from '../access/access.decorator.js';
import { Settings } from '../config/settings.js';
import { PreparedReader } from '../database/prepared-reader.js';

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
  live(): { status: 'ok' } {
    return { status: 'ok' };
  }

  @Get('ready')
  @Public()
  @HealthCheck()
  ready() {
    return this.health.check([() => this.database(), () => this.mail()]);
  }

  private database(): HealthIndicatorResult {
    const check = this.indicator.check('database');
    try {
      this.reader.get('SELECT count(*) AS n FROM "migrations"');
      return check.up();
    } catch {
      return check.down('the database cannot be read');
    }
  }

  /** Waiting mail is no reason to send nobody here, but it is said. */
  private mail(): HealthIndicatorResult {
    const waiting = this.reader.get<{ n: number }>(
      'SELECT count(*) AS n FROM "outbox" WHERE "sentAt" IS NULL AND "attempts" > 0',
    );
    const unset = this.settings.production && !this.settings.env.SMTP_URL;
    return this.indicator.check('mail').up({
      failedAndWaiting: waiting?.n ?? 0,
      ...(unset ? { note: 'SMTP_URL is not set: mails wait' } : {}),
    });
  }
}
