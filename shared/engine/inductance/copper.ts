import { MU0_H_PER_M } from '../constants';
import { EngineError } from '../errors';
import { notNegative, positive } from './checks';

/** Annealed copper at 20 °C: 58 MS/m (IEC 60028, 1925), and its rise per kelvin. */
export const COPPER_OHM_M = 1 / 58e6;
export const COPPER_PER_K = 0.00393;
/** Density of copper, kg/m³ (handbook). */
const COPPER_KG_PER_M3 = 8960;
const OUNCE_KG = 0.028349523125;
const FOOT_M = 0.3048;

/** Resistivity of copper in ohm metre at a temperature in °C: ρ₂₀·(1 + α(T − 20)), linear (IEC 60028). EngineError below −200 °C, where it no longer holds. */
export function copperResistivity_ohmM(temperature_C: number): number {
  if (!(temperature_C >= -200) || !Number.isFinite(temperature_C))
    throw new EngineError('temperature_C', 'must be a temperature of at least −200 °C');
  return COPPER_OHM_M * (1 + COPPER_PER_K * (temperature_C - 20));
}

/** Depth in metres at which the current has fallen to 1/e: √(ρ/(πfμ₀)), hertz and ohm metre. EngineError for zero or less. */
export const skinDepth_m = (frequency_Hz: number, resistivity_ohmM = COPPER_OHM_M): number =>
  Math.sqrt(
    positive('resistivity_ohmM', resistivity_ohmM) /
      (Math.PI * positive('frequency_Hz', frequency_Hz) * MU0_H_PER_M),
  );

/** Resistance in ohm per square of a conductor many skin depths thick: ρ/δ = √(πfμ₀ρ). EngineError for zero or less. */
export const surfaceResistance_ohm = (frequency_Hz: number, resistivity_ohmM = COPPER_OHM_M): number =>
  resistivity_ohmM / skinDepth_m(frequency_Hz, resistivity_ohmM);

/** Direct-current resistance of a foil in ohm per square: ρ/t, thickness in metres. EngineError for zero or less. */
export const sheetResistance_ohm = (thickness_m: number, resistivity_ohmM = COPPER_OHM_M): number =>
  positive('resistivity_ohmM', resistivity_ohmM) / positive('thickness_m', thickness_m);

/** Resistance in ohm of a strip: ohms per square × length/width, metres. EngineError for a width or sheet of zero or less. */
export const stripResistance_ohm = (sheet_ohm: number, length_m: number, width_m: number): number =>
  (positive('sheet_ohm', sheet_ohm) * notNegative('length_m', length_m)) / positive('width_m', width_m);

/** Thickness in metres of copper foil of a weight in ounces a square foot: 1 oz is 34.1 µm. EngineError for zero or less. */
export const foilThickness_m = (ounces_perFt2: number): number =>
  (positive('ounces_perFt2', ounces_perFt2) * OUNCE_KG) / (FOOT_M * FOOT_M * COPPER_KG_PER_M3);
