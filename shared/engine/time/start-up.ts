import { EngineError } from '../errors';

/** A rail that is ramped up from zero in `soft_start_s`, with all its capacitance. */
export interface StartUpInput {
  capacitance_F: number;
  voltage_V: number;
  soft_start_s: number;
  /** What the regulator gives before it limits, if that is known. */
  current_limit_A?: number;
}

export interface StartUp {
  /** Q = C·V and E = C·V²/2 of the charged bank. */
  charge_C: number;
  energy_J: number;
  /** Charging current of a straight ramp, I = C·dV/dt; the load's own comes on top. */
  current_A: number;
  /** Whether that is within the limit, and the shortest soft start that is: C·V/I. null when no limit is given. */
  within_limit: boolean | null;
  needed_s: number | null;
}

/** Charging a bank at start-up. Throws EngineError naming the field of `start_up` that is negative, zero where it must not be, or not finite. */
export function startUp(input: StartUpInput): StartUp {
  const capacitance_F = notNegative(input.capacitance_F, 'start_up.capacitance_F');
  const voltage_V = notNegative(input.voltage_V, 'start_up.voltage_V');
  const soft_start_s = aboveZero(input.soft_start_s, 'start_up.soft_start_s');
  const charge_C = capacitance_F * voltage_V;
  const current_A = charge_C / soft_start_s;
  const charging = { charge_C, energy_J: 0.5 * charge_C * voltage_V, current_A };
  if (input.current_limit_A === undefined) return { ...charging, within_limit: null, needed_s: null };
  const limit_A = aboveZero(input.current_limit_A, 'start_up.current_limit_A');
  return { ...charging, within_limit: current_A <= limit_A, needed_s: charge_C / limit_A };
}

/** Peak current in ampere when an empty bank is connected at once through `resistance_ohm`: V/R. */
export const hotPlugCurrent = (voltage_V: number, resistance_ohm: number): number =>
  notNegative(voltage_V, 'voltage_V') / aboveZero(resistance_ohm, 'resistance_ohm');

/** Seconds in which a resistor takes a capacitor from one voltage down to another: R·C·ln(V₀/V). */
export function dischargeTime(
  capacitance_F: number,
  resistance_ohm: number,
  from_V: number,
  to_V: number,
): number {
  const start_V = aboveZero(from_V, 'from_V');
  const end_V = aboveZero(to_V, 'to_V');
  if (end_V > start_V) throw new EngineError('to_V', 'must not be above the voltage it starts from');
  const constant_s =
    notNegative(capacitance_F, 'capacitance_F') * notNegative(resistance_ohm, 'resistance_ohm');
  return constant_s * Math.log(start_V / end_V);
}

/** Voltage in volts that a resistor leaves on a capacitor after `after_s`: V₀·e^{−t/RC}. */
export function voltageLeft(
  capacitance_F: number,
  resistance_ohm: number,
  from_V: number,
  after_s: number,
): number {
  const constant_s = aboveZero(capacitance_F, 'capacitance_F') * aboveZero(resistance_ohm, 'resistance_ohm');
  return notNegative(from_V, 'from_V') * Math.exp(-notNegative(after_s, 'after_s') / constant_s);
}

function notNegative(value: number, field: string): number {
  if (!(value >= 0) || !Number.isFinite(value))
    throw new EngineError(field, 'must be a finite number and not negative');
  return value;
}

function aboveZero(value: number, field: string): number {
  if (!(value > 0) || !Number.isFinite(value)) throw new EngineError(field, 'must be above zero and finite');
  return value;
}
