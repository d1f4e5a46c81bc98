import { mkdtempSync, rmSync } from 'node:fs';
import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { SettingsFault } from '../config/env.js';
import { OneWriter } from './one-writer.js';

/** Holds the lock as another process would, until it is killed. */
const HOLDER = `
  const Database = require('better-sqlite3');
  new Database(process.argv[1]).exec('BEGIN EXCLUSIVE');
  process.stdout.write('held');
  setInterval(() => undefined, 1000);`;

describe('OneWriter', () => {
  let folder: string;
  const file = () => join(folder, 'writer.lock');
  beforeEach(() => (folder = mkdtempSync(join(tmpdir(), 'rivetside-lock-'))));
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  it('lets a second one in only after the first has gone', () => {
    const first = OneWriter.claim(file());
    expect(() => OneWriter.claim(file())).toThrow(SettingsFault);
    first.release();
    OneWriter.claim(file()).release();
  });

  it('goes with a process that was killed', async () => {
    const holder = spawn(process.execPath, ['-e', HOLDER, file()], { cwd: __dirname });
    await once(holder.stdout, 'data');
    expect(() => OneWriter.claim(file())).toThrow('Another process already writes to DATA_DIR');
    holder.kill('SIGKILL');
    await once(holder, 'exit');
    OneWriter.claim(file()).release();
  });
});
