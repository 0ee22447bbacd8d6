import { expect, test } from '@playwright/test';
import { demoEmail, openBench, signIn, textOf } from './people';

test('an edit made without a connection survives leaving the bench and loading the page anew', async ({
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
  await expect(page.getByText('no connection: kept here')).toBeVisible();
  await page.getByRole('link', { name: 'Rails', exact: true }).click();
  await expect(page.getByText('an edit waits to be sent')).toBeVisible({ timeout: 20_000 });
  await context.setOffline(false);
  await page.reload();
  await expect(page.getByRole('table', { name: 'rails of this board' })).toBeVisible();
  await expect(page.getByText('an edit waits to be sent')).toHaveCount(0, { timeout: 20_000 });
  await page.getByRole('link', { name: 'VDD_IO' }).first().click();
  await expect(page.getByTestId('parts-kinds')).not.toHaveText(before);
});
