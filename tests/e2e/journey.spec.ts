import { expect, type Page, test } from '@playwright/test';
import { MARKERS, type Orientation, phoneJpeg } from '../support/jpegs';
import { filesBelow, tracesIn } from './support/bytes';
import { addPhotos, drawLine, photosInStrip, saySign, surface } from './support/desk';
import { hangGarment, signUp } from './support/people';

const ORIENTATIONS: Orientation[] = [1, 2, 3, 4, 5, 6, 7, 8];
const SIGN = 'Lines pulling into the inner thighs';
const CHANGE = 'Lengthen the back crotch point';

test('a stranger signs up and takes a garment through two rounds, side by side', async ({ page }) => {
  test.setTimeout(240_000);
  await signUp(page, 'ada');
  await hangGarment(page, 'Straight pair');

  await test.step('photos of every orientation arrive upright, and carry nothing of place or camera', async () => {
    const files = await Promise.all(
      ORIENTATIONS.map(async (orientation) => ({
        name: `front-${orientation}.jpg`,
        buffer: await phoneJpeg(orientation),
      })),
    );
    await addPhotos(page, files, 'Back');
    await expect(photosInStrip(page)).toHaveCount(8, { timeout: 60_000 });
    for (const url of await photoUrls(page)) {
      expect(await markersSeen(page, url), url).toEqual(MARKERS.map(() => true));
    }
    for (const { path, bytes } of await filesBelow(process.env.STORE_DIR ?? '')) {
      expect(tracesIn(bytes), path).toEqual([]);
    }
  });

  await test.step('a line stays where it was drawn, over a reload too', async () => {
    await photosInStrip(page).first().click();
    await surface(page).scrollIntoViewIfNeeded();
    await page.getByRole('radio', { name: 'Tight line' }).click();
    const saved = page.waitForResponse(
      (response) =>
        response.url().endsWith('/marks') && response.request().method() === 'POST' && response.ok(),
    );
    await drawLine(page, [0.3, 0.6], [0.45, 0.4]);
    const answer = (await (await saved).json()) as { saved: { points: { x: number; y: number }[] }[] };
    const points = answer.saved[0]?.points ?? [];
    const box = await surface(page).boundingBox();
    expect(Math.abs((points[0]?.x ?? 9) - 0.3) * (box?.width ?? 0)).toBeLessThanOrEqual(1);
    expect(Math.abs((points[0]?.y ?? 9) - 0.6) * (box?.height ?? 0)).toBeLessThanOrEqual(1);
    expect(Math.abs((points.at(-1)?.x ?? 9) - 0.45) * (box?.width ?? 0)).toBeLessThanOrEqual(1);
    expect(Math.abs((points.at(-1)?.y ?? 9) - 0.4) * (box?.height ?? 0)).toBeLessThanOrEqual(1);
    await page.reload();
    await expect(page.getByRole('button', { name: /^Tight line, clear, from/ })).toBeVisible();
    await page.getByRole('button', { name: 'Undo' }).click();
    await expect(page.getByRole('button', { name: /^Tight line, clear, from/ })).toBeHidden();
    await page.getByRole('button', { name: 'Redo' }).click();
    await expect(page.getByRole('button', { name: /^Tight line, clear, from/ })).toBeVisible();
  });

  await test.step('a sign is read, and a small change is taken into the plan', async () => {
    await saySign(page, 'pulls towards the inside of my legs', SIGN, 'Pulling');
    await page.getByRole('button', { name: `Take it into the plan: ${CHANGE}` }).click();
    const plan = page.getByRole('region', { name: 'The plan for the next round' });
    await expect(plan.getByRole('heading', { name: CHANGE })).toBeVisible();
    await expect(plan.getByRole('slider', { name: 'How much' })).toHaveAttribute(
      'aria-valuetext',
      /mm on the piece/,
    );
    const saved = page.waitForResponse(
      (response) => response.url().includes('/api/changes/') && response.ok(),
    );
    await plan.getByRole('button', { name: 'A step more' }).click();
    await saved;
  });

  await test.step('the next round says what was really made', async () => {
    await page.getByRole('link', { name: 'Changed and sewn: begin the next round' }).click();
    await expect(page.getByRole('heading', { name: 'What was really made' })).toBeVisible();
    await page.getByLabel(/^Really made/).fill('7 mm');
    await page.getByRole('button', { name: 'Begin the round' }).click();
    await expect(page).toHaveURL(/\/rounds\/2$/);
    await addPhotos(page, [{ name: 'back.jpg', buffer: await phoneJpeg(6) }], 'Back');
    await expect(photosInStrip(page)).toHaveCount(1, { timeout: 30_000 });
    await saySign(page, 'pulls towards the inside of my legs', SIGN, 'Not there');
  });

  await test.step('two rounds lie side by side, with what was changed and what went', async () => {
    await page.getByRole('link', { name: 'Straight pair' }).click();
    await page.getByRole('link', { name: 'Side by side' }).click();
    await expect(page.getByRole('heading', { name: 'Round 1 and round 2' })).toBeVisible();
    await expect(page.getByText('7 mm on the piece')).toBeVisible();
    await expect(page.getByText('Went')).toBeVisible();
    await expect(page.getByText('pulling to none')).toBeVisible();
    await expect(page.getByRole('figure', { name: /^Round 2/ })).toBeVisible();
  });
});

/** The addresses of all photos of the round, in the middle size. */
async function photoUrls(page: Page): Promise<string[]> {
  return photosInStrip(page)
    .locator('img')
    .evaluateAll((images) => images.map((image) => (image as HTMLImageElement).src));
}

/** Whether each marker is seen, in its colour, at its place on the picture as it is served. */
function markersSeen(page: Page, url: string): Promise<boolean[]> {
  return page.evaluate(
    async ({ url, markers }) => {
      const image = new Image();
      image.src = url;
      await image.decode();
      const canvas = document.createElement('canvas');
      canvas.width = image.naturalWidth;
      canvas.height = image.naturalHeight;
      const context = canvas.getContext('2d');
      context?.drawImage(image, 0, 0);
      return markers.map(({ x, y, rgb }) => {
        const seen =
          context?.getImageData(Math.round(x * canvas.width), Math.round(y * canvas.height), 1, 1).data ?? [];
        return rgb.every((value, i) => Math.abs(value - (seen[i] ?? 999)) < 45);
      });
    },
    { url, markers: MARKERS.map(({ x, y, rgb }) => ({ x, y, rgb: [...rgb] })) },
  );
}
