import type { Conditions } from '@shared/schemas/rail-spec.schema';

/** The specification as it is typed: text everywhere, so that nothing typed is ever lost. */
export interface SpecForm {
  name: string;
  voltage: string;
  targetKind: 'step' | 'flat' | 'mask';
  ripple: string;
  step: string;
  impedance: string;
  mask: string;
  riseKind: 'level' | 'time' | 'inductance';
  targetRise: string;
  targetInductance: string;
  budgetKind: 'none' | 'budget';
  tolerance: string;
  setpoint: string;
  dcDrop: string;
  regulatorRipple: string;
  bandKind: 'direct' | 'derived';
  bandLow: string;
  bandHigh: string;
  rise: string;
  knee: '0.35' | '0.5';
  bandwidth: string;
  sourceKind: 'rl' | 'damped' | 'table' | 'open';
  resistance: string;
  inductance: string;
  seriesResistance: string;
  seriesInductance: string;
  inductorResistance: string;
  inductorInductance: string;
  dampingResistance: string;
  dampingInductance: string;
  sourceTable: string;
  planeKind: 'none' | 'stackup' | 'dimensions' | 'values';
  /** The chosen pair of the stack-up's layers; both empty: none yet. */
  pairUpper: string;
  pairLower: string;
  length: string;
  width: string;
  spacing: string;
  permittivity: string;
  viaRadius: string;
  loadRadius: string;
  planeCapacitance: string;
  planeResistance: string;
  planeInductance: string;
  hasPackage: boolean;
  packageResistance: string;
  packageInductance: string;
  dieCapacitance: string;
  dieResistance: string;
  observe: 'pins' | 'die';
  hasStep: boolean;
  stepBefore: string;
  stepSize: string;
  stepRise: string;
  stepHold: string;
  stepFall: string;
  /** When the simulation ends: not typed here, only kept where a document says it. */
  stepEnd: string;
  hasStartUp: boolean;
  softStart: string;
  currentLimit: string;
  conditionsKind: 'assumed' | 'stated';
  coldest: string;
  usual: string;
  hottest: string;
  age: string;
  vary: Conditions['vary'];
}

export type SpecField = keyof SpecForm;
export type SpecErrors = Partial<Record<SpecField | 'form', string>>;
