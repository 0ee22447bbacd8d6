import { z } from 'zod';
import { railChecksSchema } from './checks.schema';
import { idSchema, isoDateSchema, noteSchema, pageOf, personRefSchema } from './common.schema';
import { railSummarySchema } from './rail.schema';
import { railDocumentSchema } from './rail-document.schema';

/** Revisions are lettered A … Z, AA, AB … */
export const letterSchema = z.string().regex(/^[A-Z]{1,3}$/, 'is not a revision letter');

export const peakSchema = z.object({
  frequency_Hz: z.number(),
  impedance_ohm: z.number(),
  target_ohm: z.number().nullable(),
  /** The two members that make it, by part number (or `source`, `plane`, `package and die`). */
  inductive: z.string().nullable(),
  capacitive: z.string().nullable(),
  q: z.number().nullable(),
});
export type RevisionPeak = z.infer<typeof peakSchema>;

/** One capacitor to be placed. */
export const instanceSchema = z.object({
  designator: z.string(),
  partNumber: z.string(),
  value: z.string(),
  caseSize: z.string(),
  side: z.enum(['top', 'bottom']),
  rail: z.string(),
  mount_H: z.number(),
  /** The mount recipe that it comes from, by name. */
  recipe: z.string().optional(),
  /** Planned distance in metres; null: not planned. */
  distance_m: z.number().nullable(),
  /** The farthest its line may sit before the rail is short; null with `farthestReason`. */
  farthest_m: z.number().nullable(),
  farthestReason: z.string().nullable(),
});
export type Instance = z.infer<typeof instanceSchema>;

export const revisionRailSchema = z.object({
  railId: idSchema,
  document: railDocumentSchema,
  summary: railSummarySchema,
  peaks: z.array(peakSchema),
  instances: z.array(instanceSchema),
  /** null: cut by an engine before 2.0, or the rail has no result. */
  checks: railChecksSchema.nullable().default(null),
});
export type RevisionRail = z.infer<typeof revisionRailSchema>;

export const revisionSchema = z.object({
  id: idSchema,
  boardId: idSchema,
  letter: letterSchema,
  note: z.string(),
  createdAt: isoDateSchema,
  createdBy: personRefSchema,
  engineVersion: z.string(),
  /** SHA-256 over the canonical snapshot, hexadecimal. */
  hash: z.string(),
  rails: z.object({ total: z.int(), hold: z.int(), short: z.int(), unknown: z.int() }),
  parts: z.int(),
  cost: z.number().nullable(),
  area_mm2: z.number().nullable(),
});
export type Revision = z.infer<typeof revisionSchema>;
export const revisionPageSchema = pageOf(revisionSchema);

export const revisionDetailSchema = revisionSchema.extend({
  boardName: z.string(),
  railResults: z.array(revisionRailSchema),
});
export type RevisionDetail = z.infer<typeof revisionDetailSchema>;

export const cutRevisionSchema = z.strictObject({ note: noteSchema.min(1, 'say what this revision is for') });
