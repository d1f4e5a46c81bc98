// What start and dev have in common. No packages: there may be none yet.
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const NODE_AT_LEAST = [20, 19];

export const root = join(dirname(fileURLToPath(import.meta.url)), '../../..');
const inRoot = (...parts) => join(root, ...parts);
export const bin = (name) => inRoot('node_modules', '.bin', name);

export function refuse(sentence) {
  console.error(sentence);
  process.exit(1);
}

export function checkNode(version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number);
  const [least, leastMinor] = NODE_AT_LEAST;
  if (major < least || (major === least && minor < leastMinor))
    refuse(`Node ${NODE_AT_LEAST.join('.')} or newer is needed; this is ${version}.`);
}

function run(command, args, env = {}) {
  const { status, error } = spawnSync(command, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, ...env },
  });
  return error ? 1 : (status ?? 1);
}

/** The lock and the engine that the installed packages were compiled for. */
function wanted() {
  const lock = createHash('sha256')
    .update(readFileSync(inRoot('package-lock.json')))
    .digest('hex');
  return `${lock} ${process.versions.modules}`;
}

export function isInstalled() {
  const npmsOwn = inRoot('node_modules', '.package-lock.json');
  if (!existsSync(npmsOwn)) return false;
  const stamp = inRoot('node_modules', '.rivetside-installed');
  if (existsSync(stamp)) return readFileSync(stamp, 'utf8') === wanted();
  // Installed by hand.
  return statSync(npmsOwn).mtimeMs >= statSync(inRoot('package-lock.json')).mtimeMs;
}

export function installWhenNeeded() {
  if (isInstalled()) return;
  console.log('Installing … (the database is compiled: a minute or two)');
  // What builds it is among the development packages, whatever NODE_ENV says.
  if (run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund']) !== 0)
    refuse('The install failed: see above.');
  writeFileSync(inRoot('node_modules', '.rivetside-installed'), wanted());
}

/** The newest change below, folders included: a file that was taken away changes its folder. */
function newestBelow(path) {
  if (!existsSync(path)) return 0;
  const { mtimeMs } = statSync(path);
  if (!statSync(path).isDirectory()) return mtimeMs;
  return Math.max(mtimeMs, ...readdirSync(path).map((name) => newestBelow(join(path, name))));
}

export function isStale(built, sources) {
  if (!existsSync(built)) return true;
  const at = statSync(built).mtimeMs;
  return sources.some((source) => newestBelow(source) > at);
}

/** The compiler knows by itself what is stale, but asking it costs seconds at every start. */
export function buildServerWhenStale() {
  const stamp = inRoot('packages/api/dist/.built');
  const sources = ['shared/src', 'shared/tsconfig.json', 'api/src', 'api/tsconfig.json'];
  const others = [inRoot('tsconfig.base.json'), inRoot('package-lock.json')];
  if (!isStale(stamp, [...sources.map((source) => inRoot('packages', source)), ...others])) return;
  const began = new Date();
  if (run(process.execPath, [inRoot('node_modules/typescript/bin/tsc'), '-b', 'packages/api']) !== 0)
    refuse('The server does not compile: see above.');
  writeFileSync(stamp, '');
  // What was saved while it compiled is newer than that.
  utimesSync(stamp, began, began);
}

export function buildPageWhenStale() {
  const web = (name) => inRoot('packages/web', name);
  if (!existsSync(web('index.html'))) return;
  const sources = [
    ...readdirSync(web('.'))
      .filter((name) => !['dist', 'node_modules', 'e2e', 'scripts', 'pictures'].includes(name))
      .map(web),
    inRoot('packages/shared/src'),
    inRoot('package-lock.json'),
  ];
  if (!isStale(web('dist/index.html'), sources)) return;
  console.log('Building the page …');
  if (run('npm', ['run', 'build', '-w', '@rivetside/web', '--silent']) !== 0)
    refuse('The page does not build: see above.');
}
