import { expect, type Page, test } from '@playwright/test';
import { demoEmail, signIn } from './people';

async function openPart(page: Page, number: string) {
  await page.goto(`/parts?q=${number}`);
  await page.getByRole('link', { name: number }).first().click();
  await expect(page.getByRole('heading', { name: number })).toBeVisible();
}

test.beforeEach(async ({ page }) => {
  await signIn(page, demoEmail('engineer'));
});

test('drags bias and temperature with the keys and reads each factor of the value in service', async ({
  page,
}) => {
  await openPart(page, 'AB-C0402-X6S-2U2-6V3');
  const bias = page.getByRole('slider', { name: 'DC bias' });
  const chart = page.getByRole('img', { name: /Capacitance of .* over DC bias/ });
  await bias.press('Home');
  await expect(chart).toHaveAttribute('aria-label', /at 0\sV/);
  const whole = await bias.getAttribute('aria-valuetext');
  await bias.press('End');
  await expect(chart).toHaveAttribute('aria-label', /at 6\.3\sV/);
  expect(await bias.getAttribute('aria-valuetext')).not.toBe(whole);
  await page.getByRole('slider', { name: 'temperature' }).press('Home');
  const chain = page.getByText(/^2\.2\sµF × bias .* × cold .* = /);
  await expect(chain).toBeAttached();
  // The factors as they are written make the value as it is written.
  const text = (await chain.textContent()) ?? '';
  const factors = [...text.matchAll(/× \S+ ([\d.]+)/g)].map((m) => Number(m[1]));
  const [, value] = /= ([\d.]+)\snF/.exec(text) ?? [];
  expect(factors).toHaveLength(4);
  expect((2200 * factors.reduce((a, b) => a * b, 1)).toPrecision(3)).toBe(Number(value).toPrecision(3));
  await expect(page.getByText(/bias curve/).first()).toBeVisible();
  await page.getByRole('button', { name: 'as in the catalogue' }).click();
  await expect(chart).toHaveAttribute('aria-label', /at 0\sV/);
});

test('marks what is estimated, and refuses a bias above the rating in words', async ({ page }) => {
  await openPart(page, 'AB-C0402-X5R-4U7-6V3');
  await expect(page.getByText(/≈ estimated/).first()).toBeVisible();
  const typed = page.getByRole('textbox', { name: 'DC bias in volts' });
  await typed.fill('9');
  await typed.press('Enter');
  await expect(page.getByText(/9\sV is above its rating of 6\.3\sV/)).toBeVisible();
  await typed.fill('3.3');
  await typed.press('Enter');
  await expect(page.getByText(/above its rating/)).toBeHidden();
});
