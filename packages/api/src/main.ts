import 'reflect-metadata';
import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { Logger } from '@nestjs/common';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import { readEnv, SettingsFault } from './common/config/env.js';
import { Settings } from './common/config/settings.js';

const WEB_ROOT = fileURLToPath(new URL('../../web/dist', import.meta.url));
const STOP_MS = 10_000;
const IMPATIENT_MS = 1_000;
const logger = new Logger('Process');

const SENTENCES: Readonly<Record<string, (port: number) => string>> = {
  EADDRINUSE: (port) => `Port ${port} is taken: stop what listens there, or set PORT to another.`,
  EACCES: (port) => `Port ${port} is not allowed for this user: set PORT above 1023.`,
  EADDRNOTAVAIL: () => 'HOST is no address of this machine.',
  ENOTFOUND: () => 'HOST is no address of this machine.',
  ECONNREFUSED: () => 'Nobody answers at REDIS_URL.',
  ENOSPC: () => 'The disk that holds DATA_DIR is full.',
  SQLITE_FULL: () => 'The disk that holds DATA_DIR is full.',
  SQLITE_CANTOPEN: () => 'The database in DATA_DIR cannot be opened for writing.',
  SQLITE_READONLY: () => 'The database in DATA_DIR cannot be opened for writing.',
  SQLITE_NOTADB: () => 'The file rivetside.sqlite in DATA_DIR is no database: restore a backup.',
  SQLITE_CORRUPT: () => 'The database in DATA_DIR is damaged: restore a backup.',
};

/** For whoever started it; the stack helps nobody there. */
function sentencesOf(error: unknown, port: number): readonly string[] {
  if (error instanceof SettingsFault) return error.sentences;
  const { code, message } = error as { code?: string; message?: string };
  const sentence = SENTENCES[code ?? ''];
  return [sentence ? sentence(port) : `It did not start: ${(message ?? String(error)).split('\n')[0]}`];
}

/** What was taken in is answered and written; what hangs longer than that is cut off. */
function stopOnSignals(app: NestFastifyApplication): void {
  let since = 0;
  const stop = () => {
    // Ctrl+C reaches this process twice, by the terminal and by the one that started it.
    if (since > 0 && Date.now() - since > IMPATIENT_MS) process.exit(1);
    if (since > 0) return;
    since = Date.now();
    setTimeout(() => process.exit(1), STOP_MS).unref();
    app.close().then(
      () => process.exit(0),
      () => process.exit(1),
    );
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
  // Started by another process that has gone.
  process.once('disconnect', stop);
}

/** A forgotten rejection is told and lived with: what is written is whole, and the others go on working. */
function reportForgotten(): void {
  process.on('unhandledRejection', (error) => logger.error({ err: error }, 'a failure nobody waited for'));
}

/** The demo world where there is nothing yet, and who may be signed in as. */
async function prepareDemo(app: NestFastifyApplication, settings: Settings) {
  if (!settings.demo) return null;
  const { DemoLoader } = await import('./seed/demo-loader.js');
  const { DEMO_PASSWORD, DemoService } = await import('./features/demo/demo.service.js');
  if (settings.writes) await app.get(DemoLoader).loadIntoEmpty();
  return { password: DEMO_PASSWORD, people: app.get(DemoService).signIns() };
}

async function start(): Promise<void> {
  let port = 3000;
  try {
    const settings = new Settings(readEnv(process.env));
    port = settings.env.PORT;
    // Loaded after the settings are found good: it takes a second or two, and a fault is told at once.
    const { createApp } = await import('./create-app.js');
    const app = await createApp(settings, existsSync(WEB_ROOT) ? { webRoot: WEB_ROOT } : {});
    reportForgotten();
    stopOnSignals(app);
    await app.init();
    const demo = await prepareDemo(app, settings);
    await app.listen(port, settings.env.HOST);
    logger.log({ port, role: settings.env.ROLE }, 'listening');
    process.send?.({ listening: port === 0 ? await app.getUrl() : settings.publicUrl, demo });
  } catch (error) {
    process.stderr.write(`${sentencesOf(error, port).join('\n')}\n`);
    process.exit(1);
  }
}

await start();
