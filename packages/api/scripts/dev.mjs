// Watches all three packages: the compiler for shared and api, the server on what it wrote, Vite for the page.
import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { bin, buildServerWhenStale, checkNode, installWhenNeeded, root } from './prepare.mjs';

checkNode();
installWhenNeeded();
// Once before the server starts: it would find nothing to run.
buildServerWhenStale();

const commands = {
  types: 'tsc -b packages/shared packages/api --watch --preserveWatchOutput',
  // Watches the files that it has loaded, so that one which does not compile keeps the last good server.
  server: 'node --watch --watch-preserve-output packages/api/dist/main.js',
  ...(existsSync(join(root, 'packages/web/index.html')) ? { page: 'npm run dev -w @rivetside/web' } : {}),
};
const watching = spawn(
  bin('concurrently'),
  ['--kill-others', '--names', Object.keys(commands).join(), ...Object.values(commands)],
  { cwd: root, stdio: 'inherit' },
);
watching.on('exit', (code) => process.exit(code ?? 0));
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => watching.kill(signal));
