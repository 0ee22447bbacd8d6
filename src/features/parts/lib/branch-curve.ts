import { type Branch, branchAdmittance, lineBranch, selfResonance_Hz } from '@shared/engine/branch';
import { EngineError } from '@shared/engine/errors';
import { type PartInCorner, partIn } from '@shared/rail/in-service';
import { lineModel } from '@shared/rail/network';
import type { DocumentPart } from '@shared/schemas/rail-document.schema';
import type { Situation } from './situation';

/** One capacitor as the engine computes it: with its usual mount, or alone. */
export const partBranch = (part: PartInCorner, how: 'mounted' | 'alone'): Branch =>
  lineBranch(lineModel({}, part, { count: 1, ...(how === 'alone' && { mount_H: 0 }) }), 'part');

/** The part with the numbers that it has in a situation: the rail's own conversion, at a rail of just these conditions. */
export function partInSituation(part: DocumentPart, at: Situation): PartInCorner {
  const { voltage_V, temperature_C, age_h, capacitance, esr, esl } = at;
  const conditions = {
    coldest_C: temperature_C,
    usual_C: temperature_C,
    hottest_C: temperature_C,
    age_h,
    vary: [],
  };
  return partIn(
    part,
    { voltage_V, conditions },
    { temperature: 'usual', age: 'aged', capacitance, esr, esl },
  );
}

/** |Z| in ohm; 0 where a branch without any resistance is in resonance, which has no admittance. */
export function magnitude_ohm(branch: Branch, frequency_Hz: number, scratch = new Float64Array(4)): number {
  try {
    branchAdmittance(branch, frequency_Hz, scratch);
  } catch (error) {
    if (error instanceof EngineError && error.frequency_Hz !== undefined) return 0;
    throw error;
  }
  return 1 / Math.hypot(scratch[0], scratch[1]);
}

/** Frequencies of the points of a measured or ESR table. */
function knots_Hz(branch: Branch): number[] {
  if (branch.kind === 'table') return Array.from(branch.table.u, Math.exp);
  return branch.kind === 'lossy' ? Array.from(branch.esr.u, Math.exp) : [];
}

/**
 * |Z| over [low, high]: 40 points a decade, the bends of tables, and the self-resonance with close neighbours, so that a sharp
 * notch reaches its ESR. Without ESR the notch would fall to zero; `floor_ohm` keeps it on the paper.
 */
export function branchCurve(
  branch: Branch,
  [low_Hz, high_Hz]: readonly [number, number],
  floor_ohm: number,
): [number, number][] {
  const steps = Math.ceil(Math.log10(high_Hz / low_Hz) * 40);
  const grid = Array.from({ length: steps + 1 }, (_, i) => low_Hz * (high_Hz / low_Hz) ** (i / steps));
  const f0 = selfResonance_Hz(branch);
  const near = f0 === null ? [] : [0.99, 0.997, 1, 1.003, 1.01].map((factor) => f0 * factor);
  const more = [...near, ...knots_Hz(branch)].filter((f) => f > low_Hz && f < high_Hz);
  const scratch = new Float64Array(4);
  return [...grid, ...more]
    .sort((a, b) => a - b)
    .map((f) => [f, Math.max(floor_ohm, magnitude_ohm(branch, f, scratch))]);
}

/** Where a curve is lowest, if it rises again on both sides: the self-resonance, also of a measured table. */
export function lowestPoint(curve: readonly (readonly [number, number])[]): [number, number] | null {
  let lowest = 0;
  for (let i = 1; i < curve.length; i++) if (curve[i][1] < curve[lowest][1]) lowest = i;
  if (lowest === 0 || lowest === curve.length - 1) return null;
  return [curve[lowest][0], curve[lowest][1]];
}
