import AxeBuilder from '@axe-core/playwright';
import { expect, type Page, test } from '@playwright/test';
import { DESK, noSidewaysScroll, PHONE, type Person, sheetOf, signIn, watch } from './people';

type Open = (page: Page) => Promise<void>;
const at =
  (address: string): Open =>
  async (page) =>
    void (await page.goto(address));

/** Every page of the main job: who looks, and how they get there. */
const PAGES: readonly { readonly name: string; readonly as: Person | null; readonly open: Open }[] = [
  { name: 'the landing', as: null, open: at('/') },
  { name: 'the sign-in', as: null, open: at('/sign-in') },
  { name: 'the sign-up', as: null, open: at('/sign-up') },
  { name: 'the forgotten password', as: null, open: at('/forgotten') },
  { name: 'the stop page', as: null, open: at('/stop') },
  { name: 'an address where nothing is', as: 'builder', open: at('/nowhere') },
  { name: 'the bench of a builder', as: 'builder', open: at('/bench') },
  { name: 'the kit', as: 'builder', open: at('/kit') },
  {
    name: 'a section',
    as: 'builder',
    open: async (page) => {
      await page.goto('/kit');
      await page.getByRole('link', { name: /^Stabiliser/ }).click();
      await page.getByRole('link', { name: 'Open the section' }).click();
    },
  },
  { name: 'the questions', as: 'builder', open: at('/questions') },
  { name: 'the search', as: 'builder', open: at('/search?q=doubler') },
  { name: 'a search without a hit', as: 'builder', open: at('/search?q=unobtainium') },
  { name: 'asking', as: 'builder', open: at('/ask') },
  { name: 'the record', as: 'builder', open: at('/record') },
  { name: 'the account', as: 'builder', open: at('/account') },
  {
    name: 'a sheet',
    as: 'builder',
    open: async (page) => void (await page.goto(await sheetOf(page, 'STB-Q-001'))),
  },
  { name: 'the bench of a mentor', as: 'mentor', open: at('/bench') },
  { name: 'the desk', as: 'mentor', open: at('/desk') },
  { name: 'the desk of somebody who has none', as: 'builder2', open: at('/desk') },
  { name: 'the bench of a chapter admin', as: 'admin', open: at('/bench') },
];

/** Wide and narrow, light and dark, each once: what differs between them differs in one of the two. */
const LOOKS = [
  { name: 'wide and light', viewport: DESK, colorScheme: 'light' },
  { name: 'narrow and dark', viewport: PHONE, colorScheme: 'dark' },
] as const;

for (const { name: look, viewport, colorScheme } of LOOKS)
  test.describe(look, () => {
    for (const who of new Set(PAGES.map(({ as }) => as)))
      test(`what ${who ?? 'a stranger'} sees has nothing that axe finds, and fits the screen`, async ({
        browser,
      }) => {
        const context = await browser.newContext({ viewport, colorScheme, reducedMotion: 'reduce' });
        const page = await context.newPage();
        const troubles = watch(page);
        if (who) await signIn(page, who);
        for (const { name, open } of PAGES.filter(({ as }) => as === who))
          await test.step(name, async () => {
            await open(page);
            await page.waitForLoadState('networkidle');
            await expect(page.getByRole('main')).not.toBeEmpty();
            await noSidewaysScroll(page);
            const { violations } = await new AxeBuilder({ page }).analyze();
            const found = violations.map(
              ({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`,
            );
            expect(found, name).toEqual([]);
          });
        expect(troubles).toEqual([]);
        await context.close();
      });
  });
