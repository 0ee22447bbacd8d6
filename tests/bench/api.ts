import { performance } from 'node:perf_hooks';
import { cookieOf, withServer } from './server';

const PER_SECOND = 50;
const SECONDS = 12;

/** Reads at 50 requests a second, spread over what the client really fetches; latency as the client sees it. */
export function benchApi(): Promise<string> {
  return withServer(4797, async (base) => {
    const headers = { cookie: await cookieOf(base) };
    const json = async (path: string) => (await fetch(`${base}/api${path}`, { headers })).json();
    const [board] = (await json('/boards')).items;
    const { rails } = await json(`/boards/${board.id}/rails`);
    const reads = [
      '/session',
      '/boards',
      `/boards/${board.id}`,
      `/boards/${board.id}/rails`,
      `/boards/${board.id}/rails/${rails[0].id}`,
      `/boards/${board.id}/revisions`,
      `/boards/${board.id}/revisions/B`,
      '/parts',
      '/parts?q=X7R&sort=esr_ohm',
      '/people',
    ];
    const times: number[] = [];
    const one = async (path: string) => {
      const start = performance.now();
      const response = await fetch(`${base}/api${path}`, { headers });
      await response.arrayBuffer();
      if (!response.ok) throw new Error(`${path} answered ${response.status}`);
      times.push(performance.now() - start);
    };
    for (const path of reads) await one(path);
    times.length = 0;
    const pending: Promise<void>[] = [];
    for (let i = 0; i < PER_SECOND * SECONDS; i++) {
      pending.push(one(reads[i % reads.length]));
      await new Promise((resolve) => setTimeout(resolve, 1000 / PER_SECOND));
    }
    await Promise.all(pending);
    times.sort((a, b) => a - b);
    const at = (share: number) =>
      times[Math.min(times.length - 1, Math.floor(share * times.length))].toFixed(1);
    return `${times.length} reads at ${PER_SECOND}/s over ${reads.length} addresses: median ${at(0.5)} ms, p95 ${at(0.95)} ms (aim ≤ 15), p99 ${at(0.99)} ms`;
  });
}
