import { NestFactory } from '@nestjs/core';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { Logger } from 'nestjs-pino';
import { AppModule } from './app.module.js';
import type { Settings } from './common/config/settings.js';
import { makeAdapter, prepareHttp } from './common/http/http.js';
import { serveWebPage } from './common/http/web-page.js';
import { serveDocs } from './common/openapi/docs.js';
import { LiveAdapter } from './common/realtime/live.adapter.js';
import { Clock } from './common/time/clock.js';
import { migrate } from './database/migrate.js';

export interface AppParts {
  /** Where the built page lies; without it the app is an API only. */
  readonly webRoot?: string | undefined;
  readonly clock?: Clock | undefined;
  readonly modules?: readonly (new () => object)[] | undefined;
}

/** The whole app, ready to listen: also what the tests start, with a clock and modules of their own. */
export async function createApp(settings: Settings, parts: AppParts = {}): Promise<NestFastifyApplication> {
  const { webRoot, clock = new Clock(), modules = [] } = parts;
  if (settings.writes) await migrate(settings);
  const app = await NestFactory.create<NestFastifyApplication>(
    AppModule.with(settings, clock, modules),
    makeAdapter(settings),
    {
      bufferLogs: true,
      abortOnError: false,
    },
  );
  app.useLogger(app.get(Logger));
  app.setGlobalPrefix('api', { exclude: ['dev/mail', 'dev/mail/:number'] });
  await prepareHttp(app, settings);
  if (webRoot) await serveWebPage(app.getHttpAdapter().getInstance(), settings, webRoot);
  const live = new LiveAdapter(app, settings);
  await live.connectRedis();
  app.useWebSocketAdapter(live);
  serveDocs(app);
  app.enableShutdownHooks();
  return app;
}
