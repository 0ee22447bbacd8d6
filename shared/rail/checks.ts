import { EngineError } from '../engine/errors';
import type { PartInService, RailChecks } from '../schemas/checks.schema';
import type { DocumentPart, RailDocument } from '../schemas/rail-document.schema';
import type { RailSpec } from '../schemas/rail-spec.schema';
import { conditionsOf } from './conditions';
import { cornersOf, IN_SERVICE } from './corner';
import { documentIn, serviceValues } from './in-service';
import { type RailTime, railStartUp, railTime, worstCornerStep, worstSwing_V } from './time';
import { cornerResults, headroomOf, missingParts } from './worst-cases';

/**
 * Everything that is checked of a rail, in the form that a revision keeps. null where the rail has no result (its summary says
 * why). Start-up takes the bank at the upper end of its tolerances and without bias: that is the most there is to charge.
 */
export function checkRail(document: RailDocument): RailChecks | null {
  try {
    const { conditions, assumed } = conditionsOf(document.rail);
    const serving = documentIn(document, IN_SERVICE);
    const corners = cornerResults(document);
    const [worst] = corners;
    const [missing] = missingParts(serving);
    const time = railTime(serving);
    return {
      conditions,
      assumed,
      parts: usedParts(document).map((part) => partInService(part, document.rail)),
      catalogue: headroomOf(document),
      service: headroomOf(serving),
      worst: { corner: worst.name, holds: worst.holds, tightest: worst.tightest },
      corners: corners.length,
      missing: missing ?? null,
      allowance_V: time.allowance_V,
      load: time.load,
      load_assumed: time.assumed,
      ...timeChecks(time),
      worst_step: worstCornerStep(document),
      start_up: startUpCheck(document),
    };
  } catch (error) {
    if (error instanceof EngineError) return null;
    throw error;
  }
}

const usedParts = (document: RailDocument): DocumentPart[] =>
  document.parts.filter((part) => document.bank.some((line) => line.part === part.id && line.count > 0));

/** A part's capacitance on a rail: catalogue, in service with every factor, and its least and most over all corners. */
export function partInService(part: DocumentPart, spec: RailSpec): PartInService {
  const service = serviceValues(part, spec, IN_SERVICE);
  const all = cornersOf(conditionsOf(spec).conditions).map(
    (corner) => serviceValues(part, spec, corner).capacitance_F,
  );
  return {
    part: part.id,
    catalogue_F: part.capacitance_F,
    service_F: service.capacitance_F,
    lowest_F: Math.min(...all),
    highest_F: Math.max(...all),
    factors: service.factors,
    estimated: service.estimated,
  };
}

export function timeChecks({
  step,
  pattern,
  reason,
  approximated,
}: RailTime): Pick<RailChecks, 'step' | 'pattern' | 'timeReason' | 'approximated'> {
  return {
    step: step && {
      droop_V: step.droop_V,
      droop_time_s: step.droop_time_s,
      overshoot_V: step.overshoot_V,
    },
    pattern: pattern && {
      fall_V: pattern.fall.bound_V,
      rise_V: pattern.rise.bound_V,
      swing_V: worstSwing_V(pattern),
      simulated_V: pattern.fall.simulated_V,
      edges: pattern.fall.edges.length,
      frequency_Hz: pattern.dominant?.frequency_Hz ?? null,
      q: pattern.dominant?.q ?? null,
    },
    timeReason: reason,
    approximated,
  };
}

export function startUpCheck(document: RailDocument): RailChecks['start_up'] {
  const start = railStartUp(document);
  return {
    capacitance_F: start.capacitance_F,
    charge_C: start.charge_C,
    energy_J: start.energy_J,
    current_A: start.assumed ? null : start.current_A,
    limit_A: document.rail.start_up?.current_limit_A ?? null,
    holds: start.within_limit,
    needed_s: start.needed_s,
  };
}
