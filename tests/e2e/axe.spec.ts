import AxeBuilder from '@axe-core/playwright';
import { expect, type Page, test } from '@playwright/test';
import accounts from '../../db/seed/accounts.json' with { type: 'json' };

const SIGNED_OUT = [
  '/',
  '/sign-in',
  '/sign-up',
  '/forgot',
  '/verify',
  '/reset',
  '/invitation',
  '/new-address',
  '/dev/mail',
  '/dev/parts',
  '/nothing-here',
];
const SIGNED_IN = [
  '/journals',
  '/journals/new',
  '/wearers',
  '/wearers/new',
  '/patterns',
  '/patterns/new',
  '/settings',
  '/settings/password',
  '/settings/address',
  '/settings/sessions',
  '/settings/leave',
  '/fittings',
  '/bin',
];

async function signIn(page: Page): Promise<void> {
  const [wren] = accounts;
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill(wren?.email ?? '');
  await page.getByLabel('Password').fill(wren?.password ?? '');
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page.getByRole('heading', { name: 'The rail' })).toBeVisible();
}

async function faultsOf(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations.map(
    ({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html.slice(0, 120)).join(' | ')}`,
  );
}

async function expectNoSideways(page: Page, path: string): Promise<void> {
  const over = await page.evaluate(
    () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
  );
  expect(over, `${path} is wider than the screen`).toBeLessThanOrEqual(0);
}

/** The address of the first thing that a list shows. */
async function firstOf(page: Page, list: string): Promise<string> {
  await page.goto(`/${list}`);
  const links = await page
    .locator(`a[href^="/${list}/0"]`)
    .evaluateAll((all) => all.map((link) => link.getAttribute('href') ?? ''));
  return links.find((href) => new RegExp(`^/${list}/[^/]+$`).test(href)) ?? '';
}

for (const colorScheme of ['light', 'dark'] as const) {
  test(`axe finds nothing on pages for everyone, ${colorScheme}`, async ({ page }) => {
    await page.emulateMedia({ colorScheme });
    for (const path of SIGNED_OUT) {
      await page.goto(path);
      expect(await faultsOf(page), path).toEqual([]);
      await expectNoSideways(page, path);
    }
  });

  test(`axe finds nothing on signed-in pages, ${colorScheme}`, async ({ page }) => {
    test.setTimeout(300_000);
    await page.emulateMedia({ colorScheme });
    await signIn(page);
    const journal = await firstOf(page, 'journals');
    const wearer = await firstOf(page, 'wearers');
    const pattern = await firstOf(page, 'patterns');
    const deep = [
      journal,
      `${journal}/rounds/1`,
      `${journal}/rounds/2`,
      `${journal}/rounds/new`,
      `${journal}/compare`,
      `${journal}/record`,
      `${journal}/cut`,
      `${journal}/cut/sheet`,
      wearer,
      `${wearer}/measure`,
      pattern,
      `${pattern}/chart`,
    ];
    for (const path of [...SIGNED_IN, ...deep]) {
      await page.goto(path);
      await page.waitForLoadState('networkidle');
      expect(await faultsOf(page), path).toEqual([]);
      await expectNoSideways(page, path);
    }
  });
}
