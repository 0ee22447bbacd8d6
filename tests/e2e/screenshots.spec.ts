import { mkdirSync } from 'node:fs';
import { type Page, test } from '@playwright/test';
import { demoEmail, openBench, signIn } from './people';

/** The README's pictures from the running product: `MILLPOND_SCREENSHOTS=1` keeps them, else they only have to come about. */
const folder = process.env.MILLPOND_SCREENSHOTS === '1' ? 'tests/screenshots' : 'test-results/screenshots';
mkdirSync(folder, { recursive: true });

async function take(page: Page, name: string): Promise<void> {
  await page.waitForTimeout(700);
  await page.screenshot({ path: `${folder}/${name}.png` });
}

test('pictures by day', async ({ page }) => {
  await page.emulateMedia({ colorScheme: 'light' });
  await signIn(page, demoEmail('engineer'));
  await page.getByRole('link', { name: 'Tide gateway' }).first().click();
  await page.getByRole('table', { name: 'rails of this board' }).waitFor();
  await take(page, 'board-light');
  await page.getByRole('link', { name: 'VDD_SERDES' }).first().click();
  await page.getByTestId('headroom').waitFor();
  await take(page, 'bench-light');
  await page.getByRole('img', { name: /voltage under the worst pattern/ }).scrollIntoViewIfNeeded();
  await take(page, 'load-step-light');
  await page.getByRole('link', { name: 'Stack-up' }).first().click();
  await page.getByRole('heading', { name: 'Stack-up and mount recipes' }).waitFor();
  await take(page, 'stack-up-light');
  await page.goto('/parts?q=AB-C0402-X6S-2U2-6V3');
  await page.getByRole('link', { name: 'AB-C0402-X6S-2U2-6V3' }).first().click();
  await page.getByRole('img', { name: /over DC bias/ }).waitFor();
  await take(page, 'part-light');
  await page.goto('/');
  await page.getByRole('link', { name: 'Tide gateway' }).first().click();
  await page.getByRole('link', { name: 'Placement' }).first().click();
  await page.getByRole('link', { name: /CSV/ }).first().waitFor();
  await take(page, 'placement-light');
});

test('pictures at night', async ({ page }) => {
  await page.emulateMedia({ colorScheme: 'dark' });
  await signIn(page, demoEmail('engineer'));
  await openBench(page, 'VDD_SERDES');
  await page.getByRole('button', { name: 'Search the smallest mix' }).click();
  await page.getByRole('button', { name: 'Preview the mix' }).click({ timeout: 30_000 });
  await page.evaluate(() => window.scrollTo(0, 0));
  await page.waitForTimeout(1500);
  await take(page, 'preview-dark');
});
