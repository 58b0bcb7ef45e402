import { randomUUID } from 'node:crypto';
import { expect, test, type Page } from '@playwright/test';
import { linkFor } from './support/mail';

/** The account forms as they stand before any JavaScript has loaded: here it never does. */
test.use({ javaScriptEnabled: false });

const PASSWORD = 'three green words';
const NEW_PASSWORD = 'another set of words';
const freshAddress = () => `ann-${randomUUID().slice(0, 8)}@example.org`;

async function signUp(page: Page, email: string) {
  await page.goto('/sign-up');
  await page.getByLabel('Your name here').fill('Ann');
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Make an account' }).click();
  await expect(page.getByRole('status')).toContainText('a letter with a link is on its way');
}

async function signIn(page: Page, email: string, password: string) {
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

test('an account is made, confirmed, left, entered again and given a new password, all without JavaScript', async ({
  page,
}) => {
  const email = freshAddress();
  await signUp(page, email);
  await page.goto(await linkFor(email));
  await page.getByRole('button', { name: 'Confirm my address' }).click();
  await expect(page).toHaveURL(/\/journals$/);

  await page.goto('/settings');
  await expect(page.getByText(`as ${email}`)).toBeVisible();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await page.goto('/wearers?from=mail');
  await expect(page).toHaveURL(/\/sign-in\?next=%2Fwearers%3Ffrom%3Dmail$/);
  await signIn(page, email, 'not the password');
  await expect(page.getByText('do not go together')).toBeVisible();
  await expect(page.getByLabel('E-mail address')).toHaveValue(email);
  await expect(page.getByLabel('Password')).toHaveValue('');
  await signIn(page, email, PASSWORD);
  await expect(page).toHaveURL(/\/wearers\?from=mail$/);

  await page.goto('/forgot');
  await page.getByLabel('E-mail address').fill(email);
  await page.getByRole('button', { name: 'Send me a link' }).click();
  await expect(page.getByRole('status')).toContainText('If there is an account');
  await expect.poll(() => linkFor(email)).toContain('/reset?');
  await page.goto(await linkFor(email));
  await page.getByLabel('New password').fill(NEW_PASSWORD);
  await page.getByRole('button', { name: 'Set the new password' }).click();
  await expect(page).toHaveURL(/\/journals$/);
});

test('a scanner that follows the link uses nothing up, and another browser is asked for the password', async ({
  page,
  browser,
}) => {
  const email = freshAddress();
  await signUp(page, email);
  const link = await linkFor(email);
  for (let i = 0; i < 3; i += 1) expect((await fetch(link)).status).toBe(200);
  const elsewhere = await (await browser.newContext({ javaScriptEnabled: false })).newPage();
  await elsewhere.goto(link);
  await elsewhere.getByRole('button', { name: 'Confirm my address' }).click();
  await expect(elsewhere).toHaveURL(/\/sign-in\?confirmed=1$/);
  await signIn(elsewhere, email, PASSWORD);
  await expect(elsewhere).toHaveURL(/\/journals$/);
  await elsewhere.context().close();
});

test('faults are named by field and what was typed stays, but for the password', async ({ page }) => {
  await page.goto('/sign-up');
  await page.getByLabel('Your name here').fill('Ann');
  await page.getByLabel('E-mail address').fill('not an address');
  await page.getByLabel('Password').fill('short');
  await page.getByRole('button', { name: 'Make an account' }).click();
  await expect(page.getByText('Write the address like name@example.org.')).toBeVisible();
  await expect(page.getByText('At least 10 characters; three or four words')).toBeVisible();
  await expect(page.getByLabel('Your name here')).toHaveValue('Ann');
  await expect(page.getByLabel('Password')).toHaveValue('');
});
