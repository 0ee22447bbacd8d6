import { ASSUMED_CONDITIONS } from '@shared/rail/conditions';
import { cornersOf } from '@shared/rail/corner';
import { type Conditions, conditionsSchema } from '@shared/schemas/rail-spec.schema';
import { ageText } from './age-text';
import { celsiusText } from './celsius-text';
import { readConditions } from './read-conditions';
import type { SpecForm } from './spec-form';
import { specReader } from './spec-reader';

const TOLERANCES = { capacitance: 'C', esr: 'ESR', esl: 'ESL' } as const;

const list = (words: readonly string[]): string =>
  words.length < 2 ? words.join('') : `${words.slice(0, -1).join(', ')} and ${words[words.length - 1]}`;

/** `32 corners: cold or hot, new or aged, C, ESR and ESL each at either end`. */
export function cornersText(conditions: Conditions): string {
  const corners = cornersOf(conditions);
  const varied = (['capacitance', 'esr', 'esl'] as const).filter((one) => conditions.vary.includes(one));
  const factors = [
    corners.some((one) => one.temperature === 'hot') && 'cold or hot',
    corners.some((one) => one.age === 'aged') && 'new or aged',
    varied.length > 0 &&
      `${list(varied.map((one) => TOLERANCES[one]))} ${varied.length > 1 ? 'each ' : ''}at either end of ${varied.length > 1 ? 'their tolerances' : 'its tolerance'}`,
  ].filter(Boolean);
  if (factors.length === 0) return '1 corner: nothing varies';
  return `${corners.length} corners: ${factors.join('; ')}`;
}

/** What the typed conditions come to, or what is assumed in their place; empty until they can be read. */
export function conditionsSentence(form: SpecForm): string {
  const typed = readConditions(specReader(form));
  if (!typed) return `assumed: ${conditionsText(ASSUMED_CONDITIONS)} → ${cornersText(ASSUMED_CONDITIONS)}`;
  const read = conditionsSchema.safeParse(typed);
  return read.success ? cornersText(read.data) : '';
}

/** `0 °C, usually 45 °C, up to 70 °C; 10 years; tolerances of C, ESR and ESL`. */
export function conditionsText(conditions: Conditions): string {
  const { coldest_C, usual_C, hottest_C, age_h, vary } = conditions;
  const tolerances =
    vary.length === 0 ? 'no tolerances' : `tolerances of ${list(vary.map((one) => TOLERANCES[one]))}`;
  return `${celsiusText(coldest_C)} to ${celsiusText(hottest_C)}, usually ${celsiusText(usual_C)}; ${ageText(age_h)}; ${tolerances}`;
}
