import {
  flatTarget,
  maskTarget,
  risingTarget,
  spectrumCorner_Hz,
  type TargetMask,
  targetFromStep,
} from '../engine/target';
import type { RailSpec } from '../schemas/rail-spec.schema';

/** The waterline of a rail as the engine takes it. */
export function targetMask(spec: Pick<RailSpec, 'target' | 'voltage_V'>): TargetMask {
  const { target, voltage_V } = spec;
  switch (target.kind) {
    case 'flat':
      return levelTarget(target.impedance_ohm, target);
    case 'step':
      return levelTarget(targetFromStep(voltage_V, target.ripple_percent, target.step_A), target);
    case 'mask':
      return maskTarget(target.points);
  }
}

function levelTarget(
  impedance_ohm: number,
  rise: { rise_s?: number | undefined; rising_H?: number | undefined },
): TargetMask {
  const corner = risesFrom_Hz(impedance_ohm, rise);
  return corner === null ? flatTarget(impedance_ohm) : risingTarget(impedance_ohm, corner);
}

/** From where a level target rises, Hz; null: nowhere. */
export function risesFrom_Hz(
  impedance_ohm: number,
  { rise_s, rising_H }: { rise_s?: number | undefined; rising_H?: number | undefined },
): number | null {
  if (rise_s !== undefined) return spectrumCorner_Hz(rise_s);
  return rising_H === undefined ? null : impedance_ohm / (2 * Math.PI * rising_H);
}
