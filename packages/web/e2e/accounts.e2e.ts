import { expect, type Page, test } from '@playwright/test';
import { sheetOf, signIn } from './people';

const PASSWORD = 'a longer password for the shed';

/** The newest mail to somebody, as a developer reads it: the address of the link in it. */
async function linkMailed(page: Page, to: string, subject: RegExp): Promise<string> {
  await expect(async () => {
    await page.goto('/dev/mail');
    await expect(
      page.getByRole('listitem').filter({ hasText: to }).filter({ hasText: subject }).first(),
    ).toBeVisible({ timeout: 1_000 });
  }).toPass({ timeout: 30_000 });
  await page
    .getByRole('listitem')
    .filter({ hasText: to })
    .filter({ hasText: subject })
    .first()
    .getByRole('link')
    .click();
  return (await page.locator('a[href*="token"]').first().getAttribute('href'))!;
}

test('somebody signs up, confirms, signs in, forgets the password and ends a session', async ({ page }) => {
  const email = 'newcomer@test.example';
  await page.goto('/sign-up');
  await page.getByLabel('Name').fill('Nell Comer');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill('short');
  await page.getByRole('button', { name: /Make|Sign up/ }).click();
  await expect(page.getByLabel('E-mail')).toHaveValue(email);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: /Make|Sign up/ }).click();
  await expect(page.getByRole('main')).toContainText(/mail/i);

  await page.goto(await linkMailed(page, email, /./));
  await page.getByRole('button', { name: /Confirm/ }).click();
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await page.waitForURL('**/bench');
  await expect(page.getByRole('main')).toContainText(/chapter/i);

  await page.goto('/forgotten');
  await page.getByLabel('E-mail').fill(email);
  await page
    .getByRole('button')
    .filter({ hasText: /Send|mail/i })
    .first()
    .click();
  await page.goto(await linkMailed(page, email, /password/i));
  await page
    .getByLabel(/password/i)
    .first()
    .fill(`${PASSWORD} again`);
  await page
    .getByRole('button', { name: /Set|password/i })
    .last()
    .click();
  await expect(page.getByRole('main')).toContainText(/sign in/i);
});

test('a session that ends elsewhere asks for the password over the page, and what was typed goes on', async ({
  browser,
  page,
}) => {
  await signIn(page, 'builder2');
  const address = await sheetOf(page, 'CTR-Q-001');
  await page.goto(address);
  await page.getByLabel('Write to the bench').fill('Half a sentence that must not be lost');
  const other = await (await browser.newContext()).newPage();
  await signIn(other, 'builder2');
  await other.goto('/account');
  await other.getByRole('button', { name: 'Sign out everywhere else' }).click();
  await expect(other.getByRole('button', { name: 'Sign out everywhere else' })).toHaveCount(0);
  await page.getByLabel('Write to the bench').press('Enter');
  const dialog = page.getByRole('dialog');
  await expect(dialog).toBeVisible();
  await dialog.getByLabel('Password').fill('rivetside-demo');
  await dialog.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page.getByRole('log').getByText('Half a sentence that must not be lost')).toHaveCount(1);
  await other.context().close();
});
