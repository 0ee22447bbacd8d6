import { z } from 'zod';
import { idSchema, isoDateSchema, personRefSchema, versionSchema } from './common.schema';
import { tightestSchema } from './headroom.schema';
import { partSchema } from './part.schema';
import { objectiveSchema } from './rail-document.schema';
import { railSpecSchema } from './rail-spec.schema';

/** One row of a bank: a part, how many, how mounted, how far from the load. */
export const bankLineSchema = z.strictObject({
  partId: idSchema,
  count: z
    .int('count must be a whole number')
    .min(0, 'count must not be negative')
    .max(9999, 'count must be at most 9999'),
  /** Mounting inductance in henry; null: that of the recipe, or else the part's usual mount. */
  mount_H: z.number().min(0).max(1).nullable().default(null),
  /** One of the board's mount recipes; null: none. */
  recipeId: idSchema.nullable().default(null),
  /** Farthest distance to the load in metres; null: not planned yet. */
  distance_m: z.number().min(0).max(10).nullable().default(null),
  side: z.enum(['top', 'bottom']).default('top'),
  /** A locked line is left as it is by the mix search. */
  locked: z.boolean().default(false),
});
export type BankLine = z.infer<typeof bankLineSchema>;

export const bankSchema = z
  .array(bankLineSchema)
  .max(200, 'at most 200 lines')
  .superRefine((bank, ctx) => {
    const seen = new Set<string>();
    bank.forEach((line, i) => {
      const key = `${line.partId} ${line.mount_H} ${line.recipeId} ${line.distance_m} ${line.side}`;
      if (seen.has(key))
        ctx.addIssue({ code: 'custom', path: [i], message: 'the same part, mounted alike, stands twice' });
      seen.add(key);
    });
  });

export const searchSettingsSchema = z.strictObject({
  minimise: objectiveSchema.default('parts'),
  /** Parts to choose from; null: every approved part whose rating fits the rail. */
  candidateIds: z.array(idSchema).max(500).nullable().default(null),
  max_kinds: z.int().min(1).max(100).nullable().default(null),
  max_per_part: z.int().min(1).max(999).default(80),
  /** Distance of parts that are new to the bank; null: as far as the bank's farthest line. */
  distance_m: z.number().min(0).max(10).nullable().default(null),
});
export type SearchSettings = z.infer<typeof searchSettingsSchema>;

/** Headroom at one set of values. */
export const verdictSchema = z.object({ holds: z.boolean(), tightest: tightestSchema });
export type Verdict = z.infer<typeof verdictSchema>;

/** What lists show of a rail; computed by the server with the shared engine at each save. */
export const railSummarySchema = z.object({
  engineVersion: z.string(),
  /** In service (results of engine 1.0.0: at catalogue values). */
  holds: z.boolean().nullable(),
  tightest: tightestSchema.nullable(),
  /** At catalogue values; in the worst of all corners, with its name; with the one part open that hurts most, in service. */
  catalogue: verdictSchema.nullable().default(null),
  worst: verdictSchema.extend({ corner: z.string() }).nullable().default(null),
  missing: verdictSchema.extend({ part: z.string() }).nullable().default(null),
  parts: z.int(),
  kinds: z.int(),
  /** null where a part of the bank has no price (or no area). */
  cost: z.number().nullable(),
  area_mm2: z.number().nullable(),
  /** Why there is no result, when there is none. */
  error: z.string().nullable(),
});
export type RailSummary = z.infer<typeof railSummarySchema>;

export const railSchema = z.object({
  id: idSchema,
  boardId: idSchema,
  position: z.int(),
  version: versionSchema,
  updatedAt: isoDateSchema,
  updatedBy: personRefSchema.nullable(),
  spec: railSpecSchema,
  bank: z.array(bankLineSchema),
  search: searchSettingsSchema,
  summary: railSummarySchema,
});
export type Rail = z.infer<typeof railSchema>;

/** A rail with the parts its bank uses. */
export const railWithPartsSchema = z.object({ rail: railSchema, parts: z.array(partSchema) });
export type RailWithParts = z.infer<typeof railWithPartsSchema>;
/** All rails of a board by position, with every part that any of them uses. */
export const railListSchema = z.object({ rails: z.array(railSchema), parts: z.array(partSchema) });
export type RailList = z.infer<typeof railListSchema>;

export const createRailSchema = z.strictObject({
  spec: railSpecSchema,
  bank: bankSchema.default([]),
  search: searchSettingsSchema.optional(),
});
export const updateRailSchema = z
  .strictObject({
    version: versionSchema,
    spec: railSpecSchema.optional(),
    bank: bankSchema.optional(),
    search: searchSettingsSchema.optional(),
  })
  .refine((body) => body.spec || body.bank || body.search, {
    message: 'nothing to change: give spec, bank or search',
  });
export type UpdateRail = z.infer<typeof updateRailSchema>;
/** The new order of a board's rails: every rail's id once. */
export const orderRailsSchema = z.strictObject({ railIds: z.array(idSchema).max(500) });
