import { expect, test } from '@playwright/test';
import { phoneJpeg } from '../support/jpegs';
import { addPhotos, photosInStrip } from './support/desk';
import { hangGarment, signUp } from './support/people';

test('with the network cut a round is still read, and is saved when it is back', async ({
  page,
  context,
}) => {
  test.setTimeout(150_000);
  await signUp(page, 'kit');
  await hangGarment(page, 'Offline pair');
  await expect(page.getByRole('searchbox', { name: 'Find it by words' })).toBeVisible();
  await expect(page.getByRole('region', { name: 'The reading' }).getByRole('status')).toBeHidden();

  await context.setOffline(true);
  await page.getByLabel('Find it by words').fill('gapes at the back');
  await page
    .getByRole('group', { name: 'The waist stands off behind', exact: true })
    .getByText('Pulling', { exact: true })
    .click();
  await expect(page.getByRole('status').filter({ hasText: 'On this phone only: 1 waiting' })).toBeVisible();
  await expect(
    page.getByRole('region', { name: 'The reading' }).getByRole('heading', { name: 'Deepen the back darts' }),
  ).toBeVisible();
  await addPhotos(page, [{ name: 'waiting.jpg', buffer: await phoneJpeg(1) }]);
  await expect(page.getByRole('list', { name: 'Photos on their way' })).toContainText(
    'waiting on this phone',
  );

  const saved = page.waitForResponse((response) => response.url().endsWith('/evidence') && response.ok());
  await context.setOffline(false);
  await saved;
  await expect(photosInStrip(page)).toHaveCount(1, { timeout: 30_000 });
  await page.reload();
  await page.getByLabel('Find it by words').fill('gapes at the back');
  await expect(
    page
      .getByRole('group', { name: 'The waist stands off behind', exact: true })
      .getByRole('radio', { name: 'Pulling' }),
  ).toBeChecked();
});
