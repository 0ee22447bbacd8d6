import { type Branch, lineBranch, selfResonance_Hz } from '../engine/branch';
import { EngineError } from '../engine/errors';
import type { LineModel } from '../engine/network';
import { type CompiledRail, compileRail } from '../engine/rail';
import type { MixCandidate, MixProblem, Objective } from './problem';
import { weightUnit } from './weight-unit';

/** A candidate made ready: weight in whole units where there are such, limits filled in, place in the compiled rail. */
export interface PreparedPart {
  id: string;
  branch: Branch;
  /** Self-resonance; of a table part that of its fitted R–L–C. */
  resonance_Hz: number;
  weight: number;
  min: number;
  max: number;
  member: number;
}

export interface Prepared {
  problem: MixProblem;
  rail: CompiledRail;
  /** By rising self-resonance: see count-tree.ts for why this order makes the bounds bite. */
  parts: PreparedPart[];
  /** Real weight of one unit of `PreparedPart.weight`. */
  unit: number;
  /** 1: all weights are whole numbers of units, so that two mixes differ by 1 or more; 0: they are reals. */
  step: 0 | 1;
  /** Weight and number of kinds of what `min` puts in every mix. */
  baseWeight: number;
  baseKinds: number;
  maxKinds: number;
}

export const DEFAULT_MAX = 80;

/** Checks a problem and orders it; throws EngineError naming the field that is wrong. */
export function prepare(problem: MixProblem): Prepared {
  const [low, high] = problem.band_Hz;
  if (!(low > 0) || !Number.isFinite(high)) throw new EngineError('band_Hz', 'the band must lie above 0 Hz');
  if (!(high > low)) throw new EngineError('band_Hz', 'the band is empty: its end must lie above its start');
  if (problem.candidates.length === 0)
    throw new EngineError('candidates', 'the search needs at least one candidate');
  const maxKinds = problem.maxKinds ?? problem.candidates.length;
  if (!Number.isInteger(maxKinds) || maxKinds < 0)
    throw new EngineError('maxKinds', 'the number of kinds must be a whole number, zero or more');
  const seen = new Set<string>();
  const parts = problem.candidates.map((candidate, i) => {
    const field = `candidates[${i}]`;
    if (seen.has(candidate.id))
      throw new EngineError(`${field}.id`, `"${candidate.id}" is a candidate twice`);
    seen.add(candidate.id);
    return preparePart(candidate, problem.minimise, field);
  });
  const lines = problem.candidates.map((candidate): LineModel => ({ ...candidate.line, count: 1 }));
  const rail = compileRail({ ...problem.network, lines: [...problem.network.lines, ...lines] });
  parts.forEach((part, i) => {
    part.member = rail.members.findIndex((member) => member.line === problem.network.lines.length + i);
    rail.members[part.member].count = 0;
  });
  const { unit, step } = weightUnit(parts.map((part) => part.weight));
  for (const part of parts) part.weight = step === 1 ? Math.round(part.weight / unit) : part.weight / unit;
  parts.sort((a, b) => a.resonance_Hz - b.resonance_Hz || (a.id < b.id ? -1 : 1));
  const baseKinds = parts.filter((part) => part.min > 0).length;
  if (baseKinds > maxKinds)
    throw new EngineError(
      'maxKinds',
      `${baseKinds} candidates have a minimum, which is more than ${maxKinds} kinds`,
    );
  const baseWeight = parts.reduce((sum, part) => sum + part.min * part.weight, 0);
  return { problem, rail, parts, unit, step, baseWeight, baseKinds, maxKinds };
}

function preparePart(candidate: MixCandidate, minimise: Objective, field: string): PreparedPart {
  const min = candidate.min ?? 0;
  const max = candidate.max ?? Math.max(DEFAULT_MAX, min);
  if (!Number.isInteger(min) || min < 0)
    throw new EngineError(`${field}.min`, 'the minimum must be a whole number, zero or more');
  if (!Number.isInteger(max) || max < min)
    throw new EngineError(`${field}.max`, 'the maximum must be a whole number, not below the minimum');
  const branch = lineBranch(candidate.line, `${field}.line`);
  return {
    id: candidate.id,
    branch,
    resonance_Hz: resonanceOf(branch),
    weight: weightOf(candidate, minimise, field),
    min,
    max,
    member: -1,
  };
}

function weightOf(candidate: MixCandidate, minimise: Objective, field: string): number {
  if (minimise === 'parts') return 1;
  const [name, value, what] =
    minimise === 'cost'
      ? (['cost', candidate.cost, 'cost'] as const)
      : (['area_mm2', candidate.area_mm2, 'area'] as const);
  if (value === undefined)
    throw new EngineError(`${field}.${name}`, `"${candidate.id}" has no ${what}, which is to be minimised`);
  if (!(value > 0) || !Number.isFinite(value))
    throw new EngineError(`${field}.${name}`, `the ${what} of "${candidate.id}" must be above zero`);
  return value;
}

function resonanceOf(branch: Branch): number {
  if (branch.kind !== 'table') return selfResonance_Hz(branch) ?? Number.MAX_VALUE;
  const { inductance_H, elastance_perF } = branch.table.fit;
  const l = inductance_H + branch.l;
  const d = elastance_perF + branch.d;
  return l > 0 && d > 0 ? Math.sqrt(d / l) / (2 * Math.PI) : Number.MAX_VALUE;
}
