import { mkdirSync } from 'node:fs';
import { expect, type Page, test } from '@playwright/test';
import postgres from 'postgres';
import accounts from '../../db/seed/accounts.json' with { type: 'json' };
import { signUp } from '../e2e/support/people';
import { addPhotos, photosInStrip } from '../e2e/support/desk';
import { phoneJpeg } from '../support/jpegs';
import { layoutFaults, shiftOf, watchShifts } from './measure';
import { fillRail } from './wardrobe';

const FOLDER = 'data/shots';
const THEMES = ['light', 'dark'] as const;
const SHIFT_MAX = 0.02;

/** Loads a page in both themes, keeps a picture of each, and fails on what lies badly. */
async function look(page: Page, path: string, name: string): Promise<void> {
  const folder = `${FOLDER}/${test.info().project.name}`;
  mkdirSync(folder, { recursive: true });
  for (const theme of THEMES) {
    await page.emulateMedia({ colorScheme: theme });
    await page.goto(path);
    await page.waitForLoadState('networkidle');
    await page.screenshot({ path: `${folder}/${name}-${theme}.png`, fullPage: true });
    expect.soft(await layoutFaults(page), `${name} ${theme}`).toEqual([]);
    expect.soft(await shiftOf(page), `${name} ${theme} moves`).toBeLessThanOrEqual(SHIFT_MAX);
  }
}

async function lookAtAll(page: Page, paths: Record<string, string>): Promise<void> {
  for (const [name, path] of Object.entries(paths)) await look(page, path, name);
}

async function signIn(page: Page): Promise<void> {
  const [wren] = accounts;
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill(wren?.email ?? '');
  await page.getByLabel('Password').fill(wren?.password ?? '');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'The rail' })).toBeVisible();
}

test.beforeEach(({ page }) => watchShifts(page));

test('pages for everyone', async ({ page }) => {
  await lookAtAll(page, {
    landing: '/', 'sign-in': '/sign-in', 'sign-up': '/sign-up', forgot: '/forgot', verify: '/verify', reset: '/reset', nothing: '/nothing-here', parts: '/dev/parts',
  }); // prettier-ignore
});

test('pages with the demo on them', async ({ page }) => {
  await signIn(page);
  const href = await page
    .getByRole('link', { name: /Linen pair/ })
    .first()
    .getAttribute('href');
  const journal = href ?? '';
  await lookAtAll(page, {
    rail: '/journals', 'journal-new': '/journals/new', wearers: '/wearers', 'wearer-new': '/wearers/new', patterns: '/patterns', 'pattern-new': '/patterns/new', settings: '/settings',
    journal, 'round-1': `${journal}/rounds/1`, 'round-2': `${journal}/rounds/2`, 'round-new': `${journal}/rounds/new`, compare: `${journal}/compare`,
  }); // prettier-ignore
  for (const [name, list] of [
    ['wearer', '/wearers'],
    ['pattern', '/patterns'],
  ] as const) {
    await page.goto(list);
    const one = await page.locator(`a[href^="${list}/0"]`).first().getAttribute('href');
    await look(page, one ?? list, name);
  }
});

test('pages with nothing on them', async ({ page }) => {
  await signUp(page, 'nora');
  await lookAtAll(page, {
    'rail-empty': '/journals',
    'wearers-empty': '/wearers',
    'patterns-empty': '/patterns',
  });
});

test('pages with much on them', async ({ page }) => {
  const sql = postgres(process.env.ADMIN_DATABASE_URL ?? '', { max: 1 });
  const { journalId } = await fillRail(sql, await signUp(page, 'wilhelmina'));
  await sql.end();
  await page.goto(`/journals/${journalId}/rounds/12`);
  const picture = await phoneJpeg(1);
  const many = Array.from({ length: 60 }, (_, i) => ({ name: `${i}.jpg`, buffer: picture }));
  await addPhotos(page, many);
  await expect(photosInStrip(page)).toHaveCount(60, { timeout: 240_000 });
  await lookAtAll(page, {
    'rail-much': '/journals', 'journal-much': `/journals/${journalId}`, 'round-much': `/journals/${journalId}/rounds/12`, 'compare-much': `/journals/${journalId}/compare`,
  }); // prettier-ignore
});
