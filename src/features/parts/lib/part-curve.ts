import { selfResonance_Hz, seriesBranch } from '@shared/engine/branch';
import type { Part } from '@shared/schemas/part.schema';

type Values = Pick<Part, 'capacitance_F' | 'esr_ohm' | 'esl_H'>;

/** |Z| of R + jωL + 1/(jωC) in ohm. */
export function seriesMagnitude(
  { capacitance_F, esr_ohm }: Values,
  inductance_H: number,
  frequency_Hz: number,
): number {
  const omega = 2 * Math.PI * frequency_Hz;
  return Math.hypot(esr_ohm, omega * inductance_H - 1 / (omega * capacitance_F));
}

/** Self-resonance 1/(2π√(LC)) in Hz; null without inductance. */
export const resonance_Hz = (part: Values, inductance_H: number): number | null =>
  selfResonance_Hz(
    seriesBranch({ resistance_ohm: part.esr_ohm, inductance_H, capacitance_F: part.capacitance_F }, 'part'),
  );

/**
 * |Z| over [low, high]: 40 points a decade, and the self-resonance itself with close neighbours, so that a sharp notch
 * reaches its ESR. Without ESR the notch would fall to zero; `floor_ohm` keeps it on the paper.
 */
export function partCurve(
  part: Values,
  inductance_H: number,
  [low_Hz, high_Hz]: readonly [number, number],
  floor_ohm: number,
): [number, number][] {
  const steps = Math.ceil(Math.log10(high_Hz / low_Hz) * 40);
  const grid = Array.from({ length: steps + 1 }, (_, i) => low_Hz * (high_Hz / low_Hz) ** (i / steps));
  const f0 = resonance_Hz(part, inductance_H);
  if (f0 !== null && f0 > low_Hz && f0 < high_Hz)
    grid.push(...[0.99, 0.997, 1, 1.003, 1.01].map((factor) => f0 * factor));
  grid.sort((a, b) => a - b);
  return grid.map((f) => [f, Math.max(floor_ohm, seriesMagnitude(part, inductance_H, f))]);
}
