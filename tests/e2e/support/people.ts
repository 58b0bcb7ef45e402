import { expect, type Page } from '@playwright/test';
import { linkFor } from './mail';

export const PASSWORD = 'chalk basting paper';

/** A stranger signs up with an invented address, opens the caught letter and confirms. Ends on the empty rail. */
export async function signUp(page: Page, name: string): Promise<string> {
  const email = `${name}-${Date.now()}-${Math.floor(Math.random() * 1e6)}@example.org`;
  await page.goto('/sign-up');
  await page.getByLabel('Your name here').fill(name);
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Make an account' }).click();
  await expect(page.getByText('Look into your mail')).toBeVisible();
  await page.goto(await linkFor(email));
  await page.getByRole('button', { name: 'Confirm my address' }).click();
  await expect(page.getByRole('heading', { name: 'The rail is empty' })).toBeVisible();
  return email;
}

/** From the empty rail to an empty first round. */
export async function hangGarment(page: Page, pattern: string): Promise<void> {
  await page.getByRole('link', { name: 'Hang a new garment' }).click();
  await page.getByLabel('Name', { exact: true }).fill('Ada');
  await page.getByLabel('What do you call it?').fill(pattern);
  await page.getByRole('button', { name: 'Hang it on the rail' }).click();
  await expect(page.getByRole('heading', { name: 'Round 1', level: 1 })).toBeVisible();
  await page.getByRole('button', { name: 'Begin the round' }).click();
  await expect(page).toHaveURL(/\/rounds\/1$/);
}
