import { gzipSync } from 'node:zlib';
import { chromium } from '@playwright/test';
import { findChromium } from '../system-packages.mjs';
import { cookieOf, EMAIL, PASSWORD, withServer } from './server';

const LINES = 25;
const STEPS = 60;

/** A count step on a bank of 25 lines, from the key to the redrawn chart, in Chromium; and what the first page weighs. */
export function benchChart(): Promise<string> {
  const executablePath = findChromium();
  if (!executablePath) return Promise.resolve('Chromium is not installed');
  return withServer(4796, async (base) => {
    const { boardId, railId } = await makeRail(base);
    const browser = await chromium.launch({
      executablePath,
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    });
    try {
      const page = await browser.newPage({ viewport: { width: 1440, height: 920 } });
      let script = 0;
      page.on('response', async (response) => {
        if (!response.url().endsWith('.js')) return;
        const body = await response.body().catch(() => Buffer.alloc(0));
        script += gzipSync(body).length;
      });
      await page.goto(`${base}/sign-in`);
      await page.getByLabel('e-mail').fill(EMAIL);
      await page.getByLabel('password').fill(PASSWORD);
      await page.getByRole('button', { name: 'Sign in', exact: true }).click();
      await page.getByText('Tide gateway').first().waitFor();
      await page.waitForTimeout(500);
      const firstPage = script;
      await page.goto(`${base}/boards/${boardId}/rails/${railId}`);
      await page.locator('.js-plotly-plot .nsewdrag').waitFor({ state: 'attached' });
      await page.waitForTimeout(1500);
      await page.locator('[data-row]').nth(10).focus();
      const times: number[] = [];
      for (let i = 0; i < STEPS; i++) {
        await page.evaluate(() => {
          const plot = document.querySelector('.js-plotly-plot') as HTMLElement & {
            once: (event: string, run: () => void) => void;
          };
          const w = window as unknown as { redrawn: Promise<number> };
          w.redrawn = new Promise((resolve) => {
            let start = 0;
            document.addEventListener('keydown', () => (start = performance.now()), {
              once: true,
              capture: true,
            });
            plot.once('plotly_afterplot', () =>
              requestAnimationFrame(() => resolve(performance.now() - start)),
            );
          });
        });
        await page.keyboard.press(i % 2 === 0 ? 'ArrowRight' : 'ArrowLeft');
        times.push(await page.evaluate(() => (window as unknown as { redrawn: Promise<number> }).redrawn));
      }
      times.sort((a, b) => a - b);
      return [
        `count step to redrawn chart, ${LINES} lines, ${STEPS} steps: median ${times[STEPS >> 1].toFixed(1)} ms (aim ≤ 50), p95 ${times[Math.floor(STEPS * 0.95)].toFixed(1)} ms`,
        `JavaScript up to the list of boards: ${(firstPage / 1000).toFixed(0)} kB gzip (aim ≤ 200)`,
      ].join('\n');
    } finally {
      await browser.close();
    }
  });
}

async function makeRail(base: string): Promise<{ boardId: string; railId: string }> {
  const headers = { cookie: await cookieOf(base), 'content-type': 'application/json' };
  const call = async (method: string, path: string, body?: unknown) => {
    const response = await fetch(`${base}/api${path}`, {
      method,
      headers,
      ...(body !== undefined && { body: JSON.stringify(body) }),
    });
    if (!response.ok) throw new Error(`${path}: ${response.status} ${await response.text()}`);
    return response.json();
  };
  const board = await call('POST', '/boards', { name: 'Bench', description: '' });
  const { items } = await call('GET', `/parts?state=approved&limit=${LINES}`);
  const bank = items.map((part: { id: string }, i: number) => ({ partId: part.id, count: 1 + (i % 4) }));
  const { rail } = await call('POST', `/boards/${board.id}/rails`, {
    spec: {
      name: 'VDD',
      voltage_V: 0.9,
      target: { kind: 'flat', impedance_ohm: 0.003 },
      band_Hz: [1e4, 3e7],
      source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 2e-8 },
    },
    bank,
  });
  return { boardId: board.id, railId: rail.id };
}
