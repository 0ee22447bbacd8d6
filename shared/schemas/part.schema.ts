import { z } from 'zod';
import {
  idSchema,
  isoDateSchema,
  pageOf,
  pageQuerySchema,
  personRefSchema,
  versionSchema,
} from './common.schema';

export const partStateSchema = z.enum(['draft', 'approved', 'retired']);
export type PartState = z.infer<typeof partStateSchema>;

/** Kinds of capacitor by construction; ceramics are told apart further by their dielectric code. */
export const technologySchema = z.enum(['ceramic', 'polymer', 'tantalum', 'aluminium', 'film']);
export type Technology = z.infer<typeof technologySchema>;

export const terminationSchema = z.enum(['standard', 'soft', 'stacked', 'high-reliability']);

/** IEC 60062 tolerance letters, as printed on the part. */
export const toleranceSchema = z.enum(['B', 'C', 'D', 'F', 'G', 'J', 'K', 'M', 'Z']);

const positive = (max: number) => z.number().gt(0, 'must be above zero').max(max, 'is too large');
const notNegative = (max: number) => z.number().min(0, 'must not be negative').max(max, 'is too large');

/** Identifies a part in documents and lists: letters, digits and a few signs, no spaces. */
export const partNumberSchema = z
  .string()
  .trim()
  .min(1, 'must not be empty')
  .max(60, 'at most 60 characters')
  .regex(
    /^[\p{L}\p{N}][\p{L}\p{N}._/+-]*$/u,
    'letters, digits and . _ / + - only, starting with a letter or digit',
  );

/** What a person enters about a part. Values are catalogue values. */
export const partFieldsSchema = z.strictObject({
  partNumber: partNumberSchema,
  description: z.string().trim().max(200, 'at most 200 characters').default(''),
  technology: technologySchema,
  /** EIA-198 / IEC 60384 code of a ceramic, e.g. X7R; empty where there is none. */
  dielectric: z.string().trim().max(12).default(''),
  /** Case code, inch (EIA), e.g. 0402; chip polymers by metric code, e.g. 7343. */
  caseSize: z.string().trim().min(1, 'must not be empty').max(12),
  capacitance_F: positive(10),
  tolerance: toleranceSchema,
  rated_voltage_V: positive(1e5),
  esr_ohm: notNegative(1e6),
  esl_H: notNegative(1),
  /** Inductance of its usual mount (pads, traces, vias), when a bank line says nothing else. */
  mount_H: notNegative(1),
  height_mm: positive(200).nullable().default(null),
  termination: terminationSchema.default('standard'),
  unit_cost: notNegative(1e6).nullable().default(null),
  area_mm2: positive(1e6).nullable().default(null),
});
export type PartFields = z.infer<typeof partFieldsSchema>;

export const partSchema = partFieldsSchema.extend({
  id: idSchema,
  state: partStateSchema,
  version: versionSchema,
  createdAt: isoDateSchema,
  updatedAt: isoDateSchema,
  updatedBy: personRefSchema.nullable(),
});
export type Part = z.infer<typeof partSchema>;

export const createPartSchema = partFieldsSchema;
const { description, dielectric, height_mm, termination, unit_cost, area_mm2 } = partFieldsSchema.shape;
/** What is left out stays as it is: without their defaults, which would stand in for a missing field. */
export const updatePartSchema = partFieldsSchema
  .extend({
    description: description.unwrap(),
    dielectric: dielectric.unwrap(),
    height_mm: height_mm.unwrap(),
    termination: termination.unwrap(),
    unit_cost: unit_cost.unwrap(),
    area_mm2: area_mm2.unwrap(),
  })
  .partial()
  .extend({ version: versionSchema });
export const setPartStateSchema = z.strictObject({ version: versionSchema, state: partStateSchema });

export const partSortSchema = z.enum([
  'partNumber',
  'capacitance_F',
  'esr_ohm',
  'esl_H',
  'rated_voltage_V',
  'unit_cost',
  'area_mm2',
  'caseSize',
  'dielectric',
  'state',
]);

export const partQuerySchema = pageQuerySchema.extend({
  /** Free text over part number, description, dielectric and case. */
  q: z.string().trim().max(80).optional(),
  technology: technologySchema.optional(),
  dielectric: z.string().trim().max(12).optional(),
  caseSize: z.string().trim().max(12).optional(),
  state: partStateSchema.optional(),
  min_rated_V: z.coerce.number().min(0).max(1e5).optional(),
  min_F: z.coerce.number().min(0).max(10).optional(),
  max_F: z.coerce.number().min(0).max(10).optional(),
  sort: partSortSchema.default('capacitance_F'),
  order: z.enum(['asc', 'desc']).default('desc'),
});
export type PartQuery = z.infer<typeof partQuerySchema>;
export const partPageSchema = pageOf(partSchema);

const facetSchema = z.array(z.object({ value: z.string(), count: z.int() }));
/** What the library holds, for filters: each value with how many parts have it. */
export const partFacetsSchema = z.object({
  technologies: facetSchema,
  dielectrics: facetSchema,
  caseSizes: facetSchema,
});
export type PartFacets = z.infer<typeof partFacetsSchema>;
