import { performance } from 'node:perf_hooks';
import type { SearchResult } from '@shared/search/problem';
import { searchMix } from '@shared/search/search';
import { searchCase } from '../helpers/search-case';

interface Run {
  result: SearchResult;
  firstMix_s: number | null;
  bestMix_s: number | null;
}

function run(number: number, seconds: number): Run {
  const search = searchMix(searchCase(number), { seconds, now: () => performance.now() });
  let firstMix_s: number | null = null;
  let bestMix_s: number | null = null;
  let best = Number.POSITIVE_INFINITY;
  for (;;) {
    const step = search.next();
    if (step.done) return { result: step.value, firstMix_s, bestMix_s };
    const { weight, seconds: at } = step.value;
    if (weight === null || weight >= best) continue;
    best = weight;
    firstMix_s ??= at;
    bestMix_s = at;
  }
}

/** The four search cases on one core, as a table; the fourth gets 30 s and its bound shows how far the proof came. */
export async function benchSearch(): Promise<string> {
  const lines = ['case  weight  bound  proven  first mix s  best mix s  total s      nodes'];
  for (const number of [1, 2, 3, 4]) {
    const { result, firstMix_s, bestMix_s } = run(number, number === 4 ? 30 : 60);
    lines.push(
      [
        String(number).padStart(4),
        String(result.found ? result.weight : '–').padStart(6),
        String(result.lowerBound).padStart(5),
        (result.found && result.proven ? 'yes' : 'no').padStart(6),
        (firstMix_s?.toFixed(3) ?? '–').padStart(11),
        (bestMix_s?.toFixed(3) ?? '–').padStart(10),
        result.seconds.toFixed(2).padStart(7),
        String(result.nodes).padStart(9),
      ].join('  '),
    );
  }
  return lines.join('\n');
}
