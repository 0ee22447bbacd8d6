import { Game } from '@shared/search/game';
import { buildHulls } from '@shared/search/hull';
import { hullPrune } from '@shared/search/hull-prune';
import { meetsAll, rowMeasure } from '@shared/search/rows';
import { type Surrogate, surrogatePrune } from '@shared/search/surrogate-prune';
import { describe, expect, it } from 'vitest';
import { eachCompletion, NODE_OPTIONS, type RandomNode, randomNode } from '../helpers/random-nodes';

/** The worst bug possible is a prune that loses a solution: every prune against every completion of random nodes. */
const NODES: [number, (typeof NODE_OPTIONS)[number]][] = Array.from({ length: 300 }, (_, i) => [
  i,
  NODE_OPTIONS[i % NODE_OPTIONS.length],
]);

const hasSolution = (node: RandomNode): boolean => {
  let any = false;
  eachCompletion(node, (x, y) => {
    any ||= meetsAll(node.rows, x, y);
  });
  return any;
};

const randomSurrogate = ({ rows, random }: RandomNode, terms: number): Surrogate => ({
  row: Int32Array.from({ length: terms }, () => rows.convex[Math.floor(random() * rows.convex.length)]),
  weight: Float64Array.from({ length: terms }, () => random()),
  lastSaved: -1,
});

const bestSurrogate = ({ rows, open, weights, x, y, budget }: RandomNode): Surrogate => {
  const n = rows.convex.length;
  const phi = new Float64Array((open.length + 1) * n);
  rows.convex.forEach((f, j) => {
    phi[j] = rowMeasure(rows, f, x[f], y[f]);
    open.forEach((k, c) => {
      const scale = budget / weights[k];
      phi[(c + 1) * n + j] = rowMeasure(rows, f, x[f] + scale * rows.yx[k][f], y[f] + scale * rows.yy[k][f]);
    });
  });
  const game = new Game(n);
  game.solve(phi, open.length + 1);
  return { row: rows.convex, weight: game.lambda, lastSaved: -1 };
};

describe('prunes never lose a solution', () => {
  it('hull test: what it cuts has no completion, and it cuts what misses a row at every corner', () => {
    let cut = 0;
    let alive = 0;
    for (const [seed, options] of NODES) {
      const node = randomNode(seed, options);
      const hulls = buildHulls(node.rows, node.weights, node.open);
      const row = hullPrune(node.rows, hulls, node.x, node.y, node.budget, node.rows.convex.slice());
      if (row < 0) alive++;
      else {
        cut++;
        expect(hasSolution(node)).toBe(false);
      }
    }
    expect(cut).toBeGreaterThan(40);
    expect(alive).toBeGreaterThan(40);
  });

  it('surrogate test: random λ, single rows and the best λ', () => {
    const cuts = { random: 0, best: 0, hullOnly: 0 };
    for (const [seed, options] of NODES) {
      const node = randomNode(seed, options);
      const { rows, open, weights, x, y, budget } = node;
      const solvable = hasSolution(node);
      const test = (surrogate: Surrogate): boolean =>
        surrogatePrune(rows, open, weights, x, y, budget, surrogate);
      for (let t = 0; t < 20; t++) {
        if (!test(randomSurrogate(node, 1 + (t % 4)))) continue;
        cuts.random++;
        expect(solvable).toBe(false);
      }
      const byBest = test(bestSurrogate(node));
      if (byBest) {
        cuts.best++;
        expect(solvable).toBe(false);
      }
      const hulls = buildHulls(rows, weights, open);
      const byHull = hullPrune(rows, hulls, x, y, budget, rows.convex.slice()) >= 0;
      if (byHull && !byBest) cuts.hullOnly++;
    }
    expect(cuts.random).toBeGreaterThan(40);
    expect(cuts.best).toBeGreaterThan(40);
    // the best λ includes every single row, so the hull test adds nothing (up to rounding)
    expect(cuts.hullOnly).toBeLessThanOrEqual(1);
  });
});
