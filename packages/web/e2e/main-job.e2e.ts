import { type Browser, expect, type Page, test } from '@playwright/test';
import { browserOf, keptOnDevice, PHONE } from './people';

const TITLE = 'Hole 12 of the doubler shows a crescent';
/** A picture of one colour, as a phone might send it; the smallest that is a picture. */
const PICTURE = Buffer.from(
  'iVBORw0KGgoAAAANSUhEUgAAACAAAAAYCAMAAACsjQ8GAAAAA1BMVEWKmls8z0lgAAAACXBIWXMAAAPoAAAD6AG1e1JrAAAAEUlEQVQokWNgGAWjYBQwoAEAAxgAATJlthoAAAAASUVORK5CYII=',
  'base64',
);

interface Three {
  readonly builder: Page;
  readonly mentor: Page;
  readonly second: Page;
  readonly troubles: string[][];
  close(): Promise<void>;
}

/** Two desks and a phone, each with its own session. */
async function three(browser: Browser): Promise<Three> {
  const [builder, mentor, second] = [
    await browserOf(browser, 'builder'),
    await browserOf(browser, 'mentor'),
    await browserOf(browser, 'mentor2', { viewport: PHONE, hasTouch: true, isMobile: true }),
  ];
  const all = [builder, mentor, second];
  return {
    builder: builder.page,
    mentor: mentor.page,
    second: second.page,
    troubles: all.map(({ troubles }) => troubles),
    close: async () => {
      for (const { context } of all) await context.close();
    },
  };
}

async function ask(page: Page): Promise<void> {
  await page.goto('/kit');
  await page.getByRole('link', { name: /^Stabiliser/ }).click();
  await page.getByRole('tab', { name: /Hole lines/ }).click();
  await page
    .getByRole('row', { name: /HL-STB-3/ })
    .getByRole('link', { name: /Something is wrong/ })
    .click();
  await expect(page.getByRole('heading', { name: /do not drill/i }).first()).toBeVisible();
  await page
    .getByRole('link', { name: /Go on to ask/ })
    .first()
    .click();

  await page.getByRole('radio', { name: 'Holes do not line up' }).check();
  await expect(page.getByLabel('Hole line', { exact: true })).not.toHaveValue('');
  await page.getByLabel('Hole numbers').fill('12');
  await page.getByLabel('In one line').fill(TITLE);
  await page
    .getByLabel(/What you see/)
    .fill('Matched this evening; a 1/8 pin does not drop. Nothing is drilled.');
  const doubler = page.getByRole('group', { name: 'Rear-spar doubler', exact: true });
  const spar = page.getByRole('group', { name: 'Rear spar', exact: true });
  for (const layer of [doubler, spar]) await layer.getByLabel('Largest across', { exact: true }).fill('#30');
  await doubler.getByLabel('Edge, Rear-spar doubler', { exact: true }).fill('0.03');
  await page.getByRole('button', { name: 'Put it to the mentors' }).click();
  await expect(page.getByRole('alert').first()).toContainText('less than half the hole');

  await doubler.getByLabel('Edge, Rear-spar doubler', { exact: true }).fill('0.345');
  await spar.getByLabel('Layers off by', { exact: true }).fill('0,020');
  await spar.getByLabel('Edge, Rear spar', { exact: true }).fill('10.5 mm');
  await page.getByLabel('Next hole, left', { exact: true }).fill('5/8');
  await page.getByLabel('Next hole, right', { exact: true }).fill('0.630');
  await page.getByRole('checkbox', { name: 'None of these' }).check();
  await page
    .locator('input[type="file"]')
    .first()
    .setInputFiles({ name: 'row.png', mimeType: 'image/png', buffer: PICTURE });
  await page.getByLabel('What photo 1 shows').first().fill('The whole row');
}

test('a question is asked, advised, endorsed and carried out by three people who see each other', async ({
  browser,
}) => {
  const { builder, mentor, second, troubles, close } = await three(browser);

  await test.step('the builder asks at an exact place; a reload loses nothing that was typed', async () => {
    await ask(builder);
    await expect(builder.getByText(/draft kept on this device/)).toBeVisible();
    await keptOnDevice(builder, 'The whole row');
    await builder.reload();
    await expect(builder.getByLabel('In one line')).toHaveValue(TITLE);
    await expect(builder.getByLabel('Next hole, left', { exact: true })).toHaveValue('5/8');
    await expect(builder.getByLabel('What photo 1 shows').first()).toHaveValue('The whole row');
    await builder.getByRole('button', { name: 'Put it to the mentors' }).click();
    await builder.waitForURL('**/questions/*');
    await expect(builder.getByRole('heading', { level: 1, name: TITLE })).toBeVisible();
    await expect(builder.getByText(/^open$/i).first()).toBeVisible();
  });
  const address = new URL(builder.url()).pathname;

  await test.step('it waits on the mentor’s desk, and both are seen at the sheet', async () => {
    await mentor.goto('/desk');
    await mentor.getByRole('link', { name: TITLE }).click();
    await expect(mentor.getByRole('heading', { level: 1, name: TITLE })).toBeVisible();
    await expect(builder.getByText(/2 at the sheet/)).toBeVisible();
  });

  await test.step('they talk live, and each sees that the other is writing', async () => {
    await mentor.getByLabel('Write to the bench').pressSequentially('Centre to edge or rim to edge?');
    await expect(builder.getByText('Imke is writing…')).toBeVisible();
    await mentor.getByRole('button', { name: 'Send' }).click();
    await expect(builder.getByRole('log').getByText('Centre to edge or rim to edge?')).toBeVisible();
    await builder.getByLabel('Write to the bench').fill('Centre to edge, by caliper.');
    await builder.getByLabel('Write to the bench').press('Enter');
    await expect(mentor.getByRole('log').getByText('Centre to edge, by caliper.')).toHaveCount(1);
  });

  await test.step('a broken connection loses no line and doubles none', async () => {
    await builder.context().setOffline(true);
    await builder.getByLabel('Write to the bench').fill('Said without a network.');
    await builder.getByLabel('Write to the bench').press('Enter');
    await expect(builder.getByText(/on its way; kept on this device/)).toBeVisible();
    await mentor.getByLabel('Write to the bench').fill('Said while you were away.');
    await mentor.getByLabel('Write to the bench').press('Enter');
    await builder.context().setOffline(false);
    await expect(builder.getByRole('log').getByText('Said while you were away.')).toHaveCount(1, {
      timeout: 30_000,
    });
    await expect(mentor.getByRole('log').getByText('Said without a network.')).toHaveCount(1, {
      timeout: 30_000,
    });
    await expect(builder.getByText(/on its way; kept on this device/)).toHaveCount(0);
  });

  await test.step('the mentor proposes a fix whose numbers are frozen beside it', async () => {
    await mentor.getByRole('button', { name: 'Propose a fix' }).click();
    const dialog = mentor.getByRole('dialog');
    await dialog.getByRole('radio', { name: /Next rivet size/ }).check();
    await expect(dialog.getByLabel('In a line')).toHaveValue(/Open to #21/);
    await dialog.getByLabel('Op 10', { exact: true }).fill('');
    await dialog.getByRole('button', { name: 'Propose it' }).click();
    await expect(dialog.getByRole('alert')).toContainText('Say what is to be done.');
    await dialog.getByLabel('Op 10', { exact: true }).fill('Pin holes 11 and 13; clamp a guide bush midway.');
    await dialog.getByRole('button', { name: 'Propose it' }).click();
    await expect(dialog).toHaveCount(0);
    await expect(builder.getByText('Pin holes 11 and 13; clamp a guide bush midway.')).toBeVisible();
    await expect(builder.getByText(/^advised$/i).first()).toBeVisible();
    await expect(mentor.getByText('Nobody stamps their own fix: another mentor does.')).toBeVisible();
    await expect(mentor.getByRole('button', { name: 'Endorse' })).toHaveCount(0);
  });

  await test.step('the second mentor stamps it on a phone, having seen the stamp drawn', async () => {
    await second.goto(address);
    await second.getByRole('button', { name: 'Fixes 1' }).click();
    await second.getByRole('button', { name: 'Endorse' }).click();
    const dialog = second.getByRole('dialog');
    await dialog.getByRole('radio', { name: 'drawing note' }).check();
    await expect(dialog.getByRole('img', { name: /Stamp M-08, Dezso Harrowmeck/ })).toBeVisible();
    await dialog.getByLabel('Reference').fill('Drawing FT-STB-3, note 4');
    await dialog.getByLabel(/Conditions/).fill('Hole 12 only');
    await dialog.getByRole('button', { name: 'Give the stamp' }).click();
    await expect(dialog).toHaveCount(0);
    await expect(builder.getByText(/^endorsed$/i).first()).toBeVisible();
    await expect(builder.getByRole('img', { name: /Stamp M-08/ })).toBeVisible();
  });

  await test.step('the builder carries it out with what was measured, and it stands in the record', async () => {
    await builder.getByRole('button', { name: 'Carry it out' }).click();
    const dialog = builder.getByRole('dialog');
    await dialog.getByRole('checkbox', { name: 'Hole 12 only' }).check();
    await dialog.getByLabel('Final drill').fill('#21');
    await dialog.getByLabel('Shop head, width').fill('0.236');
    await dialog.getByLabel('Shop head, height').fill('0.079');
    await dialog.getByLabel('Rivet length').fill('5.5');
    await dialog.getByLabel('Minutes').fill('half an hour');
    await dialog.getByRole('button', { name: 'Carried out' }).click();
    await expect(dialog.getByRole('alert')).toContainText('Give the minutes as a number.');
    await dialog.getByLabel('Minutes').fill('35');
    await dialog.getByRole('button', { name: 'Carried out' }).click();
    await expect(dialog).toHaveCount(0);
    await expect(mentor.getByText(/^carried out$/i).first()).toBeVisible();
    await builder.getByRole('link', { name: 'In your record' }).click();
    await expect(builder.getByRole('main')).toContainText(TITLE);
    await expect(builder.getByRole('main')).toContainText('stamp M-08');
  });

  await test.step('what was not ticked waits as an open item', async () => {
    await expect(builder.getByText(/a photo of the clean hole before driving/).first()).toBeVisible();
  });

  expect(troubles).toEqual([[], [], []]);
  await close();
});
