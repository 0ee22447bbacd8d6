import { expect, type Locator, type Page } from '@playwright/test';

export const DEMO_PASSWORD = 'still water at dusk';
export const demoEmail = (role: string) => `${role}@alderbrook.example`;

export async function signIn(page: Page, email: string, password = DEMO_PASSWORD): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('e-mail').fill(email);
  await page.getByLabel('password').fill(password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(page).not.toHaveURL(/sign-in/);
}

/** Opens a rail of the demo board on the bench and waits for its first result. */
export async function openBench(page: Page, rail: string): Promise<void> {
  await page.getByRole('link', { name: 'Tide gateway' }).first().click();
  await page.getByRole('link', { name: rail }).first().click();
  await expect(page.getByTestId('headroom')).toBeVisible();
}

/** The headroom as a number of dB. */
export async function headroom(page: Page): Promise<number> {
  const text = await textOf(page.getByTestId('headroom'));
  return Number(text.replace('\u2212', '-').replace(/[^-+.\d]/g, ''));
}

/** The text of an element, blanks of all kinds as blanks. */
export async function textOf(locator: Locator): Promise<string> {
  return ((await locator.textContent()) ?? '').replace(/\s+/g, ' ').trim();
}
