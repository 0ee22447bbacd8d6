import { type RailSpec, rippleLeft_percent } from '../schemas/rail-spec.schema';

/** Ripple in volt that the bank may use: what the noise budget leaves, or the target's own ripple; null where neither is given. */
export function allowance_V(spec: Pick<RailSpec, 'target' | 'voltage_V' | 'noise_budget'>): number | null {
  if (spec.noise_budget)
    return (rippleLeft_percent(spec.noise_budget, spec.voltage_V) / 100) * spec.voltage_V;
  return spec.target.kind === 'step' ? (spec.target.ripple_percent / 100) * spec.voltage_V : null;
}

export type LoadStepSpec = NonNullable<RailSpec['load_step']>;

/** Lengths of the band's lowest period for which a step that is not described is held: long enough to see it settle. */
const HELD_PERIODS = 3;

/**
 * The load step that a rail is tried with: its described one, else the target's step with edges as fast as the band is wide
 * (`assumed`); null where neither says how large the load is.
 */
export function loadStepOf(spec: RailSpec): { step: LoadStepSpec; assumed: boolean } | null {
  if (spec.load_step) return { step: spec.load_step, assumed: false };
  if (spec.target.kind !== 'step') return null;
  const rise_s = spec.target.rise_s ?? spec.band_basis?.rise_s ?? EDGE / spec.band_Hz[1];
  const step = {
    before_A: 0,
    step_A: spec.target.step_A,
    rise_s,
    hold_s: HELD_PERIODS / spec.band_Hz[0],
    fall_s: rise_s,
  };
  return { step, assumed: true };
}

/** Rise time × bandwidth of a single pole, 10 to 90 % (common practice, as the band's knee). */
const EDGE = 0.35;
