import { describe, expect, it } from 'vitest';
import { Game } from './game';
import { seededRandom } from './random';

const gameValue = (phi: Float64Array, lambda: Float64Array, corners: number): number => {
  const n = lambda.length;
  let value = Number.NEGATIVE_INFINITY;
  for (let c = 0; c < corners; c++) {
    let sum = 0;
    for (let f = 0; f < n; f++) sum += lambda[f] * phi[c * n + f];
    value = Math.max(value, sum);
  }
  return value;
};

describe('Game', () => {
  it('solves rock, paper, scissors', () => {
    const game = new Game(3);
    game.solve(Float64Array.of(0, 1, -1, -1, 0, 1, 1, -1, 0), 3);
    for (const l of game.lambda) expect(l).toBeCloseTo(1 / 3, 9);
  });

  it('beats every pure and many mixed choices on random matrices', () => {
    const random = seededRandom(3);
    for (let round = 0; round < 50; round++) {
      const n = 4 + Math.floor(20 * random());
      const corners = 2 + Math.floor(8 * random());
      const phi = Float64Array.from({ length: n * corners }, () => 4 * random() - 2);
      const game = new Game(n);
      game.solve(phi, corners, 200);
      const best = gameValue(phi, game.lambda, corners);
      expect(game.lambda.every((l) => l >= 0)).toBe(true);
      expect(game.lambda.reduce((a, b) => a + b, 0)).toBeCloseTo(1, 9);
      for (let t = 0; t < 50; t++) {
        const other = Float64Array.from({ length: n }, () => random() ** 6);
        const sum = other.reduce((a, b) => a + b, 0);
        expect(best).toBeLessThanOrEqual(
          gameValue(
            phi,
            other.map((l) => l / sum),
            corners,
          ) + 1e-9,
        );
      }
    }
  });
});
