import type { PartFields } from '@shared/schemas/part.schema';

type Behaviour = Pick<
  PartFields,
  | 'bias_curve'
  | 'temperature_curve'
  | 'ageing_percent_per_decade'
  | 'esr_table'
  | 'impedance_table'
  | 'esr_tolerance_percent'
  | 'esl_tolerance_percent'
>;
type Series = Pick<PartFields, 'capacitance_F' | 'esr_ohm' | 'esl_H'>;

/** Nothing is known: the product estimates, and says so. */
export const UNKNOWN: Behaviour = {
  bias_curve: null,
  temperature_curve: null,
  ageing_percent_per_decade: null,
  esr_table: null,
  impedance_table: null,
  esr_tolerance_percent: null,
  esl_tolerance_percent: null,
};

const digits = (value: number, count: number): number => Number(value.toPrecision(count));

/** Bodies without terminations' keep-out, mm³: what the ceramic has to hold its charge in. */
const BODY_mm3: Record<string, number> = {
  '0201': 0.054,
  '0402': 0.25,
  '0603': 1.02,
  '0805': 3.1,
  '1206': 8.2,
  '1210': 20,
};

/**
 * Invented, with the shape that Class II ceramics have: k = 1 ÷ (1 + a·x^1.6) over x = V ÷ rated. The more charge a mm³ has to
 * hold, the larger a, so that small cases and high values lose most.
 */
export function biasCurve(
  caseSize: string,
  capacitance_F: number,
  rated_voltage_V: number,
): PartFields['bias_curve'] {
  const body_mm3 = BODY_mm3[caseSize];
  if (body_mm3 === undefined) return null;
  const charge_C = capacitance_F * rated_voltage_V;
  const a = 0.7 * (charge_C / body_mm3 / 6e-6) ** 0.75;
  return [0, 0.08, 0.16, 0.24, 0.32, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1].map((x): [number, number] => [
    digits(x * rated_voltage_V, 6),
    digits(1 / (1 + a * x ** 1.6), 3),
  ]);
}

/** Invented, inside the limits of each code. */
const TEMPERATURE: Record<string, PartFields['temperature_curve']> = {
  X7R: [
    [-55, 0.902],
    [-40, 0.931],
    [-20, 0.963],
    [0, 0.987],
    [25, 1],
    [45, 0.994],
    [65, 0.974],
    [85, 0.943],
    [105, 0.908],
    [125, 0.872],
  ],
  X7S: [
    [-55, 0.868],
    [-40, 0.907],
    [-20, 0.952],
    [0, 0.984],
    [25, 1],
    [45, 0.99],
    [65, 0.961],
    [85, 0.916],
    [105, 0.865],
    [125, 0.811],
  ],
  X6S: [
    [-55, 0.851],
    [-40, 0.896],
    [-20, 0.947],
    [0, 0.982],
    [25, 1],
    [45, 0.987],
    [65, 0.952],
    [85, 0.9],
    [105, 0.834],
  ],
  X5R: [
    [-55, 0.873],
    [-30, 0.93],
    [0, 0.983],
    [25, 1],
    [45, 0.988],
    [65, 0.951],
    [85, 0.889],
  ],
};

/** Stated for the stable codes; of X5R the invented maker says nothing. */
const AGEING: Record<string, number> = { C0G: 0, X7R: 2, X7S: 2.5, X6S: 3 };

/** What the invented maker publishes of a ceramic. X5R in 0402 and 0201 comes without curves, so that estimates show. */
export function ceramicBehaviour(
  caseSize: string,
  dielectric: string,
  capacitance_F: number,
  rated_voltage_V: number,
): Behaviour {
  const ageing_percent_per_decade = AGEING[dielectric] ?? null;
  const isBare = dielectric === 'X5R' && (caseSize === '0402' || caseSize === '0201');
  if (dielectric === 'C0G' || isBare) return { ...UNKNOWN, ageing_percent_per_decade };
  return {
    ...UNKNOWN,
    ageing_percent_per_decade,
    bias_curve: biasCurve(caseSize, capacitance_F, rated_voltage_V),
    temperature_curve: TEMPERATURE[dielectric] ?? null,
  };
}

/** Conductive polymer gains a little with warmth. */
export const POLYMER_TEMPERATURE: PartFields['temperature_curve'] = [
  [-55, 0.93],
  [-20, 0.962],
  [25, 1],
  [65, 1.027],
  [105, 1.058],
];

/** A polymer's ESR: high while its electrolyte still limits, least near 1 MHz, rising with the skin effect. */
export const polymerEsr = (esr_ohm: number): PartFields['esr_table'] =>
  [
    [100, 9.5],
    [1e3, 2.4],
    [1e4, 1.32],
    [1e5, 1],
    [1e6, 0.93],
    [1e7, 1.15],
    [1e8, 2.1],
  ].map(([f, factor]): [number, number] => [f, digits(esr_ohm * factor, 3)]);

/**
 * As if measured on the part alone: its C and ESL, dielectric loss (tan δ = 0.012) at low frequencies, its ESR at resonance,
 * skin effect above. 41 points over five decades, 20 more around the resonance.
 */
export function measuredImpedance({ capacitance_F, esr_ohm, esl_H }: Series): PartFields['impedance_table'] {
  const resonance_Hz = 1 / (2 * Math.PI * Math.sqrt(esl_H * capacitance_F));
  const wide = Array.from({ length: 41 }, (_, i) => 1e4 * 10 ** (i / 8));
  const near = Array.from({ length: 20 }, (_, i) => resonance_Hz * 2 ** (i / 9.5 - 1));
  const loss = 0.012;
  const metal_ohm = esr_ohm - loss / (2 * Math.PI * resonance_Hz * capacitance_F);
  const frequencies = [...new Set([...wide, ...near].map((f) => digits(f, 4)))].sort((a, b) => a - b);
  return frequencies.map((f): [number, number, number] => {
    const omega = 2 * Math.PI * f;
    const skin = Math.max(1, Math.sqrt(f / resonance_Hz));
    return [
      f,
      digits(loss / (omega * capacitance_F) + metal_ohm * skin, 4),
      digits(omega * esl_H - 1 / (omega * capacitance_F), 4),
    ];
  });
}
