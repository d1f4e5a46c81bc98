import 'reflect-metadata';
import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { readEnv, SettingsFault } from './common/config/env.js';
import { Settings } from './common/config/settings.js';
import { createApp } from './create-app.js';
import { DemoLoader } from './seed/demo-loader.js';

const WEB_ROOT = fileURLToPath(new URL('../../web/dist', import.meta.url));

/** A sentence for whoever started it; the stack helps nobody there. */
function sentencesOf(error: unknown, port: number): readonly string[] {
  if (error instanceof SettingsFault) return error.sentences;
  const { code, message } = error as { code?: string; message?: string };
  if (code === 'EADDRINUSE')
    return [`Port ${port} is taken: stop what listens there, or set PORT to another.`];
  if (code === 'EACCES') return [`Port ${port} is not allowed for this user: set PORT above 1023.`];
  if (code === 'SQLITE_CANTOPEN' || code === 'SQLITE_READONLY')
    return ['The database in DATA_DIR cannot be opened for writing.'];
  return [`It did not start: ${message ?? String(error)}`];
}

async function start(): Promise<void> {
  let port = Number(process.env['PORT'] ?? 3000);
  try {
    const settings = new Settings(readEnv(process.env));
    port = settings.env.PORT;
    const app = await createApp(settings, existsSync(WEB_ROOT) ? { webRoot: WEB_ROOT } : {});
    await app.init();
    if (settings.demo && settings.writes) await app.get(DemoLoader).loadIntoEmpty();
    await app.listen(port, settings.env.HOST);
    process.send?.({ listening: await app.getUrl() });
  } catch (error) {
    process.stderr.write(`${sentencesOf(error, port).join('\n')}\n`);
    process.exit(1);
  }
}

await start();
