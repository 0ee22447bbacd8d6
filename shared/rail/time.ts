import { EngineError } from '../engine/errors';
import { compileRail } from '../engine/rail';
import { type LoadStep, loadStep } from '../engine/time/load-step';
import { poleForm } from '../engine/time/pole-form';
import { quasiStaticAbove } from '../engine/time/quasi-static';
import { type StartUp, startUp } from '../engine/time/start-up';
import { type WorstPattern, worstPattern } from '../engine/time/worst-pattern';
import type { RailDocument } from '../schemas/rail-document.schema';
import { allowance_V, type LoadStepSpec, loadStepOf } from './allowance';
import { networkOf } from './network';

/** What a rail does in time. */
export interface RailTime {
  /** null: nothing says how large the load is, or the network has no answer in time (`reason`). */
  load: LoadStepSpec | null;
  assumed: boolean;
  step: LoadStep | null;
  pattern: WorstPattern | null;
  reason: string | null;
  /** Ripple that the bank may use, volt; null: not given. */
  allowance_V: number | null;
  /** Members whose tables a series R–L–C stands in for. */
  approximated: string[];
  /** Resonances above are taken as still for the worst pattern: they lie beyond what load and network say. */
  limit_Hz: number;
}

/** Resonances up to so many times the band's end count for the worst pattern. */
const PATTERN_BANDS = 10;

/** Load step and worst pattern of a rail whose parts are already what they are to be (give it the rail in service). */
export function railTime(document: RailDocument): RailTime {
  const load = loadStepOf(document.rail);
  const limit_Hz = PATTERN_BANDS * document.rail.band_Hz[1];
  const base = {
    load: load?.step ?? null,
    assumed: load?.assumed ?? false,
    allowance_V: allowance_V(document.rail),
    step: null,
    pattern: null,
    approximated: [],
    limit_Hz,
  };
  if (!load) return { ...base, reason: 'the specification says no load step' };
  try {
    const form = poleForm(compileRail(networkOf(document)));
    return {
      ...base,
      step: loadStep(form, load.step, document.rail.voltage_V),
      pattern: worstPattern(quasiStaticAbove(form, limit_Hz), load.step),
      reason: null,
      approximated: form.approximated,
    };
  } catch (error) {
    if (error instanceof EngineError) return { ...base, reason: error.message };
    throw error;
  }
}

/** The further of the two ways in which any pattern of the load can take the rail from its voltage without load, volt. */
export const worstSwing_V = ({ fall, rise }: Pick<WorstPattern, 'fall' | 'rise'>): number =>
  Math.max(fall.bound_V, rise.bound_V);

/** Soft start assumed where the specification gives none. */
export const ASSUMED_SOFT_START_S = 1e-3;

/** Charging the bank at start-up; a document without a regulator's limit is told the current at 1 ms. */
export function railStartUp(document: RailDocument): StartUp & { capacitance_F: number; assumed: boolean } {
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  const capacitance_F = document.bank.reduce(
    (sum, line) => sum + line.count * (parts.get(line.part)?.capacitance_F ?? 0),
    document.rail.plane?.capacitance_F ?? 0,
  );
  const given = document.rail.start_up;
  const start = startUp({
    capacitance_F,
    voltage_V: document.rail.voltage_V,
    soft_start_s: given?.soft_start_s ?? ASSUMED_SOFT_START_S,
    ...(given && { current_limit_A: given.current_limit_A }),
  });
  return { ...start, capacitance_F, assumed: !given };
}
