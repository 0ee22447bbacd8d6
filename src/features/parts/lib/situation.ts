import { REFERENCE_AGE_H } from '@shared/engine/service/ageing';
import type { ServiceState } from '@shared/engine/service/in-service';
import { ASSUMED_CONDITIONS } from '@shared/rail/conditions';
import type { Part } from '@shared/schemas/part.schema';
import { MINUS } from '@shared/units/format';
import { controlStep } from './axis-places';

/** Where the part is looked at on its page. */
export type Situation = ServiceState;

/** Catalogue values are stated here. */
export const CATALOGUE: Situation = {
  voltage_V: 0,
  temperature_C: 25,
  age_h: REFERENCE_AGE_H,
  capacitance: 'nominal',
  esr: 'nominal',
  esl: 'nominal',
};

/** Where the page begins: about half the rated voltage, and what is assumed of a rail that says nothing. */
export function usualSituation({ rated_voltage_V }: Pick<Part, 'rated_voltage_V'>): Situation {
  // On a step of the control, so that its float stands under the point.
  const step = controlStep(rated_voltage_V);
  const voltage_V = Number((Math.round(rated_voltage_V / 2 / step) * step).toPrecision(6));
  return {
    ...CATALOGUE,
    voltage_V,
    temperature_C: ASSUMED_CONDITIONS.usual_C,
    age_h: ASSUMED_CONDITIONS.age_h,
  };
}

/** Mean year of the calendar, as 10 years are 87 660 h. */
const HOURS_A_YEAR = 8766;

/** Ages to choose from, in years; 0 is new: the referee time of catalogue values. */
export const AGES_YEARS = [0, 1, 3, 10, 20] as const;

export const ageOfYears_h = (years: number): number => Math.max(REFERENCE_AGE_H, years * HOURS_A_YEAR);

/** Years to three digits; 0 for what is new. */
export const yearsOfAge = (age_h: number): number =>
  age_h <= REFERENCE_AGE_H ? 0 : Number((age_h / HOURS_A_YEAR).toPrecision(3));

export function ageText(age_h: number): string {
  const years = yearsOfAge(age_h);
  if (years === 0) return 'new';
  return years === 1 ? '1 year' : `${years} years`;
}

/** `−40 °C`, to a tenth. */
export const celsiusText = (temperature_C: number): string =>
  `${String(Number(temperature_C.toFixed(1))).replace('-', MINUS)}\u00a0°C`;
