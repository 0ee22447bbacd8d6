import { planeCapacitance } from '@shared/engine/plane';
import { kneeFrequency } from '@shared/engine/target';
import type { BankLine } from '@shared/schemas/rail.schema';
import type { BandBasis, Conditions, Plane, PlaneGeometry, RailSpec } from '@shared/schemas/rail-spec.schema';

export interface DemoLine extends Omit<BankLine, 'partId'> {
  partNumber: string;
}

export interface DemoRail {
  spec: RailSpec;
  bank: DemoLine[];
  /** What the bank was when revision A was cut, where it differs. */
  firstBank?: DemoLine[];
  /** Parts that the search may use, where the engineer has made a choice. */
  candidates?: string[];
}

const metres = (millimetres: number): number => millimetres / 1000;

function plane(
  length_mm: number,
  width_mm: number,
  spacing_mm: number,
  resistance_ohm: number,
  pair?: PlaneGeometry['pair'],
): Plane {
  const geometry: PlaneGeometry = {
    length_m: metres(length_mm),
    width_m: metres(width_mm),
    spacing_m: metres(spacing_mm),
    relative_permittivity: 4.1,
    via_radius_m: metres(0.15),
    load_radius_m: metres(1.5),
    ...(pair && { pair }),
  };
  return {
    capacitance_F: planeCapacitance(
      geometry.length_m,
      geometry.width_m,
      geometry.spacing_m,
      geometry.relative_permittivity,
    ),
    resistance_ohm,
    inductance_H: 8e-12,
    geometry,
  };
}

/** A band with what it was found from, as the specification form makes it. */
const derivedBand = (band_basis: BandBasis): Pick<RailSpec, 'band_Hz' | 'band_basis'> => ({
  band_Hz: [band_basis.regulator_bandwidth_Hz, kneeFrequency(band_basis.rise_s, band_basis.knee)],
  band_basis,
});

/** In a cabinet by the water: frost to summer sun, ten years. */
const cabinet: Conditions = {
  coldest_C: -20,
  usual_C: 50,
  hottest_C: 85,
  age_h: 87_660,
  vary: ['capacitance', 'esr', 'esl'],
};

const line = (
  partNumber: string,
  count: number,
  distance_mm: number | null,
  side: BankLine['side'] = 'bottom',
  locked = false,
): DemoLine => ({
  partNumber,
  count,
  mount_H: null,
  recipeId: null,
  distance_m: distance_mm === null ? null : metres(distance_mm),
  side,
  locked,
});

/** From short to easy, so that there is something to fix and something to see. */
export const demoRails: DemoRail[] = [
  {
    spec: {
      name: 'VDD_CORE',
      voltage_V: 0.85,
      target: { kind: 'step', ripple_percent: 3, step_A: 10 },
      ...derivedBand({ rise_s: 35e-9, knee: 0.35, regulator_bandwidth_Hz: 10e3 }),
      source: {
        kind: 'damped',
        series_resistance_ohm: 0.0004,
        series_inductance_H: 0,
        inductor_resistance_ohm: 0.0002,
        inductance_H: 9e-9,
        damping_ohm: 0.005,
        damping_inductance_H: 0,
      },
      plane: plane(52, 40, 0.1, 0.0006, ['L2 gnd', 'L3 core']),
      observe: 'pins',
      load_step: { before_A: 2, step_A: 10, rise_s: 35e-9, hold_s: 60e-6, fall_s: 35e-9 },
      conditions: cabinet,
      noise_budget: {
        tolerance_percent: 5,
        setpoint_percent: 1,
        dc_drop_V: 0.005,
        regulator_ripple_V: 0.0035,
      },
      start_up: { soft_start_s: 1e-3, current_limit_A: 15 },
    },
    candidates: [
      'AB-P7343-470U-2V5-6M',
      'AB-P7343-330U-4-7M',
      'AB-C1210-X5R-100U-6V3',
      'AB-C0805-X5R-47U-6V3',
      'AB-C0603-X6S-22U-4',
      'AB-C0603-X6S-10U-6V3',
      'AB-C0402-X5R-10U-4',
      'AB-C0402-X5R-4U7-6V3',
      'AB-C0402-X6S-2U2-6V3',
      'AB-C0402-X6S-1U-10',
      'AB-C0402-X7R-470N-10',
      'AB-C0402-X7R-220N-16',
      'AB-C0402-X7R-100N-16',
      'AB-C0201-X6S-1U-4',
      'AB-C0201-X5R-470N-6V3',
    ],
    bank: [
      line('AB-P7343-470U-2V5-6M', 4, 24, 'top'),
      line('AB-C0603-X6S-22U-4', 2, 14),
      line('AB-C0402-X6S-2U2-6V3', 5, 8),
      line('AB-C0402-X7R-470N-10', 4, 6),
    ],
    firstBank: [
      line('AB-P7343-470U-2V5-6M', 5, 24, 'top'),
      line('AB-C0603-X6S-22U-4', 4, 14),
      line('AB-C0402-X6S-2U2-6V3', 10, 8),
      line('AB-C0402-X7R-470N-10', 7, 6),
    ],
  },
  {
    spec: {
      name: 'VDD_DDR',
      voltage_V: 1.1,
      target: { kind: 'flat', impedance_ohm: 0.009 },
      band_Hz: [10e3, 28e6],
      source: { kind: 'rl', resistance_ohm: 0.0009, inductance_H: 12e-9 },
      plane: plane(46, 28, 0.2, 0.0008, ['L6 memory', 'L7 gnd']),
      package: {
        resistance_ohm: 0.004,
        inductance_H: 60e-12,
        die_capacitance_F: 12e-9,
        die_resistance_ohm: 0.006,
      },
      observe: 'pins',
      load_step: { before_A: 0.5, step_A: 3, rise_s: 20e-9, hold_s: 40e-6, fall_s: 20e-9 },
      conditions: cabinet,
      noise_budget: {
        tolerance_percent: 5,
        setpoint_percent: 1,
        dc_drop_V: 0.006,
        regulator_ripple_V: 0.004,
      },
      // Charging the bank so fast takes more than the regulator gives: the bench says how slow it must be.
      start_up: { soft_start_s: 0.2e-3, current_limit_A: 4 },
    },
    bank: [
      line('AB-P7343-330U-4-7M', 2, 22, 'top'),
      line('AB-C0603-X6S-22U-4', 5, 14),
      line('AB-C0402-X6S-2U2-6V3', 8, 8),
      line('AB-C0402-X7R-220N-16', 7, 6),
    ],
  },
  {
    spec: {
      name: 'VDD_IO',
      voltage_V: 1.8,
      target: { kind: 'step', ripple_percent: 5, step_A: 3 },
      band_Hz: [10e3, 30e6],
      source: { kind: 'rl', resistance_ohm: 0.002, inductance_H: 40e-9 },
      plane: plane(60, 44, 0.4, 0.001),
      observe: 'pins',
      conditions: cabinet,
      start_up: { soft_start_s: 1e-3, current_limit_A: 2 },
    },
    bank: [
      line('AB-P7343-220U-6V3-9M', 1, 30, 'top'),
      line('AB-C0603-X6S-10U-6V3', 3, 16),
      line('AB-C0402-X6S-1U-10', 6, 9),
    ],
  },
  // Stays under its mask at every frequency, yet a load that plays on its resonances swings it too far.
  {
    spec: {
      name: 'VDD_SERDES',
      voltage_V: 0.9,
      target: {
        kind: 'mask',
        points: [
          [10e3, 0.012],
          [1e6, 0.012],
          [10e6, 0.02],
          [40e6, 0.06],
        ],
      },
      band_Hz: [10e3, 40e6],
      source: { kind: 'rl', resistance_ohm: 0.0015, inductance_H: 10e-9 },
      plane: plane(30, 18, 0.1, 0.0012),
      observe: 'pins',
      load_step: { before_A: 0.3, step_A: 2, rise_s: 10e-9, hold_s: 20e-6, fall_s: 10e-9 },
      conditions: cabinet,
      noise_budget: {
        tolerance_percent: 5,
        setpoint_percent: 1,
        dc_drop_V: 0.008,
        regulator_ripple_V: 0.004,
      },
    },
    bank: [
      line('AB-P7343-220U-6V3-9M', 1, 20, 'top', true),
      line('AB-C0603-X5R-22U-6V3', 3, 11),
      line('AB-C0402-X6S-2U2-6V3', 8, 6),
      line('AB-C0201-X5R-100N-6V3', 14, 4),
    ],
  },
  // Holds with the values of the catalogue; at 3.3 V its ceramics have lost what made it hold.
  {
    spec: {
      name: 'VDD_AUX',
      voltage_V: 3.3,
      target: { kind: 'step', ripple_percent: 2, step_A: 4.8 },
      band_Hz: [10e3, 5e6],
      source: { kind: 'rl', resistance_ohm: 0.004, inductance_H: 40e-9 },
      observe: 'pins',
      conditions: cabinet,
      start_up: { soft_start_s: 2e-3, current_limit_A: 3 },
    },
    bank: [
      line('AB-P7343-220U-6V3-9M', 2, null, 'top'),
      line('AB-C0402-X5R-4U7-6V3', 3, null, 'top'),
      line('AB-C0603-X7R-1U-25', 2, null, 'top'),
    ],
  },
  // Holds in every corner, and not without its one electrolytic: the missing-part check says so.
  {
    spec: {
      name: 'VBUS_72',
      voltage_V: 72,
      target: { kind: 'flat', impedance_ohm: 0.6 },
      band_Hz: [1e3, 5e6],
      source: { kind: 'rl', resistance_ohm: 0.05, inductance_H: 2e-6 },
      plane: plane(70, 22, 0.36, 0.002),
      observe: 'pins',
      conditions: cabinet,
      start_up: { soft_start_s: 20e-3, current_limit_A: 2 },
    },
    bank: [
      line('AB-ED10-100U-100-180M', 1, 45, 'top'),
      line('AB-C1210-X7S-4U7-100-S', 2, 20, 'top'),
      line('AB-C0603-X7R-100N-100', 2, 12, 'top'),
    ],
  },
];
