import type { Conditions } from '@shared/schemas/rail-spec.schema';
import type { SpecReader } from './spec-reader';

/** The stated conditions; undefined: they are left to be assumed. */
export function readConditions(reader: SpecReader): Conditions | undefined {
  if (reader.form.conditionsKind === 'assumed') return undefined;
  return {
    coldest_C: reader.celsius('coldest'),
    usual_C: reader.celsius('usual'),
    hottest_C: reader.celsius('hottest'),
    age_h: reader.age('age'),
    vary: reader.form.vary,
  };
}
