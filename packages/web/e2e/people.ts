import type { Browser, BrowserContext, Page } from '@playwright/test';
import { expect } from '@playwright/test';

export const DESK = { width: 1440, height: 900 };
export const PHONE = { width: 390, height: 844 };
const PASSWORD = 'rivetside-demo';

export type Person =
  'builder' | 'builder2' | 'mentor' | 'mentor2' | 'mentor3' | 'admin' | 'admin2' | 'steward' | 'site';

/** Signs in by the page itself, as one of the demo's people. */
export async function signIn(page: Page, person: Person): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(`${person}@demo.rivetside.example`);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.waitForURL('**/bench');
}

/** A browser of somebody's own, whose page must say nothing wrong in its console. */
export async function browserOf(
  browser: Browser,
  person: Person,
  options: Parameters<Browser['newContext']>[0] = {},
): Promise<{ page: Page; context: BrowserContext; troubles: string[] }> {
  const context = await browser.newContext({ viewport: DESK, reducedMotion: 'reduce', ...options });
  const page = await context.newPage();
  const troubles = watch(page);
  await signIn(page, person);
  return { page, context, troubles };
}

/** Errors of the page and its console; a refused request that the test provokes says so itself. */
export function watch(page: Page): string[] {
  const troubles: string[] = [];
  page.on('pageerror', ({ message }) => troubles.push(message));
  page.on('console', (said) => {
    if (
      said.type() === 'error' &&
      !/status of 4\d\d|ERR_INTERNET_DISCONNECTED|ERR_CONNECTION/.test(said.text())
    )
      troubles.push(said.text());
  });
  return troubles;
}

/** The address of a question of the demo, by its number. */
export async function sheetOf(page: Page, number: string): Promise<string> {
  await page.goto(`/search?q=${encodeURIComponent(number)}`);
  const link = page.getByRole('main').locator('a[href^="/questions/"]').first();
  await expect(link).toBeVisible();
  return (await link.getAttribute('href'))!;
}

export async function noSidewaysScroll(page: Page): Promise<void> {
  const over = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  expect(over).toBeLessThanOrEqual(0);
}

/** Waits until the device has kept what was typed: only then may a test take the page away. */
export async function keptOnDevice(page: Page, words: string): Promise<void> {
  const isKept = (sought: string) =>
    new Promise<boolean>((resolve) => {
      const opening = indexedDB.open('keyval-store');
      opening.onerror = () => resolve(false);
      opening.onsuccess = () => {
        const all = opening.result.transaction('keyval').objectStore('keyval').getAll();
        all.onsuccess = () => {
          opening.result.close();
          resolve(JSON.stringify(all.result).includes(sought));
        };
      };
    });
  await expect.poll(() => page.evaluate(isKept, words)).toBe(true);
}
