import { NestFactory } from '@nestjs/core';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { AppModule, type AppParts } from './app.module.js';
import type { Settings } from './common/config/settings.js';
import { OneWriter } from './common/database/one-writer.js';
import { makeAdapter, prepareHttp } from './common/http/http.js';
import { serveWebPage } from './common/http/web-page.js';
import { AppLogger } from './common/logging/app-logger.js';
import { logAnswers } from './common/logging/answer-log.js';
import { serveDocs } from './common/openapi/docs.js';
import { LiveAdapter } from './common/realtime/live.adapter.js';
import { migrate, refuseUnmigrated } from './database/migrate.js';

/** The whole app, ready to listen: also what the tests start, with parts of their own. */
export async function createApp(settings: Settings, parts: AppParts = {}): Promise<NestFastifyApplication> {
  if (!settings.writes) {
    refuseUnmigrated(settings);
    return assemble(settings, parts);
  }
  const oneWriter = OneWriter.claim(settings.lockFile);
  try {
    await migrate(settings);
    return await assemble(settings, { ...parts, oneWriter });
  } catch (error) {
    oneWriter.release();
    throw error;
  }
}

async function assemble(settings: Settings, parts: AppParts): Promise<NestFastifyApplication> {
  const app = await NestFactory.create<NestFastifyApplication>(
    AppModule.with(settings, parts),
    makeAdapter(settings),
    { bufferLogs: true, abortOnError: false },
  );
  app.useLogger(app.get(AppLogger));
  app.setGlobalPrefix('api', { exclude: ['dev/mail', 'dev/mail/:number'] });
  const fastify = app.getHttpAdapter().getInstance();
  await prepareHttp(app, settings);
  logAnswers(fastify, settings);
  if (parts.webRoot) await serveWebPage(fastify, settings, parts.webRoot);
  const live = new LiveAdapter(app, settings);
  await live.connectRedis();
  app.useWebSocketAdapter(live);
  serveDocs(app);
  return app;
}
