import type { PartFields } from '@shared/schemas/part.schema';
import { ceramicBehaviour, POLYMER_TEMPERATURE, UNKNOWN } from './part-curves';

/** What every part of a case shares: parasitics, mount, size. */
interface CaseFigures {
  esl_H: number;
  mount_H: number;
  area_mm2: number;
  height_mm: number;
}

export const cases: Record<string, CaseFigures> = {
  '0201': { esl_H: 220e-12, mount_H: 420e-12, area_mm2: 0.5, height_mm: 0.33 },
  '0402': { esl_H: 300e-12, mount_H: 500e-12, area_mm2: 1.1, height_mm: 0.55 },
  '0603': { esl_H: 420e-12, mount_H: 600e-12, area_mm2: 2.4, height_mm: 0.9 },
  '0805': { esl_H: 500e-12, mount_H: 650e-12, area_mm2: 4.2, height_mm: 1.35 },
  '1206': { esl_H: 650e-12, mount_H: 780e-12, area_mm2: 7.5, height_mm: 1.8 },
  '1210': { esl_H: 620e-12, mount_H: 750e-12, area_mm2: 11.2, height_mm: 2.7 },
  '7343': { esl_H: 1.6e-9, mount_H: 900e-12, area_mm2: 40, height_mm: 2.8 },
  D8: { esl_H: 4.2e-9, mount_H: 1.8e-9, area_mm2: 88, height_mm: 10.2 },
  D10: { esl_H: 5.5e-9, mount_H: 2e-9, area_mm2: 132, height_mm: 10.2 },
};

const scales: [limit: number, factor: number, letter: string][] = [
  [1e-9, 1e12, 'P'],
  [1e-6, 1e9, 'N'],
  [1, 1e6, 'U'],
];

/** `100 * 1e-9` is not the double nearest to 1e-7: the part's page would show the noise. */
const exact = (value: number): number => Number(value.toPrecision(12));

/** 1e-7 → 100N, 2.2e-6 → 2U2. */
export function valueCode(capacitance_F: number): string {
  const [, factor, letter] = scales.find(([limit]) => capacitance_F < limit * 0.9999) ?? scales[2];
  const text = String(Number((capacitance_F * factor).toPrecision(3)));
  return text.includes('.') ? text.replace('.', letter) : `${text}${letter}`;
}

export const voltageCode = (volts: number): string =>
  Number.isInteger(volts) ? String(volts) : String(volts).replace('.', 'V');

/** ESR of a ceramic falls with its capacitance; C0G has lower loss than Class II. */
const ceramicEsr = (capacitance_F: number, dielectric: string): number =>
  Number(
    (0.0075 * (capacitance_F / 1e-6) ** -0.42 * (dielectric === 'C0G' ? 0.6 : 1) + 0.0012).toPrecision(2),
  );

export function ceramic(
  caseSize: string,
  dielectric: string,
  capacitance_F: number,
  rated_voltage_V: number,
  unit_cost: number,
  more: Partial<PartFields> = {},
): PartFields {
  const number = `AB-C${caseSize}-${dielectric}-${valueCode(capacitance_F)}-${voltageCode(rated_voltage_V)}`;
  return {
    partNumber: more.termination === 'soft' ? `${number}-S` : number,
    description: more.termination === 'soft' ? 'Multilayer ceramic, soft termination' : 'Multilayer ceramic',
    technology: 'ceramic',
    dielectric,
    caseSize,
    capacitance_F: exact(capacitance_F),
    tolerance: dielectric === 'C0G' ? 'J' : capacitance_F >= 10e-6 ? 'M' : 'K',
    rated_voltage_V,
    esr_ohm: ceramicEsr(capacitance_F, dielectric),
    ...cases[caseSize],
    termination: 'standard',
    unit_cost,
    ...ceramicBehaviour(caseSize, dielectric, exact(capacitance_F), rated_voltage_V),
    ...more,
  };
}

export function bulk(
  technology: 'polymer' | 'tantalum' | 'aluminium',
  caseSize: string,
  capacitance_F: number,
  rated_voltage_V: number,
  esr_ohm: number,
  unit_cost: number,
  more: Partial<PartFields> = {},
): PartFields {
  const letter = { polymer: 'P', tantalum: 'T', aluminium: 'E' }[technology];
  const names = { polymer: 'Polymer', tantalum: 'Tantalum', aluminium: 'Aluminium electrolytic' };
  return {
    partNumber: `AB-${letter}${caseSize}-${valueCode(capacitance_F)}-${voltageCode(rated_voltage_V)}-${Math.round(esr_ohm * 1e3)}M`,
    description: names[technology],
    technology,
    dielectric: '',
    caseSize,
    capacitance_F: exact(capacitance_F),
    tolerance: 'M',
    rated_voltage_V,
    esr_ohm,
    ...cases[caseSize],
    termination: 'standard',
    unit_cost,
    ...UNKNOWN,
    ...(technology === 'polymer' && { temperature_curve: POLYMER_TEMPERATURE }),
    ...more,
  };
}
