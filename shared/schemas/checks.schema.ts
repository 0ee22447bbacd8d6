import { z } from 'zod';
import { tightestSchema } from './headroom.schema';
import { conditionsSchema, loadStepSchema } from './rail-spec.schema';

const verdict = z.object({ holds: z.boolean(), tightest: tightestSchema });

export const serviceFactorSchema = z.object({
  kind: z.enum(['bias', 'temperature', 'ageing', 'tolerance']),
  factor: z.number(),
  estimated: z.boolean(),
  /** What the factor comes from, in a few words. */
  basis: z.string(),
});

/** A part of the bank on this rail: catalogue, in service, and between what it moves over all corners. */
export const partInServiceSchema = z.object({
  part: z.string(),
  catalogue_F: z.number(),
  service_F: z.number(),
  lowest_F: z.number(),
  highest_F: z.number(),
  factors: z.array(serviceFactorSchema),
  estimated: z.boolean(),
});
export type PartInService = z.infer<typeof partInServiceSchema>;

export const stepCheckSchema = z.object({
  droop_V: z.number(),
  droop_time_s: z.number(),
  overshoot_V: z.number(),
});

export const patternCheckSchema = z.object({
  /** Largest fall below the voltage without load, and largest rise above it, that any pattern of the load can make. */
  fall_V: z.number(),
  rise_V: z.number(),
  /** The larger of both swings about the settled voltage: what is held against the ripple. */
  swing_V: z.number(),
  simulated_V: z.number(),
  edges: z.int(),
  /** The resonance that adds most to it. */
  frequency_Hz: z.number().nullable(),
  q: z.number().nullable(),
});

export const startUpCheckSchema = z.object({
  capacitance_F: z.number(),
  charge_C: z.number(),
  energy_J: z.number(),
  /** At the regulator's soft start; null: none is given. */
  current_A: z.number().nullable(),
  limit_A: z.number().nullable(),
  holds: z.boolean().nullable(),
  /** Soft start that keeps within the limit. */
  needed_s: z.number().nullable(),
});

/** Everything that is checked of a rail beside its headroom; kept by a revision. Parts in service unless said otherwise. */
export const railChecksSchema = z.object({
  conditions: conditionsSchema,
  /** The rail states none: the usual ones stand in. */
  assumed: z.boolean(),
  parts: z.array(partInServiceSchema),
  catalogue: verdict,
  service: verdict,
  worst: verdict.extend({ corner: z.string() }),
  corners: z.int(),
  missing: verdict
    .extend({ part: z.string(), line: z.int(), tightest: tightestSchema.nullable() })
    .nullable(),
  /** Ripple that the bank may use, volt; null: nothing says how much. */
  allowance_V: z.number().nullable(),
  /** null with the reason in `timeReason`. */
  /** The step that was tried; `assumed` where only the target's own says how large it is. */
  load: loadStepSchema.nullable(),
  load_assumed: z.boolean(),
  step: stepCheckSchema.nullable(),
  /** The corner that takes the step furthest. */
  worst_step: z.object({ corner: z.string(), droop_V: z.number(), overshoot_V: z.number() }).nullable(),
  pattern: patternCheckSchema.nullable(),
  timeReason: z.string().nullable(),
  /** Members whose tables a series R–L–C stands in for in time. */
  approximated: z.array(z.string()),
  start_up: startUpCheckSchema,
});
export type RailChecks = z.infer<typeof railChecksSchema>;
