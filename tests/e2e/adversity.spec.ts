import { expect, test } from '@playwright/test';
import { demoEmail, openBench, signIn, textOf } from './people';

test('an edit made without a connection waits, says so, and is sent when it is back', async ({
  page,
  context,
}) => {
  await signIn(page, demoEmail('engineer'));
  await openBench(page, 'VDD_IO');
  const before = await textOf(page.getByTestId('parts-kinds'));
  await context.setOffline(true);
  await page
    .getByRole('button', { name: /one .* more/ })
    .first()
    .click();
  await expect(page.getByText('no connection: kept here, will be sent')).toBeVisible();
  await expect(page.getByTestId('parts-kinds')).not.toHaveText(before);
  await context.setOffline(false);
  await expect(page.getByText(/saved \d\d:\d\d/)).toBeVisible();
  await page.reload();
  await expect(page.getByTestId('parts-kinds')).not.toHaveText(before);
});

test('a page that needs the server says at once that it is away, and comes by itself when it is back', async ({
  page,
  context,
}) => {
  await signIn(page, demoEmail('engineer'));
  await openBench(page, 'VDD_IO');
  await context.setOffline(true);
  await page.getByRole('link', { name: 'VDD_AUX' }).first().click();
  await expect(page.getByText('the server cannot be reached')).toBeVisible({ timeout: 2000 });
  await expect(page.getByRole('button', { name: 'Try again' })).toBeVisible();
  await context.setOffline(false);
  await expect(page.getByTestId('headroom')).toBeVisible();
});

test('when the session has ended one signs in on the spot and the edit is not lost', async ({
  page,
  context,
}) => {
  await signIn(page, demoEmail('engineer'));
  await openBench(page, 'VDD_DDR');
  const before = await textOf(page.getByTestId('parts-kinds'));
  await context.clearCookies();
  await page
    .getByRole('button', { name: /one .* more/ })
    .first()
    .click();
  const dialog = page.getByRole('dialog', { name: 'Your session has ended' });
  await expect(dialog).toBeVisible();
  await dialog.getByLabel('password').fill('still water at dusk');
  await dialog.getByRole('button', { name: 'Sign in', exact: true }).click();
  await expect(dialog).toBeHidden();
  await expect(page.getByText(/saved \d\d:\d\d/)).toBeVisible();
  await page.reload();
  await expect(page.getByTestId('parts-kinds')).not.toHaveText(before);
});

test('two people on one rail: the later save is told who changed it, and may put its own over it', async ({
  page,
  browser,
}) => {
  await signIn(page, demoEmail('engineer'));
  await openBench(page, 'VDD_AUX');
  const second = await (await browser.newContext()).newPage();
  await signIn(second, demoEmail('engineer'));
  await openBench(second, 'VDD_AUX');
  await page
    .getByRole('button', { name: /one .* more/ })
    .first()
    .click();
  await expect(page.getByText(/saved \d\d:\d\d/)).toBeVisible();
  await page.waitForTimeout(600);
  await second
    .getByRole('button', { name: /one .* more/ })
    .last()
    .click();
  const dialog = second.getByRole('dialog', { name: 'This rail has changed meanwhile' });
  await expect(dialog).toContainText('saved VDD_AUX');
  await dialog.getByRole('button', { name: 'Put my bank over it' }).click();
  await expect(dialog).toBeHidden();
  await expect(second.getByText(/saved \d\d:\d\d/)).toBeVisible();
});

test('a stranger gets the same answer for a board that is not theirs as for none', async ({ page }) => {
  await signIn(page, demoEmail('librarian'));
  await page.goto('/boards/00000000-0000-4000-8000-000000000000');
  await expect(page.getByText('the board is not here')).toBeVisible();
  await page.getByRole('link', { name: 'All boards' }).click();
  await expect(page.getByRole('heading', { name: 'Boards' })).toBeVisible();
});
