import { type DynamicModule, Module } from '@nestjs/common';
import { APP_FILTER, APP_INTERCEPTOR, APP_PIPE } from '@nestjs/core';
import { EventEmitterModule } from '@nestjs/event-emitter';
import { ScheduleModule } from '@nestjs/schedule';
import type { DestinationStream } from 'pino';
import { AccessModule } from './common/access/access.module.js';
import type { Settings } from './common/config/settings.js';
import { SettingsModule } from './common/config/settings.module.js';
import { DatabaseModule } from './common/database/database.module.js';
import { OneWriter } from './common/database/one-writer.js';
import { AppErrorFilter } from './common/errors/app-error.filter.js';
import { HealthModule } from './common/health/health.module.js';
import { validationPipe } from './common/http/validation.js';
import { IdempotencyInterceptor } from './common/idempotency/idempotency.interceptor.js';
import { IdempotencyJob } from './common/idempotency/idempotency.job.js';
import { LoggingModule } from './common/logging/logging.module.js';
import { MailModule } from './common/mail/mail.module.js';
import { RealtimeModule } from './common/realtime/realtime.module.js';
import { Clock } from './common/time/clock.js';
import { entities } from './database/entities.js';
import { migrations } from './database/migrations/index.js';
import { features } from './features/features.js';
import { DemoLoader } from './seed/demo-loader.js';

/** What a process brings along; the tests bring a clock, routes and a log of their own. */
export interface AppParts {
  /** Where the built page lies; without it the app is an API only. */
  readonly webRoot?: string | undefined;
  readonly clock?: Clock | undefined;
  readonly modules?: readonly (new () => object)[] | undefined;
  readonly log?: DestinationStream | undefined;
  readonly oneWriter?: OneWriter | undefined;
}

@Module({})
export class AppModule {
  static with(settings: Settings, { clock, modules = [], log, oneWriter }: AppParts): DynamicModule {
    return {
      module: AppModule,
      imports: [
        SettingsModule.with(settings, clock ?? new Clock()),
        LoggingModule.with(settings, log),
        DatabaseModule.with(entities, migrations),
        EventEmitterModule.forRoot({ global: true, wildcard: false, ignoreErrors: true }),
        // Jobs run in exactly one process.
        ...(settings.writes ? [ScheduleModule.forRoot()] : []),
        AccessModule,
        MailModule,
        RealtimeModule,
        HealthModule,
        ...features,
        ...modules,
      ],
      providers: [
        IdempotencyJob,
        DemoLoader,
        ...(oneWriter ? [{ provide: OneWriter, useValue: oneWriter }] : []),
        { provide: APP_FILTER, useClass: AppErrorFilter },
        { provide: APP_PIPE, useValue: validationPipe },
        { provide: APP_INTERCEPTOR, useClass: IdempotencyInterceptor },
      ],
    };
  }
}
