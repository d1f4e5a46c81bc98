import { type DynamicModule, Module } from '@nestjs/common';
import { LoggerModule } from 'nestjs-pino';
import { type DestinationStream, stdTimeFunctions } from 'pino';
import type { Settings } from '../config/settings.js';
import { AppLogger } from './app-logger.js';

/** Never in a log, at whatever depth an object is handed over. */
const SECRETS = ['password', 'token', 'accessToken', 'refreshToken', 'authorization', 'cookie'];
const REDACTED = SECRETS.flatMap((name) => [name, `*.${name}`, `*.*.${name}`, `*.*.*.${name}`]);

/** JSON, one line an event. */
@Module({})
export class LoggingModule {
  static with(settings: Settings, destination?: DestinationStream): DynamicModule {
    const options = {
      level: settings.env.LOG_LEVEL,
      timestamp: stdTimeFunctions.isoTime,
      base: { pid: process.pid },
      formatters: { level: (level: string) => ({ level }) },
      redact: { paths: REDACTED, remove: true },
    };
    return {
      module: LoggingModule,
      imports: [
        LoggerModule.forRoot({
          pinoHttp: destination ? [options, destination] : options,
          // Its middleware would give every request a logger of its own; refusals name the request instead.
          forRoutes: [],
        }),
      ],
      providers: [AppLogger],
      exports: [LoggerModule, AppLogger],
    };
  }
}
