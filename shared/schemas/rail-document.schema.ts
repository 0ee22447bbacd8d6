import { z } from 'zod';
import { partBehaviourShape, partStateSchema, terminationSchema, toleranceSchema } from './part.schema';
import { frequencySchema, railSpecSchema } from './rail-spec.schema';

const positive = z.number().gt(0, 'must be above zero').max(1e15);
const notNegative = z.number().min(0, 'must not be negative').max(1e15);
const known = partBehaviourShape;

/**
 * A part in a document. Its numbers are taken as they stand; what it says of tolerance, dielectric and curves counts where a
 * rail is looked at in service or in its worst cases.
 */
export const documentPartSchema = z.strictObject({
  id: z.string().min(1, 'must not be empty').max(80),
  capacitance_F: positive,
  esr_ohm: notNegative,
  esl_H: notNegative,
  mount_H: notNegative
    .default(0)
    .describe('Mounting inductance in H: added to esl_H, and to an impedance_table'),
  unit_cost: notNegative.optional(),
  area_mm2: notNegative.optional(),
  description: z.string().max(200).optional(),
  technology: z.string().max(40).optional(),
  dielectric: z.string().max(12).optional(),
  case: z.string().max(12).optional(),
  tolerance: toleranceSchema.optional(),
  rated_voltage_V: positive.optional(),
  height_mm: positive.optional(),
  termination: terminationSchema.optional(),
  /** Where it is not approved for new banks. */
  state: partStateSchema.optional(),
  bias_curve: known.bias_curve.unwrap().unwrap().optional(),
  temperature_curve: known.temperature_curve.unwrap().unwrap().optional(),
  ageing_percent_per_decade: known.ageing_percent_per_decade.unwrap().unwrap().optional(),
  esr_table: known.esr_table.unwrap().unwrap().optional(),
  impedance_table: known.impedance_table.unwrap().unwrap().optional(),
  esr_tolerance_percent: known.esr_tolerance_percent.unwrap().unwrap().optional(),
  esl_tolerance_percent: known.esl_tolerance_percent.unwrap().unwrap().optional(),
});
export type DocumentPart = z.infer<typeof documentPartSchema>;

export const documentLineSchema = z.strictObject({
  part: z.string().min(1),
  count: z
    .int('count must be a whole number')
    .min(1, 'count must be at least 1')
    .max(100_000, 'count must be at most 100 000'),
  /** Mounting inductance of this line, instead of the part's own. */
  mount_H: notNegative
    .optional()
    .describe('Mounting inductance of this line in H, instead of the part’s own'),
  /** The mount recipe that `mount_H` comes from, by name. */
  recipe: z.string().max(80).optional(),
  /** Farthest distance to the load; with the plane's geometry it gives the path inductance. */
  distance_m: notNegative
    .max(10)
    .optional()
    .describe('To the load, in m; adds path inductance only where the plane has its geometry'),
  side: z.enum(['top', 'bottom']).optional(),
  locked: z.boolean().optional(),
});
export type DocumentLine = z.infer<typeof documentLineSchema>;

export const objectiveSchema = z.enum(['parts', 'cost', 'area']);

export const documentSearchSchema = z.strictObject({
  minimise: objectiveSchema.default('parts').describe('Number of parts, their unit_cost or their area_mm2'),
  candidates: z
    .array(z.string().min(1))
    .min(1, 'name at least one candidate')
    .max(500)
    .describe('Parts to choose from, by id'),
  max_kinds: z.int().min(1).max(500).optional().describe('Most different parts in a mix'),
  max_per_part: z.int().min(1).max(10_000).optional().describe('Most of one part in a mix'),
  /** How far from the load a candidate sits that the bank does not hold yet. */
  distance_m: notNegative
    .max(10)
    .optional()
    .describe('Distance in m of candidates that the bank does not hold; without it the bank’s farthest'),
  seed: z.int().min(0).max(4_294_967_295).optional().describe('The same seed gives the same search'),
});

/** One rail in one JSON document. Unknown keys are refused; the fixed fields never change their meaning. */
export const railDocumentSchema = z
  .strictObject({
    format: z.literal('millpond-rail'),
    version: z.literal(1),
    rail: railSpecSchema,
    parts: z.array(documentPartSchema).max(20_000),
    bank: z.array(documentLineSchema).max(2000).default([]),
    search: documentSearchSchema.optional(),
    frequencies_Hz: z.array(frequencySchema).min(1, 'name at least one frequency').max(1_000_000).optional(),
  })
  .superRefine((document, ctx) => {
    const known = new Set<string>();
    document.parts.forEach((part, i) => {
      if (known.has(part.id))
        ctx.addIssue({ code: 'custom', path: ['parts', i, 'id'], message: `part ${part.id} stands twice` });
      known.add(part.id);
    });
    document.bank.forEach((line, i) => {
      if (!known.has(line.part))
        ctx.addIssue({
          code: 'custom',
          path: ['bank', i, 'part'],
          message: `no part is called ${line.part}`,
        });
    });
    document.search?.candidates.forEach((id, i) => {
      if (!known.has(id))
        ctx.addIssue({
          code: 'custom',
          path: ['search', 'candidates', i],
          message: `no part is called ${id}`,
        });
    });
  });
export type RailDocument = z.infer<typeof railDocumentSchema>;
export type RailDocumentInput = z.input<typeof railDocumentSchema>;
