import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';

export const root = join(__dirname, '../../..');
export const MAIN = join(root, 'packages/api/dist/main.js');

/** Compiles what is started as a process of its own. Whether the types are right is for the gate to say. */
export function buildServer(): void {
  const tsc = join(root, 'node_modules/typescript/bin/tsc');
  const { stdout } = spawnSync(process.execPath, [tsc, '-b', 'packages/api'], {
    cwd: root,
    encoding: 'utf8',
  });
  if (!existsSync(MAIN)) throw new Error(`The server does not compile:\n${stdout}`);
}
