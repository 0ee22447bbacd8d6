import { expect, test } from '@playwright/test';
import { demoEmail, openBench, signIn } from './people';

test('a reviewer sees board and revision and cannot change them', async ({ page }) => {
  await signIn(page, demoEmail('reviewer'));
  await openBench(page, 'VDD_CORE');
  await expect(page.getByText('read only')).toBeVisible();
  await expect(page.getByRole('button', { name: '+ add a part' })).toHaveCount(0);
  await expect(page.getByRole('button', { name: /one .* more/ })).toHaveCount(0);
  await page.goto(`${page.url()}/specification`);
  await expect(page.getByText('Read only for you')).toBeVisible();
  await expect(page.locator('form')).toHaveCount(0);
  await page.getByRole('link', { name: 'Back to the bench' }).click();
  await expect(page.getByTestId('headroom')).toBeVisible();
  await page.getByRole('link', { name: 'Revisions' }).first().click();
  await expect(page.getByRole('button', { name: /cut/i })).toHaveCount(0);
  await page.getByRole('link', { name: 'revision B' }).click();
  await expect(page.getByText(/VDD_SERDES/).first()).toBeVisible();
});

test('layout downloads the placement list: one row an instance', async ({ page }) => {
  await signIn(page, demoEmail('layout'));
  await page.getByRole('link', { name: 'Tide gateway' }).first().click();
  await page.getByRole('link', { name: 'Placement' }).first().click();
  const download = page.waitForEvent('download');
  await page.getByRole('link', { name: /CSV/ }).first().click();
  const stream = await (await download).createReadStream();
  let text = '';
  for await (const chunk of stream) text += chunk;
  const [header, ...rows] = text.trim().split('\r\n');
  for (const column of [
    'reference designator',
    'part',
    'value',
    'case',
    'side',
    'rail',
    'mount',
    'farthest distance mm',
  ])
    expect(header).toContain(column);
  const designators = rows.map((row) => row.split(',')[0]);
  expect(new Set(designators).size).toBe(rows.length);
  expect(designators[0]).toMatch(/^C\d+$/);
  expect(rows.length).toBeGreaterThan(30);
});

test('an administrator invites a person, who accepts, forgets and sets the password anew', async ({
  page,
  browser,
}) => {
  await signIn(page, demoEmail('admin'));
  await page.goto('/people');
  await page
    .getByRole('button', { name: /invite/i })
    .first()
    .click();
  const email = `runa.${Date.now()}@alderbrook.example`;
  await page.getByRole('dialog').getByLabel('e-mail').fill(email);
  await page.getByRole('dialog').getByLabel('name').fill('Runa Brandt');
  await page.getByRole('dialog').getByRole('button', { name: /invit/i }).last().click();
  await expect(page.getByText(email).first()).toBeVisible();

  const linkIn = async (kind: string) => {
    await page.goto('/mail');
    await page.getByText(email).first().click();
    const link = page.getByRole('link', { name: new RegExp(`/${kind}/`) }).first();
    return new URL((await link.getAttribute('href')) ?? '', page.url()).pathname;
  };
  const invitation = await linkIn('invitation');
  const other = await (await browser.newContext()).newPage();
  await other.goto(invitation);
  await other.getByLabel('password', { exact: true }).fill('a pond in the wood');
  await other.getByLabel('password, once more').fill('a pond in the wood');
  await other.getByRole('button', { name: 'Accept and go in' }).click();
  await expect(other.getByText('Runa Brandt')).toBeVisible();

  const third = await (await browser.newContext()).newPage();
  await third.goto('/reset');
  await third.getByLabel('e-mail').fill(email);
  await third.getByRole('button', { name: 'Send the link' }).click();
  await expect(third.getByText(/is on its way/)).toBeVisible();
  const reset = await linkIn('reset');
  await third.goto(reset);
  await third.getByLabel('new password', { exact: true }).fill('a mill by the pond');
  await third.getByLabel('new password, once more').fill('a mill by the pond');
  await third.getByRole('button', { name: 'Set the password' }).click();
  await expect(third.getByLabel('new password', { exact: true })).toHaveCount(0);
  await signIn(third, email, 'a mill by the pond');
  await expect(third.getByText('Runa Brandt')).toBeVisible();

  // The link works once, and the old password no longer does.
  await third.goto(reset);
  await expect(third.getByRole('link', { name: 'Ask for a new link' })).toBeVisible();
});
