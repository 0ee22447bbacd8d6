import { prepare } from '@shared/search/prepare';
import { reachAt } from '@shared/search/reach';
import { buildRows, rowQuadratic } from '@shared/search/rows';
import { describe, expect, it } from 'vitest';
import { NODE_OPTIONS } from '../helpers/random-nodes';
import { smallSearch } from '../helpers/small-search';

describe('reachAt', () => {
  it('finds the best corner of the box of counts', () => {
    for (let seed = 0; seed < 40; seed++) {
      const problem = smallSearch(seed, { ...NODE_OPTIONS[seed % NODE_OPTIONS.length], max: 3 });
      const prepared = prepare(problem);
      const rows = buildRows(prepared, [3e4, 2e5, 1e6, 1e7]);
      const { parts } = prepared;
      for (const f of rows.convex) {
        let best = Number.NEGATIVE_INFINITY;
        for (let set = 0; set < 2 ** parts.length; set++) {
          let x = rows.y0x[f];
          let y = rows.y0y[f];
          parts.forEach((part, k) => {
            const n = (set >> k) & 1 ? part.max - part.min : 0;
            x += n * rows.yx[k][f];
            y += n * rows.yy[k][f];
          });
          best = Math.max(best, rowQuadratic(rows, f, x, y));
        }
        const reach = reachAt(prepared, rows, f);
        expect(reach.best).toBeGreaterThanOrEqual(best - 1e-9 * (1 + Math.abs(best)));
      }
    }
  });
});
