// Pictures of every main screen, wide and narrow, light and dark, into ./shots. Against SHOTS_URL when it is set, else
// against a server of its own with a demo of its own. SHOTS_ONLY=bench,sheet takes some screens only.
import { spawn } from 'node:child_process';
import { existsSync, mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { chromium } from '@playwright/test';

const root = join(dirname(fileURLToPath(import.meta.url)), '../../..');
const into = join(root, 'shots');
const PASSWORD = 'rivetside-demo';
const PORT = process.env.SHOTS_PORT ?? '3219';
const SIZES = [
  { name: '1440', width: 1440, height: 900 },
  { name: '390', width: 390, height: 844 },
];
const SCHEMES = ['light', 'dark'];

const BUILDER = 'builder@demo.rivetside.example';
const MENTOR = 'mentor@demo.rivetside.example';

const path = (address) => async (page) => void (await page.goto(address));
/** The first thing of a list, whatever its id. */
const firstBelow = (address, prefix) => async (page) => {
  await page.goto(address);
  await page.locator(`main a[href^="${prefix}"]`).first().click();
  await page.waitForURL(`**${prefix}*`);
};

/** A new screen is one more line: its name, who looks at it, and how they get there. */
const SCREENS = [
  { name: 'landing', as: null, open: path('/') },
  { name: 'sign-in', as: null, open: path('/sign-in') },
  { name: 'sign-up', as: null, open: path('/sign-up') },
  { name: 'stop', as: null, open: path('/stop') },
  { name: 'bench', as: BUILDER, open: path('/bench') },
  { name: 'kit', as: BUILDER, open: path('/kit') },
  { name: 'section', as: BUILDER, open: firstBelow('/kit', '/sections/') },
  { name: 'questions', as: BUILDER, open: path('/questions') },
  { name: 'sheet', as: BUILDER, open: firstBelow('/questions', '/questions/') },
  { name: 'ask', as: BUILDER, open: path('/ask') },
  { name: 'search', as: BUILDER, open: path('/search?q=doubler') },
  { name: 'record', as: BUILDER, open: path('/record') },
  { name: 'account', as: BUILDER, open: path('/account') },
  { name: 'desk', as: MENTOR, open: path('/desk') },
  { name: 'sheet-of-a-mentor', as: MENTOR, open: firstBelow('/questions', '/questions/') },
];

const executablePath = [process.env.CHROMIUM_PATH, '/usr/bin/chromium', '/usr/bin/google-chrome'].find(
  (one) => one && existsSync(one),
);

async function startServer() {
  const data = mkdtempSync(join(tmpdir(), 'rivetside-shots-'));
  const env = { ...process.env, PORT, DATA_DIR: data, DEMO: '1', LOG_LEVEL: 'warn' };
  const server = spawn(process.execPath, ['packages/api/scripts/start.mjs'], {
    cwd: root,
    env,
    stdio: 'inherit',
  });
  const url = `http://127.0.0.1:${PORT}`;
  const until = Date.now() + 300_000;
  while (!(await fetch(`${url}/api/health/ready`).catch(() => null))?.ok) {
    if (Date.now() > until || server.exitCode !== null)
      throw new Error('The server did not start: see above.');
    await new Promise((resolve) => setTimeout(resolve, 500));
  }
  const stop = async () => {
    const gone = new Promise((resolve) => server.once('exit', resolve));
    server.kill('SIGTERM');
    await gone;
    rmSync(data, { recursive: true, force: true });
  };
  return { url, stop };
}

async function signIn(page, email) {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.waitForURL('**/bench');
}

/** What a picture does not show: errors in the console, and a page wider than its screen. */
function watch(page, troubles) {
  page.on('pageerror', ({ message }) => troubles.push(message));
  page.on('console', (said) => {
    if (said.type() === 'error') troubles.push(`${said.text()} ${said.location().url}`);
  });
}

async function take(page, screen, file) {
  await screen.open(page);
  await page.waitForLoadState('networkidle');
  await page.evaluate(() => document.fonts.ready);
  const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  await page.screenshot({ path: join(into, file), fullPage: true });
  return over > 0 ? [`wider than the screen by ${over} px`] : [];
}

async function takeAs(browser, baseURL, { who, size, scheme, screens }) {
  const viewport = { width: size.width, height: size.height };
  const context = await browser.newContext({
    baseURL,
    viewport,
    colorScheme: scheme,
    reducedMotion: 'reduce',
  });
  const page = await context.newPage();
  const troubles = [];
  watch(page, troubles);
  if (who) await signIn(page, who);
  let failed = 0;
  for (const screen of screens) {
    troubles.length = 0;
    const file = `${screen.name}-${size.name}-${scheme}.png`;
    const found = await take(page, screen, file).catch(({ message }) => [message.split('\n')[0]]);
    const all = [...found, ...troubles];
    failed += all.length > 0 ? 1 : 0;
    console.log(all.length > 0 ? `${file}: ${all.join('; ')}` : file);
  }
  await context.close();
  return failed;
}

async function main() {
  if (!executablePath) throw new Error('Chromium is needed: install it or set CHROMIUM_PATH.');
  mkdirSync(into, { recursive: true });
  const only = process.env.SHOTS_ONLY?.split(',');
  const wanted = SCREENS.filter(({ name }) => !only || only.includes(name));
  const { url, stop } = process.env.SHOTS_URL
    ? { url: process.env.SHOTS_URL, stop: async () => undefined }
    : await startServer();
  const browser = await chromium.launch({ executablePath, args: ['--no-sandbox', '--disable-gpu'] });
  let failed = 0;
  try {
    for (const size of SIZES)
      for (const scheme of SCHEMES)
        for (const who of new Set(wanted.map(({ as }) => as))) {
          const screens = wanted.filter(({ as }) => as === who);
          failed += await takeAs(browser, url, { who, size, scheme, screens });
        }
  } finally {
    await browser.close();
    await stop();
  }
  console.log(failed === 0 ? 'All taken.' : `${failed} with trouble: see above.`);
  process.exitCode = failed === 0 ? 0 : 1;
}

await main();
