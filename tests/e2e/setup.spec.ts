import { type Browser, expect, type Page, test } from '@playwright/test';
import { demoEmail, signIn, textOf } from './people';

async function openSetup(page: Page, role: string): Promise<void> {
  await signIn(page, demoEmail(role));
  await page.getByRole('link', { name: 'Tide gateway' }).first().click();
  await page.getByRole('link', { name: 'Stack-up', exact: true }).first().click();
  await expect(page.getByRole('heading', { name: 'Stack-up and mount recipes' })).toBeVisible();
}

/** A mount's inductance in pH. */
async function picohenry(page: Page): Promise<number> {
  const [number, unit] = (await textOf(page.getByTestId('mount-inductance'))).split(' ');
  return Number(number) * (unit === 'nH' ? 1000 : 1);
}

const save = (page: Page) => page.getByRole('button', { name: 'Save', exact: true }).click();
const saved = (page: Page) => expect(page.getByText('▽ Saved')).toBeVisible();

/** A board of one's own with eight layers and one recipe, opened on its stack-up. */
async function newBoard(page: Page, name: string): Promise<void> {
  await page.goto('/boards/new');
  await page.getByLabel('name').fill(name);
  await page.getByRole('button', { name: /board/i }).last().click();
  await page.getByRole('link', { name: 'Stack-up', exact: true }).first().click();
  await page.getByRole('button', { name: 'Begin with eight layers' }).click();
  await page.getByRole('button', { name: 'Add a recipe' }).click();
  await save(page);
  await saved(page);
}

test('an engineer changes a trace, sees what it costs, saves and finds it again', async ({ page }) => {
  await openSetup(page, 'engineer');
  const list = page.getByRole('list', { name: 'mount recipes' });
  await list.getByRole('button', { name: 'short traces' }).click();
  await page.getByRole('button', { name: 'Duplicate' }).click();
  const name = page.getByLabel('name of the recipe');
  await expect(name).toHaveValue('short traces copy');
  await name.fill('traces around the screw');
  const before = await picohenry(page);
  const traces = await textOf(page.getByTestId('traces-inductance'));
  await page.getByLabel('trace length l').fill('0.8');
  await expect(page.getByTestId('traces-inductance')).not.toHaveText(traces);
  const after = await picohenry(page);
  expect(after).toBeGreaterThan(before + 50);
  await expect(list.getByRole('listitem').filter({ hasText: 'traces around the screw' })).toContainText(
    String(after),
  );
  // Deeper from the other side, and no longer when one comes back.
  await page.getByLabel('from the side').selectOption('bottom');
  expect(await picohenry(page)).toBeGreaterThan(after);
  await page.getByLabel('from the side').selectOption('top');
  await page.getByText('formulas and their sources').click();
  await expect(page.getByText(/acosh/)).toBeVisible();

  await page.getByLabel('trace length l').fill('0.8 feet');
  await expect(page.getByText(/“feet” is not a unit of length/)).toBeVisible();
  expect(await picohenry(page)).toBe(after);
  await save(page);
  await expect(page.getByLabel('trace length l')).toBeFocused();
  await page.getByLabel('trace length l').fill('0.8');
  await save(page);
  await saved(page);
  await page.reload();
  await list.getByRole('button', { name: 'traces around the screw' }).click();
  await expect(page.getByLabel('trace length l')).toHaveValue('0.8 mm');
  expect(await picohenry(page)).toBe(after);

  // Leaving with something unsaved asks first.
  await page.getByLabel('trace width w').fill('0.2');
  await page.getByRole('link', { name: 'Revisions' }).first().click();
  await page.getByRole('button', { name: 'Stay here' }).click();
  await page.getByRole('button', { name: 'Discard the changes' }).click();
  await page.getByRole('button', { name: 'Discard them' }).click();
  await expect(page.getByText('Nothing changed.')).toBeVisible();
});

test('layers move and multiply by keyboard, and the drawing follows', async ({ page }) => {
  await signIn(page, demoEmail('engineer'));
  await newBoard(page, 'Weir keyboard');
  const names = page.getByLabel(/^name of (?!the recipe)/);
  await page.getByLabel('name of L4 signal').focus();
  await page.keyboard.press('Alt+ArrowDown');
  await expect(page.getByLabel('name of L4 signal')).toBeFocused();
  await expect(names.nth(7)).toHaveValue('L4 signal');
  await expect(page.getByText('needs a dielectric above it')).toBeVisible();
  await page.keyboard.press('Alt+ArrowUp');
  await expect(page.getByText('needs a dielectric above it')).toHaveCount(0);
  const thickness = page.getByTestId('thickness');
  const before = Number.parseFloat(await textOf(thickness));
  await page.getByRole('button', { name: 'Add below' }).click();
  await expect(names.nth(7)).toBeFocused();
  await page.keyboard.type(' of glass');
  await page.getByLabel('thickness of new dielectric of glass').fill('4 mil');
  await expect(thickness).toHaveText(`${Number((before + 0.1016).toFixed(3))} mm thick`);
  await save(page);
  await saved(page);
  await page.reload();
  await expect(names.nth(7)).toHaveValue('new dielectric of glass');
  await expect(page.getByLabel('thickness of new dielectric of glass')).toHaveValue('101.6 µm');
});

test('a recipe that a rail uses cannot go, and the page says which rail', async ({ page }) => {
  await signIn(page, demoEmail('engineer'));
  await newBoard(page, 'Weir in use');
  await page.evaluate(async () => {
    const board = /boards\/([^/]+)/.exec(location.pathname)?.[1];
    const get = async (path: string) => (await fetch(`/api${path}`)).json();
    const { setup } = await get(`/boards/${board}`);
    const { items } = await get('/parts?limit=1');
    const geometry = {
      length_m: 0.05,
      width_m: 0.04,
      spacing_m: 1e-4,
      relative_permittivity: 4,
      pair: ['L2 plane', 'L3 plane'],
    };
    const spec = {
      name: 'VDD_LAID',
      voltage_V: 1.2,
      target: { kind: 'flat', impedance_ohm: 0.05 },
      band_Hz: [10e3, 10e6],
      source: { kind: 'rl', resistance_ohm: 0.002, inductance_H: 20e-9 },
      plane: { capacitance_F: 1e-9, resistance_ohm: 1e-3, inductance_H: 1e-11, geometry },
    };
    const bank = [{ partId: items[0].id, count: 2, recipeId: setup.recipes[0].id }];
    const response = await fetch(`/api/boards/${board}/rails`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify({ spec, bank }),
    });
    if (!response.ok) throw new Error(await response.text());
  });
  await page.reload();
  const row = page.getByRole('list', { name: 'mount recipes' }).getByRole('listitem');
  await expect(row).toContainText('VDD_LAID');
  await page.locator('section[aria-label^="recipe"]').getByRole('button', { name: 'Remove' }).click();
  await expect(row).toContainText('goes with the next save');
  await save(page);
  await expect(page.getByRole('alert').filter({ hasText: 'used by VDD_LAID' })).toBeVisible();
  await row.getByRole('button', { name: 'Put back' }).click();
  await expect(page.getByText('Nothing changed.')).toBeVisible();

  // Neither can a plane that the rail takes its planes from lose its name.
  await page.getByLabel('name of L3 plane').fill('L3 other');
  await save(page);
  await expect(page.getByRole('alert').filter({ hasText: 'VDD_LAID' })).toContainText('L3 plane');
  await expect(page.getByLabel('name of L3 other')).toBeVisible();
});

test('two engineers at once: the second is told what changed and keeps what was typed', async ({
  page,
  browser,
}) => {
  await signIn(page, demoEmail('engineer'));
  await newBoard(page, 'Weir of two');
  const other = await secondPage(browser, page.url());
  await other.getByLabel('thickness of L2 plane').fill('35u');
  await save(other);
  await saved(other);
  await page.getByLabel('thickness of L3 plane').fill('70u');
  await save(page);
  await expect(page.getByText('▲ not saved: changed meanwhile')).toBeVisible();
  await expect(page.getByText('Changed meanwhile: layer L2 plane.')).toBeVisible();
  await page.getByRole('button', { name: 'Save mine over it' }).click();
  await saved(page);
  await other.reload();
  await expect(other.getByLabel('thickness of L2 plane')).toHaveValue('18 µm');
  await expect(other.getByLabel('thickness of L3 plane')).toHaveValue('70 µm');

  await page.getByLabel('thickness of L6 plane').fill('35u');
  await save(page);
  await saved(page);
  await other.getByLabel('name of the recipe').fill('theirs');
  await save(other);
  await other.getByRole('button', { name: 'Load the newer state' }).click();
  await expect(other.getByLabel('thickness of L6 plane')).toHaveValue('35 µm');
  await expect(other.getByText('theirs')).toHaveCount(0);
});

async function secondPage(browser: Browser, url: string): Promise<Page> {
  const page = await (await browser.newContext()).newPage();
  await signIn(page, demoEmail('engineer'));
  await page.goto(url);
  return page;
}

test('a reviewer sees all of it and can change nothing', async ({ page }) => {
  await openSetup(page, 'reviewer');
  await expect(page.getByText('Read only for you')).toBeVisible();
  await expect(page.getByRole('row', { name: /L2 gnd/ }).first()).toContainText('18 µm');
  await page.getByRole('button', { name: 'long traces' }).click();
  expect(await picohenry(page)).toBeGreaterThan(100);
  await expect(page.getByRole('img', { name: /plan of the mount/ })).toBeVisible();
  await expect(page.getByRole('img', { name: /section of the mount/ })).toBeVisible();
  await expect(page.locator('main input')).toHaveCount(0);
  await expect(page.getByRole('button', { name: /save|remove|duplicate|add/i })).toHaveCount(0);
});
