import { type Browser, expect, type Page, test } from '@playwright/test';
import { phoneJpeg } from '../support/jpegs';
import { addPhotos, drawLine, photosInStrip, saySign, surface } from './support/desk';
import { linkFor } from './support/mail';
import { hangGarment, signUp } from './support/people';

/** Two people in browsers of their own. */
async function twoPeople(browser: Browser): Promise<[Page, Page]> {
  const contexts = await Promise.all([browser.newContext(), browser.newContext()]);
  const [ada, fay] = await Promise.all(contexts.map((context) => context.newPage()));
  return [ada!, fay!];
}

/** Ada has a round with one photo, and has asked Fay to look, mark and propose. Ends with both on the round. */
async function onOneRound(ada: Page, fay: Page): Promise<void> {
  const fayEmail = await signUp(fay, 'fay');
  await signUp(ada, 'ada');
  await hangGarment(ada, 'Wide trousers');
  await addPhotos(ada, [{ name: 'back.jpg', buffer: await phoneJpeg(1) }], 'Back');
  await expect(photosInStrip(ada)).toHaveCount(1);
  const roundUrl = ada.url();
  await ada.goto(roundUrl.replace(/\/rounds\/1$/, '/share'));
  await ada.getByLabel('Their e-mail address').fill(fayEmail);
  await ada.getByRole('button', { name: 'Send the invitation' }).click();
  await expect(ada.getByText('is on its way')).toBeVisible();
  await expect(async () => {
    await fay.goto(await linkFor(fayEmail));
    await expect(fay.getByText('ada opens a journal to you')).toBeVisible({ timeout: 1000 });
  }).toPass();
  await fay.getByRole('button', { name: 'Yes, I will look' }).click();
  await expect(fay).toHaveURL(/\/journals\/[0-9a-f-]+$/);
  await Promise.all([ada.goto(roundUrl), fay.goto(roundUrl)]);
}

/** Draws one tight line and waits until the server has it. */
async function drawTight(page: Page, from: [number, number], to: [number, number]): Promise<void> {
  const saved = page.waitForResponse((one) => one.url().endsWith('/marks') && one.request().method() === 'POST' && one.ok()); // prettier-ignore
  await surface(page).scrollIntoViewIfNeeded();
  await page.getByRole('radio', { name: 'Tight line' }).click();
  await drawLine(page, from, to);
  await saved;
}

test('two people mark one photo, each sees the other, and what is taken back is gone with the page open', async ({
  browser,
}) => {
  test.setTimeout(180_000);
  const [ada, fay] = await twoPeople(browser);
  await onOneRound(ada, fay);
  await drawTight(ada, [0.2, 0.2], [0.4, 0.4]);
  await drawTight(fay, [0.6, 0.2], [0.8, 0.4]);
  await expect(ada.getByRole('img', { name: /^fay: / })).toHaveCount(1);
  await expect(fay.getByRole('img', { name: /^ada: / })).toHaveCount(1);

  await fay.getByLabel('Say something about this round').fill('Does the left leg twist?');
  await fay.getByRole('button', { name: 'Say it' }).click();
  await expect(ada.getByText('Does the left leg twist?')).toBeVisible();

  const picture = await fay.locator('img[src*="/api/photos/"]').first().getAttribute('src');
  const roundApi = await fay.evaluate(() => performance.getEntriesByType('resource').map(({ name }) => name).find((name) => name.endsWith('/conversation'))); // prettier-ignore
  const statuses = () =>
    Promise.all(
      [fay.url(), roundApi ?? '', ...['1600', '640', '160'].map((size) => new URL((picture ?? '').replace(/\/\d+\?/, `/${size}?`), fay.url()).href)].map(
        async (url) => (await fay.context().request.get(url, { maxRedirects: 0 })).status(),
      ),
    ); // prettier-ignore
  expect(await statuses()).toEqual([200, 200, 200, 200, 200]);
  await ada.goto(ada.url().replace(/\/rounds\/1$/, '/share'));
  await ada.getByRole('button', { name: /^Take it back from/ }).click();
  await expect(ada.getByText('They see nothing of it any more')).toBeVisible();
  expect(await statuses()).toEqual([404, 404, 404, 404, 404]);
});

test('a proposed plan is taken, and the ledger says whose it was', async ({ browser }) => {
  test.setTimeout(180_000);
  const [ada, fay] = await twoPeople(browser);
  await onOneRound(ada, fay);
  await saySign(ada, 'pulls towards the inside of my legs', 'Lines pulling into the inner thighs', 'Pulling');
  await fay.reload();
  await fay
    .getByRole('button', { name: /^Take it into the plan: / })
    .first()
    .click();
  await fay.getByLabel('Why').fill('The front fork first.');
  await fay.getByRole('button', { name: 'Propose it' }).click();
  await expect(ada.getByText('fay proposes')).toBeVisible();
  await ada.getByRole('button', { name: 'Take it into the plan', exact: true }).click();
  await expect(ada.getByText('(taken)')).toBeVisible();
  await ada.goto(ada.url().replace(/\/rounds\/1$/, ''));
  await expect(ada.getByText('proposed by fay')).toBeVisible();
});
