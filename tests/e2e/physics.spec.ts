import { expect, type Page, test } from '@playwright/test';
import { demoEmail, headroom, openBench, signIn } from './people';

test.beforeEach(async ({ page }) => {
  await signIn(page, demoEmail('engineer'));
});

const show = (page: Page, values: 'catalogue' | 'in service' | 'worst case') =>
  page.getByRole('radio', { name: values }).check({ force: true });
const worstCases = (page: Page) => page.getByTestId('worst-cases');

test('a rail that holds at catalogue values is short in service, and shows why', async ({ page }) => {
  await openBench(page, 'VDD_AUX');
  await expect(page.getByText('headroom, in service')).toBeVisible();
  const serving = await headroom(page);
  expect(serving).toBeLessThan(-2);
  await show(page, 'catalogue');
  await expect(page.getByText('headroom, catalogue')).toBeVisible();
  await expect.poll(() => headroom(page)).toBeGreaterThan(0);
  await show(page, 'worst case');
  await expect(page.getByText(/headroom, worst case: hot, aged, C low/)).toBeVisible();
  await expect.poll(() => headroom(page)).toBeLessThan(serving);
  await show(page, 'in service');
  await expect.poll(() => headroom(page)).toBe(serving);

  await expect(worstCases(page)).toContainText(/catalogue.*holds/);
  await expect(worstCases(page)).toContainText(/in service.*short/);
  // The row says what is left, and that an estimate stands in for a curve.
  await expect(page.getByRole('button', { name: /^4\.7\sµF X5R 0402, / })).toContainText(
    /4\.7 → .* ≈ estimated/,
  );
  const table = page.getByRole('table', { name: 'values of the bank’s parts in service' });
  await expect(table.getByRole('row', { name: /4\.7\sµF X5R 0402/ })).toContainText('estimated');

  // The list beside agrees with the headline, whatever is being looked at.
  await show(page, 'catalogue');
  await expect(page.getByRole('link', { name: /VDD_AUX/ }).first()).toContainText('short');
});

test('a rail that holds over frequency fails under the worst pattern, and says why', async ({ page }) => {
  await openBench(page, 'VDD_SERDES');
  await expect(page.getByTestId('load-step')).toContainText('worst pattern');
  expect(await headroom(page)).toBeGreaterThanOrEqual(0);
  await expect(page.getByText(/Holds over frequency, yet a pattern of the load exists/)).toBeVisible();
  await expect(page.getByText(/resonance at .*Hz \(Q .*\), which rings on/)).toBeVisible();
  await page.getByRole('link', { name: /^load step/ }).click();
  await expect(page.getByRole('img', { name: /voltage under the worst pattern/ })).toBeVisible();
  await expect(page.getByRole('img', { name: /voltage after the load step: droop/ })).toBeVisible();
  await page.getByRole('radio', { name: 'whole' }).check({ force: true });
  await expect(page.getByRole('img', { name: /voltage after the load step: droop/ })).toBeVisible();
});

test('a rail that holds in every corner is short with one part missing', async ({ page }) => {
  await openBench(page, 'VBUS_72');
  const list = worstCases(page);
  await expect(list).toContainText(/catalogue.*holds/);
  await expect(list).toContainText(/in service.*holds/);
  await expect(list).toContainText(/cold.*holds/);
  await expect(list).toContainText(/one part open.*short/);
  const missing = page.getByRole('table', { name: 'headroom with one part open' });
  await expect(missing.getByRole('row').nth(1)).toContainText(/aluminium.*short by/);
  await expect(missing.getByRole('row').nth(2)).toContainText('holds by');
  await expect(page.getByText('above 60 V DC: energy and shock hazard')).toBeVisible();
  await expect(page.getByTestId('start-up')).toContainText(/inrush.*of\s2\sA/);
});

test('draws boards over tolerance with progress, and says when the answer is old', async ({ page }) => {
  await openBench(page, 'VDD_IO');
  await page.getByRole('button', { name: 'Draw 10000 boards' }).click();
  await expect(page.getByTestId('yield')).toContainText(/% of 10000 boards hold; with 95 % confidence/, {
    timeout: 30_000,
  });
  await expect(page.getByText(/^C of /).first()).toBeVisible();
  const first = await page.getByTestId('yield').textContent();
  await page.getByRole('button', { name: 'Draw again' }).click();
  await expect(page.getByTestId('yield')).toHaveText(first ?? '', { timeout: 30_000 });
  await page
    .getByRole('button', { name: /one .* more/ })
    .first()
    .click();
  await expect(page.getByText('The rail or its bank has changed since. Draw again.')).toBeVisible();
});

test('shows the envelope, the package’s reach and an inrush beyond the limit', async ({ page }) => {
  await openBench(page, 'VDD_DDR');
  await expect(page.getByText('the board does not reach the die')).toBeVisible();
  await page.keyboard.press('e');
  await expect(page.getByText(/shaded: 32 corners/)).toBeVisible();
  await expect(page.locator('.js-plotly-plot .scatterlayer .js-fill').first()).toBeAttached();
  await expect(page.getByTestId('start-up')).toContainText('soft start needed');
  await expect(page.getByText(/more than the limit of 4\sA/)).toBeVisible();
});

test('mounts a line by a recipe of the board, and says where each picohenry comes from', async ({ page }) => {
  await openBench(page, 'VDD_CORE');
  await page.locator('[data-row]').nth(3).click();
  const recipe = page.getByLabel('mount recipe');
  const sum = page.locator('summary', { hasText: 'ESL' });
  await expect(sum).toContainText('mount');
  await recipe.selectOption({ label: 'long traces' });
  await expect(sum).toContainText('traces');
  const long = await sum.textContent();
  await recipe.selectOption({ label: 'via in pad, two pairs' });
  await expect(sum).not.toHaveText(long ?? '');
  await sum.click();
  await expect(page.getByText(/acosh/).first()).toBeVisible();
  await expect(page.getByText(/saved \d\d:\d\d/)).toBeVisible();
  await page.reload();
  await page.locator('[data-row]').nth(3).click();
  await expect(page.getByLabel('mount recipe')).not.toHaveValue('');
});
