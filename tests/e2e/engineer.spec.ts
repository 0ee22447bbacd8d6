import { expect, test } from '@playwright/test';
import { demoEmail, headroom, openBench, signIn, textOf } from './people';

test.beforeEach(async ({ page }) => {
  await signIn(page, demoEmail('engineer'));
});

test('sees which rails of the demo board hold and which are short', async ({ page }) => {
  await page.getByRole('link', { name: 'Tide gateway' }).first().click();
  const table = page.getByRole('table', { name: 'rails of this board' });
  await expect(table.getByRole('row')).toHaveCount(7);
  await expect(table.getByRole('row', { name: /VDD_CORE/ })).toContainText('short by');
  await expect(table.getByRole('row', { name: /VDD_IO/ })).toContainText('holds by');
});

test('makes a board and a rail, works on the bench, and finds it all saved', async ({ page }) => {
  await page.goto('/boards/new');
  await page.getByLabel('name').fill('Weir controller');
  await page.getByRole('button', { name: /board/i }).last().click();
  await expect(page.getByText('This board has no rails yet')).toBeVisible();
  await page.getByRole('link', { name: 'Add the first rail' }).click();
  await page.getByLabel('name').fill('VDD_LOGIC');
  await page.getByLabel('voltage').fill('0.9');
  await page.getByLabel('ripple allowed').fill('3');
  await page.getByLabel('load step', { exact: true }).fill('9');
  await expect(page.getByText('3 % of 0.9 V at 9 A → 3.00 mΩ')).toBeVisible();
  await page.getByLabel('given as').nth(1).selectOption('derived');
  await page.getByLabel('rise time of the step').fill('35n');
  await expect(page.getByText(/band 50\skHz to 10\.0\sMHz/)).toBeVisible();

  // A fault is said at its field, and what was typed stays.
  await page.getByLabel('spacing of the planes').fill('abc');
  await page.getByRole('button', { name: 'Make the rail' }).click();
  await expect(page.getByText('“abc” is not a length')).toBeVisible();
  await expect(page.getByLabel('name')).toHaveValue('VDD_LOGIC');
  await page.getByLabel('spacing of the planes').fill('0.1');
  await page.getByRole('button', { name: 'Make the rail' }).click();
  await expect(page.getByText('The bank is empty')).toBeVisible();
  const empty = await headroom(page);

  await page.getByRole('button', { name: '+ add a part' }).click();
  await page.getByLabel('find').fill('polymer 470');
  await page.getByRole('button', { name: /^add / }).first().click();
  await expect(page.getByTestId('parts-kinds')).toHaveText('1 · 1');
  const row = page.getByRole('button', { name: /polymer.*, 1$/ });
  await row.focus();
  for (let i = 0; i < 4; i++) await page.keyboard.press('ArrowRight');
  await expect(page.getByTestId('parts-kinds')).toHaveText('5 · 1');
  expect(await headroom(page)).toBeGreaterThan(empty);
  await page.getByRole('button', { name: /one .* more/ }).click();
  await expect(page.getByTestId('parts-kinds')).toHaveText('6 · 1');
  await page.keyboard.press('u');
  await expect(page.getByTestId('parts-kinds')).not.toHaveText('6 · 1');
  await page.getByRole('button', { name: 'redo' }).click();
  await expect(page.getByTestId('parts-kinds')).toHaveText('6 · 1');
  await expect(page.getByText(/saved \d\d:\d\d/)).toBeVisible();
  await page.reload();
  await expect(page.getByTestId('parts-kinds')).toHaveText('6 · 1');
});

test('lines the share strips up with the chart to the pixel, at every width', async ({ page }) => {
  await openBench(page, 'VDD_CORE');
  for (const width of [1280, 1440, 1700]) {
    await page.setViewportSize({ width, height: 920 });
    await expect(page.locator('.js-plotly-plot .bglayer')).toBeAttached();
    await page.waitForTimeout(300);
    const plot = await page.locator('.js-plotly-plot .nsewdrag').boundingBox();
    const strip = await page.locator('section[aria-label="bank"] svg[role="img"]').first().boundingBox();
    expect(plot && strip && Math.abs(plot.x - strip.x)).toBeLessThanOrEqual(0.5);
    expect(plot && strip && Math.abs(plot.width - strip.width)).toBeLessThanOrEqual(1);
  }
});

test('searches once, sees mixes and the proof, adopts the proven smallest mix', async ({ page }) => {
  await openBench(page, 'VDD_CORE');
  expect(await headroom(page)).toBeLessThan(0);
  await page.keyboard.press('f');
  // Proven in a fraction of a second, the best so far may be the smallest mix before one sees it.
  await expect(page.getByRole('term').filter({ hasText: /best so far|smallest mix/ })).toBeVisible({
    timeout: 5_000,
  });
  await expect(page.getByText(/fewest possible, proven/)).toBeVisible({ timeout: 120_000 });
  const weight = Number((await textOf(page.getByText(/^\d+\sparts$/).first())).split(' ')[0]);
  await page.getByRole('button', { name: 'Preview the mix' }).click();
  await expect(page.getByText('Preview of the mix found')).toBeVisible();
  await page.getByRole('button', { name: 'Adopt' }).click();
  await expect(page.getByTestId('parts-kinds')).toHaveText(new RegExp(`^${weight} · `));
  expect(await headroom(page)).toBeGreaterThanOrEqual(0);
  await expect(page.getByText(/saved \d\d:\d\d/)).toBeVisible();
});

test('stops a search at any time and keeps what was found', async ({ page }) => {
  await openBench(page, 'VDD_SERDES');
  await page.getByLabel('the mix with').selectOption('cost');
  await page.keyboard.press('Tab');
  await page.getByRole('button', { name: 'Search the smallest mix' }).click();
  const stop = page.getByRole('button', { name: 'Stop' });
  const proven = page.getByText(/possible, proven/);
  await expect(stop.or(proven)).toBeVisible();
  if (await stop.isVisible()) await stop.click({ timeout: 2000 }).catch(() => undefined);
  await expect(page.getByRole('button', { name: 'Preview the mix' })).toBeVisible();
  await page.getByRole('button', { name: 'Dismiss' }).click();
  await expect(page.getByRole('button', { name: 'Search the smallest mix' })).toBeVisible();
});

test('cuts a revision with a note', async ({ page }) => {
  await page.getByRole('link', { name: 'Tide gateway' }).first().click();
  await page.getByRole('link', { name: 'Revisions' }).first().click();
  await page.getByLabel('note').fill('Core bank from the mix search');
  await page.getByRole('button', { name: /cut/i }).click();
  await expect(page.getByRole('heading', { name: 'Tide gateway, revision C' })).toBeVisible();
  await expect(page.getByText('Core bank from the mix search').first()).toBeVisible();
  await page.getByRole('link', { name: 'Revisions' }).last().click();
  await expect(page.getByRole('link', { name: 'revision C' })).toBeVisible();
});

test('zooms into the chart and back, strips and labels along with it', async ({ page }) => {
  await openBench(page, 'VDD_IO');
  const plot = page.locator('.js-plotly-plot .nsewdrag');
  await expect(plot).toBeAttached();
  const box = await plot.boundingBox();
  if (!box) throw new Error('the plot has no place');
  const label = page.getByText('100 MHz', { exact: true });
  await expect(label).toBeVisible();
  await page.mouse.move(box.x + 0.4 * box.width, box.y + 100);
  await page.mouse.down();
  await page.mouse.move(box.x + 0.7 * box.width, box.y + 105, { steps: 6 });
  await page.mouse.up();
  await expect(label).toBeHidden();
  await expect(page.getByText('1 MHz', { exact: true })).toBeVisible();
  await page.waitForTimeout(400);
  await page.mouse.dblclick(box.x + 0.5 * box.width, box.y + 100);
  await expect(label).toBeVisible();
  const range = await page.evaluate(
    () =>
      (document.querySelector('.js-plotly-plot') as unknown as { layout: { xaxis: { range: number[] } } })
        .layout.xaxis.range,
  );
  expect(range).toEqual([4, 8]);
});

test('marks a search as outdated when a distance changes, and does not let it be adopted', async ({
  page,
}) => {
  await openBench(page, 'VDD_IO');
  await page.getByRole('button', { name: 'Search the smallest mix' }).click();
  await expect(page.getByText(/possible, proven/)).toBeVisible({ timeout: 30_000 });
  await page.locator('[data-row]').first().click();
  await page.getByLabel('distance to the load').fill('5m');
  await page.keyboard.press('Enter');
  await expect(page.getByText('at most 1000 mm')).toBeVisible();
  await page.getByLabel('distance to the load').fill('33');
  await page.keyboard.press('Enter');
  await expect(page.getByText('! outdated')).toBeVisible();
  await expect(page.getByRole('button', { name: 'Preview the mix' })).toHaveCount(0);
  await page.getByRole('button', { name: 'Search again' }).click();
  await expect(page.getByText('! outdated')).toHaveCount(0);
  await expect(page.getByRole('button', { name: 'Preview the mix' })).toBeVisible({ timeout: 30_000 });
  await page.getByRole('button', { name: 'Dismiss' }).click();
  await page.getByLabel('each at most').fill('2.5');
  await expect(page.getByText('a whole number, 1 to 999')).toBeVisible();
  await expect(page.getByRole('button', { name: 'Search the smallest mix' })).toBeDisabled();
});
