import { tightestHeadroom } from '@shared/engine/headroom';
import type { LineModel, RailNetwork } from '@shared/engine/network';
import { compileRail } from '@shared/engine/rail';
import { flatTarget, maskTarget } from '@shared/engine/target';
import type { MixCandidate, MixProblem, Objective } from '@shared/search/problem';
import { seededRandom } from '@shared/search/random';

export interface SmallOptions {
  minimise?: Objective;
  kinds?: number;
  max?: number;
  observe?: 'pins' | 'die';
  locked?: boolean;
  mask?: boolean;
  maxKinds?: number;
  withMinimum?: boolean;
  /** Target over what a random mix reaches; below 1 the case may have no solution. */
  ease?: number;
}

/**
 * A small made-up search with a known feasible mix: random R–L–C parts, a random mix of them, and a target a little above
 * that mix's worst |Z|. The same seed gives the same problem.
 */
export function smallSearch(seed: number, options: SmallOptions = {}): MixProblem {
  const random = seededRandom(seed);
  const between = (a: number, b: number): number => a * (b / a) ** random();
  const kinds = options.kinds ?? 5;
  const max = options.max ?? 4;
  const line = (id: string, c: number): LineModel => ({
    id,
    count: 0,
    capacitance_F: c,
    esr_ohm: between(0.003, 0.03),
    inductance_H: between(3e-10, 2e-9),
  });
  const candidates = Array.from({ length: kinds }, (_, k): MixCandidate => {
    const c = between(2e-8, 2e-7) * 10 ** ((3 * k) / kinds);
    const min = options.withMinimum && k === 1 ? 1 : 0;
    return {
      id: `part-${k}`,
      line: line(`part-${k}`, c),
      cost: Math.round(between(4, 80)) / 1000,
      area_mm2: between(0.3, 9),
      min,
      max,
    };
  });
  const network: RailNetwork = {
    source: { kind: 'rl', resistance_ohm: 0.001, inductance_H: between(5e-9, 4e-8) },
    plane: { capacitance_F: 2e-9, resistance_ohm: 0.001, inductance_H: 1e-11 },
    lines: options.locked ? [{ ...line('locked', 1e-5), count: 2 }] : [],
    observe: options.observe ?? 'pins',
    package: {
      resistance_ohm: 0.0005,
      inductance_H: between(1e-11, 4e-11),
      die_capacitance_F: between(5e-9, 5e-8),
      die_resistance_ohm: 0.004,
    },
  };
  const band_Hz: [number, number] = [2e4, options.observe === 'die' ? 1.5e7 : 2e7];
  const used = new Set<number>();
  const mix = candidates.map((c, k): LineModel => {
    const isAllowed = used.size < (options.maxKinds ?? kinds) || (c.min ?? 0) > 0;
    const count = isAllowed ? Math.max(c.min ?? 0, Math.floor(random() * (max + 1))) : 0;
    if (count > 0) used.add(k);
    return { ...c.line, count };
  });
  const rail = compileRail({ ...network, lines: [...network.lines, ...mix] });
  const mask = (ohm: number) =>
    options.mask
      ? maskTarget([
          [1e5, ohm],
          [2e6, 0.8 * ohm],
          [1e7, 1.6 * ohm],
        ])
      : flatTarget(ohm);
  const unit = tightestHeadroom(rail, band_Hz, mask(1));
  const target = mask((unit.impedance_ohm / unit.target_ohm) * (options.ease ?? 1.02));
  return {
    network,
    candidates,
    band_Hz,
    target,
    minimise: options.minimise ?? 'parts',
    maxKinds: options.maxKinds,
  };
}
