// One command from a fresh clone: installs, builds what is stale, starts, and says where to look.
import { fork } from 'node:child_process';
import { join } from 'node:path';
import { buildPageWhenStale, buildServerWhenStale, checkNode, installWhenNeeded, root } from './prepare.mjs';

checkNode();
installWhenNeeded();
buildServerWhenStale();
buildPageWhenStale();

const server = fork(join(root, 'packages/api/dist/main.js'), { cwd: root, stdio: 'inherit' });

server.on('message', ({ listening, demo }) => {
  if (!listening) return;
  const lines = ['', `Rivetside is ready: ${listening}`];
  if (demo?.people.length > 0) {
    const width = Math.max(...demo.people.map(({ email }) => email.length));
    const people = demo.people.map(({ email, name, as }) => `  ${email.padEnd(width)}  ${name}, ${as}`);
    lines.push('', `Sign in with the password ${demo.password} as`, ...people);
  }
  console.log(`${lines.join('\n')}\n`);
});
server.on('exit', (code, signal) => process.exit(code ?? (signal ? 1 : 0)));
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal));

// npm runs this through a shell, and a shell that is told to stop tells nobody.
const startedBy = process.ppid;
if (process.env.npm_lifecycle_event)
  setInterval(() => process.ppid === startedBy || server.kill('SIGTERM'), 500).unref();
