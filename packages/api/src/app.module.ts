import { type DynamicModule, Module } from '@nestjs/common';
import { APP_FILTER, APP_INTERCEPTOR, APP_PIPE } from '@nestjs/core';
import { EventEmitterModule } from '@nestjs/event-emitter';
import { ScheduleModule } from '@nestjs/schedule';
import { AccessModule } from './common/access/access.module.js';
import type { Settings } from './common/config/settings.js';
import { SettingsModule } from './common/config/settings.module.js';
import { DatabaseModule } from './common/database/database.module.js';
import { AppErrorFilter } from './common/errors/app-error.filter.js';
import { HealthModule } from './common/health/health.module.js';
import { validationPipe } from './common/http/validation.js';
import { IdempotencyInterceptor } from './common/idempotency/idempotency.interceptor.js';
import { IdempotencyJob } from './common/idempotency/idempotency.job.js';
import { LoggingModule } from './common/logging/logging.module.js';
import { MailModule } from './common/mail/mail.module.js';
import { RealtimeModule } from './common/realtime/realtime.module.js';
import type { Clock } from './common/time/clock.js';
import { entities } from './database/entities.js';
import { migrations } from './database/migrations/index.js';
import { features } from './features/features.js';
import { DemoLoader } from './seed/demo-loader.js';

@Module({})
export class AppModule {
  static with(settings: Settings, clock: Clock, modules: readonly (new () => object)[] = []): DynamicModule {
    return {
      module: AppModule,
      imports: [
        SettingsModule.with(settings, clock),
        LoggingModule.with(settings),
        DatabaseModule.with(entities, migrations),
        EventEmitterModule.forRoot({ global: true, wildcard: false, ignoreErrors: true }),
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
        { provide: APP_FILTER, useClass: AppErrorFilter },
        { provide: APP_PIPE, useValue: validationPipe },
        { provide: APP_INTERCEPTOR, useClass: IdempotencyInterceptor },
      ],
    };
  }
}
