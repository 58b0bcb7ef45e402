import { expect, type Page, test } from '@playwright/test';
import { signUp } from './support/people';

const CHART = [
  'Size\tWaist\tHip\tThigh\tBack rise',
  '10\t72\t98\t56\t34',
  '12\t76\t102\t58\t34.5',
  '14\t80\t106\t60\t35',
];

/** Types a length on the keypad, as one does with the tape in the other hand. */
async function key(page: Page, digits: string): Promise<void> {
  const keys = page.getByRole('group', { name: 'Keys' });
  for (const digit of digits)
    await keys.getByRole('button', { name: digit === '.' ? 'decimal point' : digit, exact: true }).click();
}

async function measure(page: Page, name: string, digits: string): Promise<void> {
  await page.getByRole('button', { name: `${name} not taken`, exact: true }).click();
  await expect(page.getByRole('heading', { name, exact: true })).toBeVisible();
  await key(page, digits);
}

const saved = (page: Page, end: RegExp) =>
  page.waitForResponse((response) => end.test(response.url()) && response.request().method() !== 'GET' && response.ok()); // prettier-ignore

test('measured, chart pasted, size chosen, flat pattern checked: the first round begins with a reading', async ({
  page,
}) => {
  test.setTimeout(240_000);
  await signUp(page, 'cleo');
  await page.getByRole('link', { name: 'Hang a new garment' }).click();
  await page.getByLabel('Name', { exact: true }).fill('Cleo');
  await page.getByLabel('What do you call it?').fill('Straight pair');
  await page.getByRole('button', { name: 'Hang it on the rail' }).click();
  await page.getByRole('link', { name: 'Before the first cut' }).click();
  await expect(page.getByRole('heading', { name: 'The pattern has no sizes yet' })).toBeVisible();
  const cutPage = page.url();

  await test.step('a wearer is measured with one thumb; an inch in a centimetre field is asked about once', async () => {
    await page.getByRole('link', { name: 'Wearers' }).click();
    await page.getByRole('link', { name: 'Cleo' }).click();
    await page.getByRole('link', { name: 'Take the measures' }).click();
    await page.getByText('Over the navel', { exact: true }).click();
    await key(page, '78');
    await measure(page, 'Hip', '41');
    await page.getByRole('button', { name: 'Yes, inches' }).click();
    await expect(page.getByRole('button', { name: 'Hip 41 in', exact: true })).toBeVisible();
    await expect(page.getByRole('button', { name: 'Yes, inches' })).toBeHidden();
    await measure(page, 'Thigh', '60');
    await page.getByRole('button', { name: 'Take it again' }).click();
    await key(page, '60.4');
    await measure(page, 'Crotch length, back', '37');
    await page.getByRole('button', { name: 'Save this sitting' }).click();
    await expect(page.getByRole('region', { name: 'Measures by day' })).toContainText('waist at the navel');
    await expect(page.getByRole('row', { name: /^Hip/ })).toContainText('104.1 cm');
  });

  await test.step('a pasted chart is shown before it is kept, its faulty cell named, nothing lost by a reload', async () => {
    await page.getByRole('link', { name: 'Patterns' }).click();
    await page.getByRole('link', { name: 'Straight pair' }).click();
    await page.getByRole('link', { name: 'Size chart and measures' }).click();
    const field = page.getByLabel('Bodies the sizes are for: type or paste');
    await field.fill(CHART.join('\n').replace('102', '=B2+4'));
    await expect(page.getByText('hip, size 12 (row 3, column 3)')).toBeVisible();
    await expect(page.getByRole('button', { name: 'Keep: bodies the sizes are for' })).toBeDisabled();
    await page.reload();
    await expect(field).toHaveValue(/=B2\+4/);
    await field.fill(CHART.join('\n'));
    const kept = saved(page, /\/chart$/);
    await page.getByRole('button', { name: 'Keep: bodies the sizes are for' }).click();
    await kept;
    await page.reload();
    await expect(page.getByRole('region', { name: 'Bodies the sizes are for, as read' })).toContainText('102 cm'); // prettier-ignore
  });

  await test.step('the size is proposed with its reason, the body laid beside the pattern with its error', async () => {
    await page.goto(cutPage);
    await expect(page.getByText('Size 14 (proposed)')).toBeVisible();
    await expect(page.getByText(/^By your hip, 14/)).toBeVisible();
    await expect(page.getByRole('combobox', { name: 'Size at the waist' })).toHaveValue('14');
    const waist = saved(page, /\/cut$/);
    await page.getByText('Over the navel', { exact: true }).click();
    await waist;
    const back = page.getByRole('listitem').filter({ hasText: 'Crotch length, back' });
    await expect(back).toContainText('+20 mm');
    await expect(back).toContainText('give or take');
    const left = saved(page, /\/cut$/);
    await page.getByLabel('Take thigh into the reading').click();
    await left;
  });

  await test.step('the cutting sheet is ticked off', async () => {
    await page.getByRole('link', { name: 'Cutting and marking sheet' }).click();
    await expect(page.getByText('Cut size 14.')).toBeVisible();
    const ticked = saved(page, /\/cut$/);
    await page.getByLabel(/^25 mm \(1 in\) at side seams/).click();
    await ticked;
    await page.reload();
    await expect(page.getByLabel(/^25 mm \(1 in\) at side seams/)).toBeChecked();
    await page.goto(cutPage);
  });

  await test.step('the first round reads what was measured, and lets it be taken out', async () => {
    await page.getByRole('link', { name: 'Begin round 1' }).click();
    await expect(page.getByLabel('Size cut')).toHaveValue('14');
    await page.getByRole('button', { name: 'Begin the round' }).click();
    await expect(page).toHaveURL(/\/rounds\/1$/);
    const measured = page.getByRole('region', { name: 'Measured before the first cut' });
    await expect(measured).toContainText('Crotch length, back');
    await expect(measured).not.toContainText('Thigh');
    await measured.getByRole('button', { name: 'Take Waist out of the reading' }).click();
    await expect(measured).not.toContainText('Waist');
    await expect(measured).toContainText('Hip');
  });
});
