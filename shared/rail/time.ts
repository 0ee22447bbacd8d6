import { EngineError } from '../engine/errors';
import { compileRail } from '../engine/rail';
import { toleranceFactors } from '../engine/service/tolerance';
import { kneeFrequency } from '../engine/target';
import { type LoadStep, loadStep } from '../engine/time/load-step';
import { type PoleForm, poleForm } from '../engine/time/pole-form';
import { quasiStaticAbove } from '../engine/time/quasi-static';
import { type StartUp, startUp } from '../engine/time/start-up';
import { type WorstPattern, worstPattern } from '../engine/time/worst-pattern';
import type { RailDocument } from '../schemas/rail-document.schema';
import { allowance_V, type LoadStepSpec, loadStepOf } from './allowance';
import { conditionsOf } from './conditions';
import { cornerName, cornersOf } from './corner';
import { documentIn } from './in-service';
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
  /** What one edge of the load drops across the inductance that is left at high frequency, L·dI/dt in volt. */
  edge_V: number;
}

/** Resonances count for the worst pattern up to so many times the band's end, and so many times the edge's knee 0.35/t_r. */
const PATTERN_BANDS = 10;
const PATTERN_KNEES = 5;

function stillAbove_Hz(band_Hz: readonly [number, number], step: LoadStepSpec | null): number {
  const knees = step ? PATTERN_KNEES * kneeFrequency(step.rise_s) : 0;
  return Math.max(PATTERN_BANDS * band_Hz[1], knees);
}

/** Load step and worst pattern of a rail whose parts are already what they are to be (give it the rail in service). */
export function railTime(document: RailDocument): RailTime {
  const load = loadStepOf(document.rail);
  const limit_Hz = stillAbove_Hz(document.rail.band_Hz, load?.step ?? null);
  const base = {
    load: load?.step ?? null,
    assumed: load?.assumed ?? false,
    allowance_V: allowance_V(document.rail),
    step: null,
    pattern: null,
    approximated: [],
    limit_Hz,
    edge_V: 0,
  };
  if (!load) return { ...base, reason: 'the specification says no load step' };
  try {
    const form = poleForm(compileRail(networkOf(document)));
    const still = quasiStaticAbove(form, limit_Hz);
    return {
      ...base,
      step: loadStep(form, load.step, document.rail.voltage_V),
      pattern: worstPattern(still, load.step),
      reason: null,
      approximated: form.approximated,
      edge_V: (still.inductance_H * load.step.step_A) / load.step.rise_s,
    };
  } catch (error) {
    if (error instanceof EngineError) return { ...base, reason: error.message };
    throw error;
  }
}

/** The load step in the corner where the rail moves furthest from its settled voltage. */
export interface CornerStep {
  corner: string;
  droop_V: number;
  overshoot_V: number;
}

/** So many corners are stepped in full: those that go furthest while what rings far above the band is left still. */
const FULL_CORNERS = 3;

/**
 * The corner that takes the load step furthest; null where the rail has none. `document` with catalogue parts. Every corner is
 * tried without the resonances above the worst pattern's limit, which cost most and move least; the furthest of them in full.
 */
export function worstCornerStep(document: RailDocument): CornerStep | null {
  const load = loadStepOf(document.rail);
  if (!load) return null;
  const limit_Hz = stillAbove_Hz(document.rail.band_Hz, load.step);
  const stepped = (corner: string, form: PoleForm): CornerStep => {
    const { droop_V, overshoot_V } = loadStep(form, load.step, document.rail.voltage_V);
    return { corner, droop_V, overshoot_V };
  };
  try {
    return cornersOf(conditionsOf(document.rail).conditions)
      .map((corner) => {
        const form = poleForm(compileRail(networkOf(documentIn(document, corner))));
        const name = cornerName(corner);
        return { form, name, reach_V: furthest_V(stepped(name, quasiStaticAbove(form, limit_Hz))) };
      })
      .sort((a, b) => b.reach_V - a.reach_V)
      .slice(0, FULL_CORNERS)
      .map(({ form, name }) => stepped(name, form))
      .reduce((worst, next) => (furthest_V(next) > furthest_V(worst) ? next : worst));
  } catch (error) {
    if (error instanceof EngineError) return null;
    throw error;
  }
}

const furthest_V = ({ droop_V, overshoot_V }: CornerStep): number => Math.max(droop_V, overshoot_V);

/** The further of the two ways in which any pattern of the load can take the rail from its voltage without load, volt. */
export const worstSwing_V = ({ fall, rise }: Pick<WorstPattern, 'fall' | 'rise'>): number =>
  Math.max(fall.bound_V, rise.bound_V);

/** Soft start assumed where the specification gives none. */
export const ASSUMED_SOFT_START_S = 1e-3;

/**
 * The most that a bank can hold, farad: every part at the upper end of its tolerance, new, without bias, as it is while it is being
 * charged; planes and die with it.
 */
export function mostCapacitance_F(document: Pick<RailDocument, 'rail' | 'parts' | 'bank'>): number {
  const parts = new Map(document.parts.map((part) => [part.id, part]));
  return document.bank.reduce(
    (sum, line) => {
      const part = parts.get(line.part);
      if (!part) return sum;
      const above = part.tolerance ? toleranceFactors(part.tolerance, part.capacitance_F).high : 1;
      return sum + line.count * part.capacitance_F * above;
    },
    (document.rail.plane?.capacitance_F ?? 0) + (document.rail.package?.die_capacitance_F ?? 0),
  );
}

/** Charging the bank at start-up; a document without a regulator's limit is told the current at 1 ms. */
export function railStartUp(document: RailDocument): StartUp & { capacitance_F: number; assumed: boolean } {
  const capacitance_F = mostCapacitance_F(document);
  const given = document.rail.start_up;
  const start = startUp({
    capacitance_F,
    voltage_V: document.rail.voltage_V,
    soft_start_s: given?.soft_start_s ?? ASSUMED_SOFT_START_S,
    ...(given && { current_limit_A: given.current_limit_A }),
  });
  return { ...start, capacitance_F, assumed: !given };
}
