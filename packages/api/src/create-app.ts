import { NestFactory } from '@nestjs/core';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { Logger } from 'nestjs-pino';
import { AppModule } from './app.module.js';
import type { Settings } from './common/config/settings.js';
import { makeAdapter, prepareHttp } from './common/http/http.js';
import { serveWebPage } from './common/http/web-page.js';
import { serveDocs } from './common/openapi/docs.js';
import { LiveAdapter } from './common/realtime/live.adapter.js';
import { migrate } from './database/migrate.js';

/** The whole app, ready to listen: also what the tests start. */
export async function createApp(settings: Settings, webRoot: string | null): Promise<NestFastifyApplication> {
  if (settings.writes) await migrate(settings);
  const app = await NestFactory.create<NestFastifyApplication>(
    AppModule.with(settings),
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
