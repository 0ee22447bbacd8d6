import { holds, tightestHeadroom } from '@shared/engine/headroom';
import type { LineModel } from '@shared/engine/network';
import { compileRail, railImpedance } from '@shared/engine/rail';
import { targetAt } from '@shared/engine/target';
import type { MixEntry, MixProblem } from '@shared/search/problem';

/** What a mix weighs under the problem's objective. */
export function weightOfMix(problem: MixProblem, mix: readonly MixEntry[]): number {
  return mix.reduce((sum, { id, count }) => {
    const candidate = problem.candidates.find((c) => c.id === id)!;
    const weights = { parts: 1, cost: candidate.cost!, area: candidate.area_mm2! };
    return sum + count * weights[problem.minimise];
  }, 0);
}

/** The engine's own word on a mix: locked lines and the mix in one rail, refined peaks. */
export function mixHolds(problem: MixProblem, counts: readonly number[]): boolean {
  const lines = problem.candidates.map((c, k): LineModel => ({ ...c.line, count: counts[k] }));
  const rail = compileRail({ ...problem.network, lines: [...problem.network.lines, ...lines] });
  return holds(tightestHeadroom(rail, problem.band_Hz, problem.target));
}

/**
 * The lightest weight by trying every combination of counts, lightest first: a few frequencies by the engine's formula to
 * throw out most, then the engine's refined peaks. Shares nothing with the search but the engine. Null: none holds.
 */
export function lightestByEnumeration(problem: MixProblem): number | null {
  const { candidates, network } = problem;
  const combinations: { counts: number[]; weight: number }[] = [];
  const fill = (k: number, counts: number[]): void => {
    if (k === candidates.length) {
      const kinds = counts.filter((n) => n > 0).length;
      if (kinds > (problem.maxKinds ?? candidates.length)) return;
      const mix = candidates.map((c, i) => ({ id: c.id, count: counts[i] }));
      combinations.push({ counts: [...counts], weight: weightOfMix(problem, mix) });
      return;
    }
    for (let n = candidates[k].min ?? 0; n <= candidates[k].max!; n++) fill(k + 1, [...counts, n]);
  };
  fill(0, []);
  combinations.sort((a, b) => a.weight - b.weight);
  const lines = candidates.map((c): LineModel => ({ ...c.line, count: 1 }));
  const rail = compileRail({ ...network, lines: [...network.lines, ...lines] });
  const first = rail.members.findIndex((m) => m.line === network.lines.length);
  const [low, high] = problem.band_Hz;
  const probes = Array.from({ length: 41 }, (_, i) => low * (high / low) ** (i / 40));
  const targets = probes.map((f) => targetAt(problem.target, f));
  const out = new Float64Array(4);
  let order = probes.map((_, i) => i);
  for (const { counts, weight } of combinations) {
    counts.forEach((n, k) => {
      rail.members[first + k].count = n;
    });
    const breaks = order.find((i) => {
      railImpedance(rail, probes[i], out);
      return Math.hypot(out[0], out[1]) > targets[i] * (1 + 1e-8);
    });
    if (breaks !== undefined) order = [breaks, ...order.filter((i) => i !== breaks)];
    else if (mixHolds(problem, counts)) return weight;
  }
  return null;
}
