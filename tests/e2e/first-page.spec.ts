import { gzipSync } from 'node:zlib';
import { expect, test } from '@playwright/test';
import { demoEmail, openBench, signIn } from './people';

test('the first page is light, and nothing is fetched from elsewhere', async ({ page, baseURL }) => {
  const outside: string[] = [];
  const faults: string[] = [];
  const sizes: Promise<number>[] = [];
  page.on('request', (request) => {
    const url = request.url();
    if (!url.startsWith(baseURL ?? '') && !url.startsWith('blob:') && !url.startsWith('data:'))
      outside.push(url);
  });
  page.on('console', (message) => {
    if (message.type() === 'error') faults.push(message.text());
  });
  page.on('pageerror', (error) => faults.push(error.message));
  page.on('response', (response) => {
    if (!new URL(response.url()).pathname.endsWith('.js')) return;
    sizes.push(response.body().then((body) => gzipSync(body).length));
  });
  await signIn(page, demoEmail('engineer'));
  await expect(page.getByText('Tide gateway').first()).toBeVisible();
  await page.waitForLoadState('networkidle');
  const scripts = (await Promise.all(sizes)).reduce((sum, size) => sum + size, 0);
  expect(scripts).toBeGreaterThan(50_000);
  expect(scripts).toBeLessThan(200_000);
  await openBench(page, 'VDD_CORE');
  await expect(page.locator('.js-plotly-plot .nsewdrag')).toBeAttached();
  await page.waitForLoadState('networkidle');
  expect(outside).toEqual([]);
  expect(faults).toEqual([]);
});
