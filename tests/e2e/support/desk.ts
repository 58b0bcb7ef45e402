import type { Locator, Page } from '@playwright/test';

/** The picture on the table, as what can be drawn on. */
export const surface = (page: Page): Locator => page.getByRole('application');

export async function addPhotos(
  page: Page,
  files: { name: string; buffer: Buffer }[],
  view = 'Front',
): Promise<void> {
  const fold = page.locator('summary', { hasText: 'Add photos' });
  if (await fold.isVisible()) await fold.click();
  await page.getByRole('group', { name: 'What it shows' }).first().getByText(view, { exact: true }).click();
  await page
    .getByLabel('Add photos', { exact: true })
    .setInputFiles(files.map((file) => ({ ...file, mimeType: 'image/jpeg' })));
}

export const photosInStrip = (page: Page): Locator =>
  page.getByRole('list', { name: 'Photos of this round' }).getByRole('button');

/** Draws a straight stroke between two places, given as fractions of the photo. Gives back where it was drawn. */
export async function drawLine(page: Page, from: [number, number], to: [number, number]): Promise<void> {
  const box = await surface(page).boundingBox();
  if (!box) throw new Error('there is no photo to draw on');
  const at = ([x, y]: [number, number]) => [box.x + x * box.width, box.y + y * box.height] as const;
  await page.mouse.move(...at(from));
  await page.mouse.down();
  await page.mouse.move(...at([(from[0] + to[0]) / 2, (from[1] + to[1]) / 2]), { steps: 4 });
  await page.mouse.move(...at(to), { steps: 4 });
  await page.mouse.up();
}

/** Says of a sign, found by its words, how strong it is; waits until the server has it. */
export async function saySign(page: Page, words: string, sign: string, strength: string): Promise<void> {
  await page.getByLabel('Find it by words').fill(words);
  const saved = page.waitForResponse((response) => response.url().endsWith('/evidence') && response.ok());
  await page
    .getByRole('group', { name: sign, exact: true })
    .first()
    .getByText(strength, { exact: true })
    .click();
  await saved;
  await page.getByLabel('Find it by words').fill('');
}
