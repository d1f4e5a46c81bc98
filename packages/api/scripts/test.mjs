// Everything that is tested, in one command: installs when needed, then unit and API tests (Jest), then the browser
// (Playwright on the built app). The last line is `N passed, N failed, N skipped`.
import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, rmSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = join(dirname(fileURLToPath(import.meta.url)), '../../..');
const reports = join(root, '.cache', 'reports');
const bin = (name) => join(root, 'node_modules', '.bin', name);

function run(command, args, env = {}) {
  const { status } = spawnSync(command, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, ...env },
  });
  return status ?? 1;
}

function installWhenNeeded() {
  if (existsSync(bin('jest')) && existsSync(join(root, 'node_modules', 'better-sqlite3', 'build'))) return;
  console.log('Installing what the tests need …');
  if (run('npm', ['ci']) !== 0) {
    console.error('The install failed: see above.');
    process.exit(1);
  }
}

function jestCounts(file) {
  if (!existsSync(file)) return { passed: 0, failed: 1, skipped: 0 };
  const report = JSON.parse(readFileSync(file, 'utf8'));
  return {
    passed: report.numPassedTests,
    // A file that does not even load has no tests to count: it counts as one failure.
    failed: report.numFailedTests + report.numRuntimeErrorTestSuites,
    skipped: report.numPendingTests + report.numTodoTests,
  };
}

function playwrightCounts(file) {
  if (!existsSync(file)) return { passed: 0, failed: 1, skipped: 0 };
  const { stats, errors } = JSON.parse(readFileSync(file, 'utf8'));
  return {
    passed: stats.expected,
    failed: stats.unexpected + stats.flaky + errors.length,
    skipped: stats.skipped,
  };
}

installWhenNeeded();
rmSync(reports, { recursive: true, force: true });
mkdirSync(reports, { recursive: true });

const jestReport = join(reports, 'jest.json');
const browserReport = join(reports, 'browser.json');
const counts = [];
let status = 0;

status |= run(bin('jest'), ['--json', `--outputFile=${jestReport}`, '--silent', '--maxWorkers=2'], {
  NODE_OPTIONS: `${process.env.NODE_OPTIONS ?? ''} --max-old-space-size=6144`,
});
counts.push(jestCounts(jestReport));

if (run('npm', ['run', 'build', '--silent']) === 0) {
  status |= run(bin('playwright'), ['test'], { PLAYWRIGHT_JSON_OUTPUT_NAME: browserReport });
  counts.push(playwrightCounts(browserReport));
} else {
  status = 1;
  counts.push({ passed: 0, failed: 1, skipped: 0 });
}

const sum = (key) => counts.reduce((total, one) => total + one[key], 0);
const failed = sum('failed');
if (failed > 0) status = 1;
console.log(`${sum('passed')} passed, ${failed} failed, ${sum('skipped')} skipped`);
process.exitCode = status === 0 ? 0 : 1;
