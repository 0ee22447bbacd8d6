import { formatLength } from '../../units/format';
import { EngineError } from '../errors';
import { notNegative, positive, wholeCount } from './checks';
import { microstrip_HPerM } from './microstrip';
import { parallelPairs_H, viaPair_H } from './via';

/** A way to mount a capacitor: from each of its two pads a trace to a via down to its plane, or several pairs of vias. */
export interface MountShape {
  /** From the pad's edge to the via's centre, on each side; 0: via in the pad. */
  readonly trace_length_m: number;
  readonly trace_width_m: number;
  readonly via_drill_m: number;
  /** Centre to centre of the two vias of a pair. */
  readonly via_spacing_m: number;
  readonly via_pairs: number;
  /** Mutual inductance between pairs as a share of one pair's own, 0 … 1. */
  readonly coupling: number;
}

/** One part of the mount's loop. */
export interface MountSegment {
  part: 'traces' | 'vias';
  inductance_H: number;
  /** Of the whole, 0 … 1. */
  share: number;
  /** The sum in plain text with its numbers. */
  formula: string;
  source: string;
}

export interface Mount {
  total_H: number;
  segments: MountSegment[];
}

/**
 * Loop inductance in henry of a mount: both traces over the plane nearest to that side (`traceHeight_m` above it), and the vias
 * down to the nearer plane of the rail's pair (`viaDepth_m`; 0 when that plane is the outer copper itself). Traces first, then
 * vias. Throws EngineError naming the recipe's field, `traceHeight_m` or `viaDepth_m`.
 */
export function mountInductance(
  recipe: MountShape,
  { traceHeight_m, viaDepth_m }: { traceHeight_m: number; viaDepth_m: number },
): Mount {
  check(recipe);
  positive('traceHeight_m', traceHeight_m);
  notNegative('viaDepth_m', viaDepth_m);
  const {
    trace_length_m: l,
    trace_width_m: w,
    via_drill_m: d,
    via_spacing_m: s,
    via_pairs: n,
    coupling,
  } = recipe;
  const traces_H = 2 * l * microstrip_HPerM(w, traceHeight_m);
  const vias_H = viaDepth_m === 0 ? 0 : parallelPairs_H(viaPair_H(viaDepth_m, s, d), n, coupling);
  const total_H = traces_H + vias_H;
  const share = (inductance_H: number) => (total_H > 0 ? inductance_H / total_H : 0);
  const pair = `μ₀/π · ${formatLength(viaDepth_m)} · acosh(${formatLength(s)} / ${formatLength(d)})`;
  return {
    total_H,
    segments: [
      {
        part: 'traces',
        inductance_H: traces_H,
        share: share(traces_H),
        formula: `2 · ${formatLength(l)} · L′(w ${formatLength(w)}, h ${formatLength(traceHeight_m)})`,
        source: 'microstrip in air, Hammerstad and Jensen 1980',
      },
      {
        part: 'vias',
        inductance_H: vias_H,
        share: share(vias_H),
        formula: n === 1 ? pair : `${pair} · (1 + ${n - 1} · ${coupling}) / ${n}`,
        source: 'two round wires with opposite currents',
      },
    ],
  };
}

function check(recipe: MountShape): void {
  notNegative('trace_length_m', recipe.trace_length_m);
  positive('trace_width_m', recipe.trace_width_m);
  positive('via_drill_m', recipe.via_drill_m);
  if (!(positive('via_spacing_m', recipe.via_spacing_m) > recipe.via_drill_m))
    throw new EngineError('via_spacing_m', 'must be wider than the drill');
  wholeCount('via_pairs', recipe.via_pairs);
  if (notNegative('coupling', recipe.coupling) > 1) throw new EngineError('coupling', 'must be at most 1');
}
