import { prepare } from '@shared/search/prepare';
import { Programme } from '@shared/search/programme';
import { seededRandom } from '@shared/search/random';
import { buildRows } from '@shared/search/rows';
import { directionRange, sectorWorth, splitSector } from '@shared/search/sector';
import { SectorTree } from '@shared/search/sector-tree';
import { describe, expect, it } from 'vitest';
import { lightestByEnumeration } from '../helpers/enumerate-mixes';
import { type SmallOptions, smallSearch } from '../helpers/small-search';

describe('programme', () => {
  it('cuts only when no weighting of the corners meets all conditions, and does when that is clear', () => {
    const random = seededRandom(11);
    const seen = { cut: 0, open: 0 };
    for (let round = 0; round < 400; round++) {
      const corners = 2 + Math.floor(4 * random());
      const conditions = 1 + Math.floor(8 * random());
      const worth = Array.from({ length: conditions }, () =>
        Float64Array.from({ length: corners }, () => (random() - 0.6) * 3),
      );
      const programme = new Programme(corners);
      for (const w of worth) programme.add(w, 0);
      const answer = programme.solve();
      seen[answer]++;
      let best = Number.NEGATIVE_INFINITY;
      for (let t = 0; t < 400; t++) {
        const mix = Array.from({ length: corners }, () => random() ** 3);
        const sum = mix.reduce((a, b) => a + b, 0);
        const least = Math.min(...worth.map((w) => w.reduce((a, v, c) => a + (v * mix[c]) / sum, 0)));
        best = Math.max(best, least);
      }
      if (answer === 'cut') expect(best).toBeLessThan(0);
      if (best >= 0) expect(answer).toBe('open');
    }
    expect(seen.cut).toBeGreaterThan(50);
    expect(seen.open).toBeGreaterThan(50);
  });

  it('goes on from a stored state as from scratch', () => {
    const random = seededRandom(12);
    for (let round = 0; round < 100; round++) {
      const column = () => Float64Array.from({ length: 6 }, () => (random() - 0.55) * 2);
      const first = Array.from({ length: 8 }, column);
      const more = Array.from({ length: 3 }, column);
      const warm = new Programme(6);
      for (const c of first) warm.add(c, 0);
      warm.solve();
      const store = new Float64Array(warm.stateSize);
      warm.save(store);
      warm.add(column(), 0);
      warm.solve();
      warm.truncate(first.length);
      warm.load(store);
      for (const c of more) warm.add(c, 0);
      const cold = new Programme(6);
      for (const c of [...first, ...more]) cold.add(c, 0);
      expect(warm.solve()).toBe(cold.solve());
    }
  });
});

describe('sectors', () => {
  const random = seededRandom(13);
  it('cover the range, and their three conditions hold for what lies in them outside the disk', () => {
    const out = new Float64Array(3);
    for (let round = 0; round < 2000; round++) {
      const points = Float64Array.from({ length: 12 }, () => 2 * random() - (round % 2 ? 0.1 : 1));
      const range = directionRange(points);
      const sectors = splitSector(range, Math.PI / 3);
      const mix = Array.from({ length: 6 }, () => random() ** 2);
      let ux = 0;
      let uy = 0;
      for (let c = 0; c < 6; c++) {
        ux += mix[c] * points[2 * c];
        uy += mix[c] * points[2 * c + 1];
      }
      const size = Math.hypot(ux, uy);
      // any point in that direction on or beyond the circle
      const stretch = Math.max(1, size) / size;
      const covered = sectors.some((sector) => {
        sectorWorth(sector, ux * stretch, uy * stretch, out);
        return out.every((v) => v >= -1e-9);
      });
      expect(covered).toBe(true);
    }
  });
});

describe('the sectors’ tree', () => {
  const OPTIONS: SmallOptions[] = [
    { kinds: 4, max: 5 },
    { kinds: 4, max: 6, observe: 'die' },
    { kinds: 3, max: 9, mask: true },
    { kinds: 4, max: 5, maxKinds: 2 },
    { kinds: 4, max: 5, minimise: 'cost', withMinimum: true },
    { kinds: 4, max: 5, minimise: 'area', locked: true },
  ];
  it('is empty only below the lightest weight', () => {
    const answers = { done: 0, found: 0, stuck: 0, more: 0 };
    for (let seed = 0; seed < 60; seed++) {
      const problem = smallSearch(500 + seed, OPTIONS[seed % OPTIONS.length]);
      const lightest = lightestByEnumeration(problem);
      if (lightest === null) continue;
      const prepared = prepare(problem);
      const [low, high] = problem.band_Hz;
      const rows = buildRows(
        prepared,
        Array.from({ length: 50 }, (_, i) => low * (high / low) ** (i / 49)),
      );
      const tree = new SectorTree(prepared, rows);
      for (const share of [0.4, 0.8, 1]) {
        const weight = (share * lightest) / prepared.unit;
        tree.start(prepared.step === 1 ? Math.round(weight) : weight * (1 + 1e-9), rows);
        const state = tree.run(3000);
        answers[state]++;
        if (share === 1) expect(state).not.toBe('done');
      }
    }
    expect(answers.done).toBeGreaterThan(50);
    expect(answers.found).toBeGreaterThan(20);
  });
});
