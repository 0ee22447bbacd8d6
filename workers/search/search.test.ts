import { readFileSync } from 'node:fs';
import { railDocumentSchema } from '@shared/schemas/rail-document.schema';
import type { SearchProgress } from '@shared/search/problem';
import { describe, expect, it } from 'vitest';
import { Search } from './search';

const document = railDocumentSchema.parse(
  JSON.parse(readFileSync(new URL('../../tests/fixtures/search/search-1.json', import.meta.url), 'utf8')),
);

describe('the search in a worker', () => {
  it('streams mixes that only get better and bounds that only rise, and ends proven', async () => {
    const heard: SearchProgress[] = [];
    const answer = await new Search().search({ document, seconds: 30, seed: 1 }, (progress) =>
      heard.push(progress),
    );
    expect(answer).toMatchObject({
      status: 'done',
      value: { found: true, weight: 13, lowerBound: 13, proven: true },
    });
    const weights = heard.flatMap((one) => one.weight ?? []);
    expect(weights).toEqual([...weights].sort((a, b) => b - a));
    const bounds = heard.map((one) => one.lowerBound);
    expect(bounds).toEqual([...bounds].sort((a, b) => a - b));
    expect(Math.max(...bounds)).toBeLessThanOrEqual(13);
  });

  it('stops when it is cancelled, and when a newer search takes its place', async () => {
    const search = new Search();
    let cancelled = false;
    const answer = search.search({ document, seconds: 30, seed: 1 }, () => {
      if (!cancelled) void search.cancel();
      cancelled = true;
    });
    await expect(answer).resolves.toEqual({ status: 'stale' });
    const old = search.search({ document, seconds: 30, seed: 1 }, () => {});
    const fresh = search.search({ document, seconds: 30, seed: 1 }, () => {});
    await expect(old).resolves.toEqual({ status: 'stale' });
    await expect(fresh).resolves.toMatchObject({ status: 'done' });
  });

  it('answers a bad problem as data', async () => {
    const bad = { ...document, search: { minimise: 'cost' as const, candidates: [document.parts[0].id] } };
    const parts = document.parts.map(({ unit_cost: _none, ...part }) => part);
    const answer = await new Search().search({ document: { ...bad, parts }, seconds: 1, seed: 1 }, () => {});
    expect(answer).toMatchObject({ status: 'failed', field: expect.stringContaining('cost') });
  });
});
