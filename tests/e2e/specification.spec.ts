import { expect, type Page, test } from '@playwright/test';
import { demoEmail, openBench, signIn } from './people';

async function openSpecification(page: Page, rail: string): Promise<void> {
  await openBench(page, rail);
  await page.getByRole('link', { name: 'edit specification' }).click();
  await expect(page.getByRole('heading', { name: `Specification of ${rail}` })).toBeVisible();
}

/** The noise budget's row as `millivolt, per cent`. */
const budgetRow = (page: Page, name: string) =>
  page.getByRole('table', { name: 'noise budget' }).getByRole('row', { name }).getByRole('cell');

test.beforeEach(async ({ page }) => {
  await signIn(page, demoEmail('engineer'));
});

test('turns the ripple of a rail into a budget, states conditions, and finds it all again', async ({
  page,
}) => {
  await openSpecification(page, 'VDD_IO');
  await expect(page.getByText('5 % of 1.8 V at 3 A → 30.0 mΩ')).toBeVisible();
  await page.getByLabel('ripple', { exact: true }).selectOption('budget');
  await page.getByLabel('rail tolerance, ±').fill('5');
  await page.getByLabel('set-point error, ±').fill('0.5');
  await page.getByLabel('DC drop', { exact: true }).fill('6m');
  await page.getByLabel('the regulator’s own ripple', { exact: true }).fill('3mV');
  // 90 mV − 9 mV − 6 mV − 3 mV = 72 mV, 4 % of 1.8 V; 72 mV ÷ 3 A = 24 mΩ
  await expect(budgetRow(page, 'set-point error')).toHaveText(['9.0 mV', '0.50 %']);
  await expect(budgetRow(page, 'DC drop')).toHaveText(['6.0 mV', '0.33 %']);
  await expect(budgetRow(page, 'own ripple')).toHaveText(['3.0 mV', '0.17 %']);
  await expect(budgetRow(page, 'left for the bank')).toHaveText(['72.0 mV', '4.00 %']);
  await expect(budgetRow(page, 'rail tolerance')).toHaveText(['90.0 mV', '5.00 %']);
  await expect(page.getByRole('img', { name: /^rail tolerance ±90\smV/ })).toBeVisible();
  await expect(page.getByText('4 % of 1.8 V at 3 A → 24.0 mΩ')).toBeVisible();

  await page.getByLabel('conditions of this rail').selectOption('stated');
  await page.getByLabel('coldest, °C').fill('-20');
  await page.getByLabel('usual, °C').fill('40');
  await page.getByLabel('hottest, °C').fill('85 °C');
  await page.getByLabel('age, years').fill('87660 h');
  await page.getByRole('checkbox', { name: 'ESL' }).uncheck();
  await expect(page.getByText(/^16 corners: cold or hot; new or aged; C and ESR/)).toBeVisible();
  await page.getByRole('button', { name: 'Save the specification' }).click();
  await expect(page.getByTestId('headroom')).toBeVisible();
  await expect(page.getByText('24.0 mΩ').first()).toBeVisible();

  await page.getByRole('link', { name: 'edit specification' }).click();
  await page.reload();
  await expect(page.getByLabel('ripple', { exact: true })).toHaveValue('budget');
  await expect(page.getByLabel('set-point error, ±')).toHaveValue('0.5');
  await expect(budgetRow(page, 'left for the bank')).toHaveText(['72.0 mV', '4.00 %']);
  await expect(page.getByLabel('coldest, °C')).toHaveValue('-20');
  await expect(page.getByLabel('usual, °C')).toHaveValue('40');
  await expect(page.getByLabel('hottest, °C')).toHaveValue('85');
  await expect(page.getByLabel('age, years')).toHaveValue('10');
  await expect(page.getByRole('checkbox', { name: 'ESR' })).toBeChecked();
  await expect(page.getByRole('checkbox', { name: 'ESL' })).not.toBeChecked();
});

test('refuses a budget that is overspent and says by how much', async ({ page }) => {
  await openSpecification(page, 'VDD_AUX');
  await page.getByLabel('ripple', { exact: true }).selectOption('budget');
  await page.getByLabel('rail tolerance, ±').fill('3');
  await page.getByLabel('DC drop', { exact: true }).fill('132m');
  // 132 mV of 3.3 V are 4 %: one per cent more than there is.
  const sentence = 'nothing is left for the bank: overspent by 33 mV (1 %)';
  await expect(page.getByText(sentence)).toBeVisible();
  await page.getByRole('button', { name: 'Save the specification' }).click();
  await expect(page.getByLabel('rail tolerance, ±')).toBeFocused();
  await expect(page.getByLabel('rail tolerance, ±')).toHaveAccessibleDescription(`▲ ${sentence}`);
  await expect(page.getByText('1 field needs another look')).toBeVisible();
  await page.getByRole('button', { name: 'Back to the bench' }).click();
  await page.getByRole('button', { name: 'Leave' }).click();
  await expect(page.getByTestId('headroom')).toBeVisible();
  await page.getByRole('link', { name: 'edit specification' }).click();
  await expect(page.getByLabel('ripple', { exact: true })).toHaveValue('none');
});

test('reads the source from a file, says what is wrong by its line, and takes planes from the stack-up', async ({
  page,
}) => {
  await openSpecification(page, 'VDD_AUX');
  await page.getByLabel('output impedance').selectOption('table');
  const take = (text: string) =>
    page
      .getByLabel('file with the source’s points')
      .setInputFiles({ name: 'buck.csv', mimeType: 'text/csv', buffer: Buffer.from(text) });
  await take('f (Hz),Re,Im\n1e3,0.01,0.001\n2e3,0.01\n');
  await expect(page.getByText('▲ buck.csv: line 3: 3 numbers are wanted, 2 stand there')).toBeVisible();
  await take('f (Hz),Re,Im\n1e3,0.01,0.001\n1e6,0.02,0.9\n');
  await expect(
    page.getByText('buck.csv: 2 points read, 1 line above the first number skipped'),
  ).toBeVisible();
  await expect(page.getByText(/^2 points cover 1\skHz to 1\sMHz; above 1\sMHz/)).toBeVisible();

  await page.getByLabel('given as').nth(2).selectOption('stackup');
  const planes = page.getByLabel('planes of the stack-up');
  await page.getByRole('button', { name: 'Save the specification' }).click();
  await expect(planes).toHaveAccessibleDescription('▲ choose two planes of the stack-up');
  await planes.selectOption({ index: 1 });
  await expect(page.getByText(/lie [\d.]+\smm apart, εr [\d.]+ → /)).toBeVisible();
  await page.getByRole('button', { name: 'Save the specification' }).click();
  await expect(page.getByTestId('headroom')).toBeVisible();
  await page.getByRole('link', { name: 'edit specification' }).click();
  await expect(page.getByLabel('output impedance')).toHaveValue('table');
  await expect(page.getByLabel('given as').nth(2)).toHaveValue('stackup');
  await expect(planes).toHaveValue('0');
});

test('asks before it writes over what a colleague has saved meanwhile, even when that has been fetched', async ({
  page,
  browser,
}) => {
  await page.clock.install();
  await openSpecification(page, 'VBUS_72');
  const address = page.url();
  const other = await (await browser.newContext()).newPage();
  await signIn(other, demoEmail('engineer'));
  await other.goto(address);
  await other.getByLabel('target impedance').fill('0.7');
  await other.getByRole('button', { name: 'Save the specification' }).click();
  await expect(other.getByTestId('headroom')).toBeVisible();
  await other.context().close();

  // Coming back to the tab fetches the rail anew; the form still holds what was typed from the older one.
  await page.getByLabel('current limit').fill('3.5');
  await page.clock.fastForward(60_000);
  const fetched = page.waitForResponse((answer) => /\/rails\/[0-9a-f-]+$/.test(answer.url()) && answer.ok());
  await page.evaluate(() => document.dispatchEvent(new Event('visibilitychange', { bubbles: true })));
  await fetched;
  await page.getByRole('button', { name: 'Save the specification' }).click();
  const dialog = page.getByRole('dialog', { name: 'This rail has changed meanwhile' });
  await expect(dialog).toBeVisible();
  await dialog.getByRole('button', { name: 'Keep the newer one' }).click();
  await expect(page.getByTestId('headroom')).toBeVisible();
  await page.getByRole('link', { name: 'edit specification' }).click();
  await expect(page.getByLabel('target impedance')).toHaveValue('700m');
});

test('asks before typed work is thrown away: by a link, the button, the browser’s back and a reload', async ({
  page,
}) => {
  await openSpecification(page, 'VBUS_72');
  const asks = page.getByRole('dialog', { name: 'Leave without saving?' });
  const stay = async () => {
    await asks.getByRole('button', { name: 'Stay here' }).click();
    await expect(page.getByLabel('current limit')).toHaveValue('3.75');
  };
  await page.getByLabel('current limit').fill('1');
  await page.getByRole('button', { name: 'Back to the bench' }).click();
  await asks.getByRole('button', { name: 'Leave' }).click();
  await page.getByRole('link', { name: 'edit specification' }).click();
  const limit = await page.getByLabel('current limit').inputValue();
  await page.getByLabel('current limit').fill('3.75');
  await page.getByRole('link', { name: 'Rails', exact: true }).click();
  await stay();
  await page.getByRole('button', { name: 'Back to the bench' }).click();
  await stay();
  await page.goBack();
  await stay();
  const reload = page.waitForEvent('dialog');
  const reloaded = page.reload();
  const dialog = await reload;
  expect(dialog.type()).toBe('beforeunload');
  await dialog.accept();
  await reloaded;
  await expect(page.getByLabel('current limit')).toHaveValue(limit);
  await page.getByRole('button', { name: 'Back to the bench' }).click();
  await expect(page.getByTestId('headroom')).toBeVisible();
});

test('a new rail that has been begun is not lost unasked; once made it asks nothing', async ({ page }) => {
  await page.getByRole('link', { name: 'Tide gateway' }).first().click();
  await page.getByRole('link', { name: 'Add a rail' }).first().click();
  await page.getByLabel('name').fill('VDD_SPARE');
  await page.getByRole('link', { name: 'Rails', exact: true }).click();
  await page.getByRole('button', { name: 'Stay here' }).click();
  await page.getByLabel('voltage', { exact: true }).fill('1.2');
  await page.getByLabel('load step', { exact: true }).fill('2');
  await page.getByLabel('given as').nth(1).selectOption('derived');
  await page.getByLabel('rise time of the step').fill('35n');
  await page.getByRole('button', { name: 'Make the rail' }).click();
  await expect(page.getByRole('heading', { name: 'VDD_SPARE' })).toBeVisible();
});

test('a deleted rail leads to the board, and nobody asks the server for it again', async ({ page }) => {
  await openSpecification(page, 'VDD_SPARE');
  const missing: string[] = [];
  page.on('response', (answer) => {
    if (answer.status() === 404) missing.push(answer.url());
  });
  await page.getByLabel('voltage', { exact: true }).fill('1.3');
  await page.getByRole('button', { name: 'Delete the rail' }).click();
  await page.getByRole('button', { name: 'Delete VDD_SPARE' }).click();
  await expect(page.getByRole('table', { name: 'rails of this board' })).toBeVisible();
  await expect(page.getByRole('dialog')).toHaveCount(0);
  await expect(page.getByRole('link', { name: 'VDD_SPARE' })).toHaveCount(0);
  expect(missing).toEqual([]);
});

test('a reviewer reads what is specified, and that only engineers change it', async ({ browser }) => {
  const page = await (await browser.newContext()).newPage();
  await signIn(page, demoEmail('reviewer'));
  await openBench(page, 'VDD_CORE');
  await page.goto(`${page.url()}/specification`);
  await expect(page.getByText('Only engineers of this board add rails and change them')).toBeVisible();
  await expect(page.locator('dt', { hasText: 'band' })).toBeVisible();
  await expect(page.locator('dt', { hasText: 'conditions' })).toBeVisible();
  await page.context().close();
});

test('refuses a source whose header says another unit', async ({ page }) => {
  await openSpecification(page, 'VDD_AUX');
  await page.getByLabel('output impedance').selectOption('table');
  await page.getByLabel('file with the source’s points').setInputFiles({
    name: 'buck.csv',
    mimeType: 'text/csv',
    buffer: Buffer.from('f (MHz),Re,Im\n0.001,0.01,0.001\n1,0.02,0.9\n'),
  });
  await expect(
    page.getByText('▲ buck.csv: line 1: the header “f (MHz),Re,Im” says MHz: give frequencies in Hz'),
  ).toBeVisible();
});
