import { flatTarget, maskTarget, type TargetMask, targetFromStep } from '../engine/target';
import type { RailSpec } from '../schemas/rail-spec.schema';

/** The waterline of a rail as the engine takes it. */
export function targetMask(spec: Pick<RailSpec, 'target' | 'voltage_V'>): TargetMask {
  const { target, voltage_V } = spec;
  switch (target.kind) {
    case 'flat':
      return flatTarget(target.impedance_ohm);
    case 'step':
      return flatTarget(targetFromStep(voltage_V, target.ripple_percent, target.step_A));
    case 'mask':
      return maskTarget(target.points);
  }
}
