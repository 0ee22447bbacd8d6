import { branchAdmittance } from './branch';
import type { PackageModel } from './network';
import type { CompiledRail } from './rail';
import { type TargetMask, targetAt } from './target';

const PER_DECADE = 100;
const HALVINGS = 60;

/**
 * The frequency from which the package's inductance alone (2πf·L) lies above the target: beyond it no bank on the board, however
 * large, keeps the die under the waterline; what is left to help sits on the die. null where that is nowhere in the band.
 */
export function packageReach_Hz(
  model: Pick<PackageModel, 'inductance_H'>,
  [low, high]: readonly [number, number],
  target: TargetMask,
): number | null {
  const over = (f: number) => 2 * Math.PI * f * model.inductance_H > targetAt(target, f);
  if (over(low)) return low;
  const steps = Math.max(2, Math.ceil(Math.log10(high / low) * PER_DECADE));
  let below = low;
  for (let i = 1; i <= steps; i++) {
    let above = i === steps ? high : low * (high / low) ** (i / steps);
    if (!over(above)) {
      below = above;
      continue;
    }
    for (let k = 0; k < HALVINGS && above / below > 1 + 1e-12; k++) {
      const middle = Math.sqrt(below * above);
      if (over(middle)) above = middle;
      else below = middle;
    }
    return above;
  }
  return null;
}

/**
 * |Z| in ohm that the die would see if the board were a perfect short at the pins: package and die alone. No bank gets lower, but for
 * resonance with the die. null unless the rail is looked at from the die.
 */
export function boardShorted(rail: CompiledRail, frequency_Hz: Float64Array): Float64Array | null {
  const { view } = rail;
  if (!view) return null;
  const out = new Float64Array(4);
  return frequency_Hz.map((f) => {
    const x = 2 * Math.PI * f * view.l;
    const z2 = view.r * view.r + x * x;
    if (z2 === 0) return 0;
    let g = view.r / z2;
    let b = -x / z2;
    if (view.die) {
      branchAdmittance(view.die, f, out, 'die');
      g += out[0];
      b += out[1];
    }
    return 1 / Math.sqrt(g * g + b * b);
  });
}
