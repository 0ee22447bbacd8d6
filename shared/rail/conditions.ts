import type { Conditions, RailSpec } from '../schemas/rail-spec.schema';

/** What stands in where a rail says nothing of its conditions: an office's temperatures, ten years, all tolerances. */
export const ASSUMED_CONDITIONS: Conditions = {
  coldest_C: 0,
  usual_C: 45,
  hottest_C: 70,
  age_h: 87_660,
  vary: ['capacitance', 'esr', 'esl'],
};

/** The rail's own conditions, or the assumed ones (`assumed` says so, and every screen with it). */
export function conditionsOf(spec: Pick<RailSpec, 'conditions'>): {
  conditions: Conditions;
  assumed: boolean;
} {
  return spec.conditions
    ? { conditions: spec.conditions, assumed: false }
    : { conditions: ASSUMED_CONDITIONS, assumed: true };
}
