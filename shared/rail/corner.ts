import type { Conditions } from '../schemas/rail-spec.schema';

export type End = 'low' | 'nominal' | 'high';

/** Where in a rail's conditions its parts are looked at; the same for all parts. */
export interface Corner {
  temperature: 'cold' | 'usual' | 'hot';
  age: 'fresh' | 'aged';
  capacitance: End;
  esr: End;
  esl: End;
}

/** In service: at the usual temperature and full age, each part in the middle of its tolerances. */
export const IN_SERVICE: Corner = {
  temperature: 'usual',
  age: 'aged',
  capacitance: 'nominal',
  esr: 'nominal',
  esl: 'nominal',
};

const ENDS: readonly End[] = ['low', 'high'];

/**
 * Every corner of the conditions: 2ᵏ for the k of temperature, age and tolerances that vary (at most 5, so 32). A temperature
 * range of no width, or no age, is not a factor.
 */
export function cornersOf(conditions: Conditions): Corner[] {
  const temperatures: Corner['temperature'][] =
    conditions.hottest_C > conditions.coldest_C ? ['cold', 'hot'] : ['usual'];
  const ages: Corner['age'][] = conditions.age_h > REFERENCE_AGE_H ? ['fresh', 'aged'] : ['fresh'];
  const ends = (what: Conditions['vary'][number]): readonly End[] =>
    conditions.vary.includes(what) ? ENDS : ['nominal'];
  return temperatures.flatMap((temperature) =>
    ages.flatMap((age) =>
      ends('capacitance').flatMap((capacitance) =>
        ends('esr').flatMap((esr) => ends('esl').map((esl) => ({ temperature, age, capacitance, esr, esl }))),
      ),
    ),
  );
}

/** Catalogue values hold 1000 h after the last heat, the usual referee time (IEC 60384-9, EIA-521): younger counts as that. */
export const REFERENCE_AGE_H = 1000;

export const temperatureOf_C = (conditions: Conditions, corner: Corner): number =>
  ({ cold: conditions.coldest_C, usual: conditions.usual_C, hot: conditions.hottest_C })[corner.temperature];

export const ageOf_h = (conditions: Conditions, corner: Corner): number =>
  corner.age === 'fresh' ? REFERENCE_AGE_H : Math.max(REFERENCE_AGE_H, conditions.age_h);

/** `cold, aged, C low, ESR high`; what is as in service is left out. */
export function cornerName(corner: Corner): string {
  const words = [
    corner.temperature === 'usual' ? '' : corner.temperature,
    corner.age,
    corner.capacitance === 'nominal' ? '' : `C ${corner.capacitance}`,
    corner.esr === 'nominal' ? '' : `ESR ${corner.esr}`,
    corner.esl === 'nominal' ? '' : `ESL ${corner.esl}`,
  ];
  return words.filter(Boolean).join(', ');
}
