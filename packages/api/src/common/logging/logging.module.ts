import { type DynamicModule, Module } from '@nestjs/common';
import type { FastifyRequest } from 'fastify';
import { LoggerModule } from 'nestjs-pino';
import type { Settings } from '../config/settings.js';

/** One JSON line an event. Successful requests are said at debug: a line each would cost more than the request. */
@Module({})
export class LoggingModule {
  static with(settings: Settings): DynamicModule {
    return {
      module: LoggingModule,
      imports: [
        LoggerModule.forRoot({
          pinoHttp: {
            level: settings.env.LOG_LEVEL,
            autoLogging: false,
            quietReqLogger: true,
            genReqId: (request: unknown) => (request as FastifyRequest).id,
            redact: {
              paths: [
                'req.headers.authorization',
                'req.headers.cookie',
                '*.password',
                '*.token',
                '*.accessToken',
              ],
              remove: true,
            },
          },
          // The middleware would give every request a logger of its own; the filter names the request instead.
          forRoutes: [],
        }),
      ],
      exports: [LoggerModule],
    };
  }
}
