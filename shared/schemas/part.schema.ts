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

/** How a value goes with another: [x, value] with x rising. */
const curve = (what: string, lowest: number, highest: number, most: number, tooMuch: string) =>
  z
    .array(
      z.tuple([
        z.number().min(lowest, `${what} is below ${lowest}`).max(highest, `${what} is above ${highest}`),
        z.number().gt(0, 'the factor must be above zero').max(most, tooMuch),
      ]),
    )
    .min(2, 'a curve needs at least two points')
    .max(200, 'at most 200 points')
    .superRefine((points, ctx) => {
      for (let i = 1; i < points.length; i++)
        if (points[i][0] <= points[i - 1][0])
          ctx.addIssue({ code: 'custom', path: [i, 0], message: `${what} must rise from point to point` });
    });

/** C ÷ C(0 V) over DC voltage: [volt, factor], from 0 V on, with factor 1 there. */
export const biasCurveSchema = curve('voltage', 0, 1e5, 1.5, 'C ÷ C(0 V) is above 1.5')
  .refine(
    (points) => points[0][0] === 0 && Math.abs(points[0][1] - 1) < 1e-9,
    'the first point is 0 V with factor 1',
  )
  .describe('[V, C ÷ C(0 V)], from [0, 1] on, voltages rising');

/** What every factor of a temperature curve is counted from, and how far from 1 it may be read off there. */
const REFERENCE_C = 25;
const READING_ERROR = 0.05;

/** The factor at 25 °C, straight between the points; null: the curve does not reach it. */
function factorAtReference(points: readonly (readonly [number, number])[]): number | null {
  const above = points.findIndex(([t]) => t >= REFERENCE_C);
  if (above < 0) return null;
  const [t, factor] = points[above];
  if (t === REFERENCE_C) return factor;
  if (above === 0) return null;
  const [t0, factor0] = points[above - 1];
  return factor0 + ((factor - factor0) * (REFERENCE_C - t0)) / (t - t0);
}

/** C ÷ C(25 °C) over temperature: [°C, factor], with factor 1 at 25 °C. */
export const temperatureCurveSchema = curve('temperature', -100, 300, 10, 'the factor is too large')
  .superRefine((points, ctx) => {
    const factor = factorAtReference(points);
    if (factor === null)
      ctx.addIssue({
        code: 'custom',
        message: 'the curve must reach 25 °C, which its factors are counted from',
      });
    else if (!(Math.abs(factor - 1) <= READING_ERROR + 1e-12))
      ctx.addIssue({
        code: 'custom',
        message: `C ÷ C(25 °C) must be 1 at 25 °C; this curve is ${Number(factor.toPrecision(3))} there`,
      });
  })
  .describe('[°C, C ÷ C(25 °C)], temperatures rising; reaches 25 °C and is 1 there within 5 %');

const rising = (points: readonly (readonly number[])[], ctx: z.RefinementCtx) => {
  for (let i = 1; i < points.length; i++)
    if (points[i][0] <= points[i - 1][0])
      ctx.addIssue({ code: 'custom', path: [i, 0], message: 'frequencies must rise from point to point' });
};
const frequency = z.number().gt(0, 'frequency must be above zero').max(1e15, 'frequency is too large');

/** ESR over frequency: [Hz, ohm]; between its points straight on log–log paper, level beyond its ends. */
export const esrTableSchema = z
  .array(z.tuple([frequency, z.number().gt(0, 'ESR must be above zero').max(1e6, 'ESR is too large')]))
  .min(2, 'a table needs at least two points')
  .max(2000, 'at most 2000 points')
  .superRefine(rising)
  .describe(
    '[Hz, ohm], frequencies rising; instead of esr_ohm. Straight between its points on log–log paper, level beyond its ends',
  );

/** A measured impedance of the part alone: [Hz, Re, Im] in ohm. */
export const impedanceTableSchema = z
  .array(
    z.tuple([
      frequency,
      z.number().min(0, 'Re Z must not be negative').max(1e9),
      z.number().min(-1e9).max(1e9),
    ]),
  )
  .min(2, 'a table needs at least two points')
  .max(5000, 'at most 5000 points')
  .superRefine(rising)
  .describe(
    '[Hz, Re, Im] in ohm of the part alone, frequencies rising; instead of C, ESR and ESL. ln|Z| and phase straight over ln f between its points, continued by the fitted series R–L–C beyond; mount_H is added',
  );

const percent = (most: number) => z.number().min(0, 'must not be negative').max(most, `at most ${most} %`);

/** What is known of how a part behaves away from its catalogue conditions; null where nothing is: estimates stand in. */
export const partBehaviourShape = {
  bias_curve: biasCurveSchema.nullable().default(null),
  temperature_curve: temperatureCurveSchema.nullable().default(null),
  /** Loss in per cent of the 1000 h value with each decade of hours. */
  ageing_percent_per_decade: percent(20)
    .describe('Loss in per cent of the 1000 h value with each decade of hours')
    .nullable()
    .default(null),
  esr_table: esrTableSchema.nullable().default(null),
  impedance_table: impedanceTableSchema.nullable().default(null),
  esr_tolerance_percent: percent(90).describe('±, in per cent of the ESR').nullable().default(null),
  esl_tolerance_percent: percent(90).describe('±, in per cent of the ESL').nullable().default(null),
};

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
  ...partBehaviourShape,
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

/** B, C and D are picofarads, and stand on parts below 10 pF only: above, makers' tables disagree about them. */
export const toleranceFits = ({
  tolerance,
  capacitance_F,
}: Pick<PartFields, 'tolerance' | 'capacitance_F'>): boolean =>
  !/^[BCD]$/.test(tolerance) || capacitance_F < 10e-12;
export const TOLERANCE_MISFIT = 'B, C and D are picofarads and go with parts below 10 pF';

/** The fields of a part as a whole, with what must hold between them. */
export const createPartSchema = partFieldsSchema.refine(toleranceFits, {
  path: ['tolerance'],
  message: TOLERANCE_MISFIT,
});
const { description, dielectric, height_mm, termination, unit_cost, area_mm2 } = partFieldsSchema.shape;
const behaviour = partFieldsSchema.shape;
/** What is left out stays as it is: without their defaults, which would stand in for a missing field. */
export const updatePartSchema = partFieldsSchema
  .extend({
    description: description.unwrap(),
    dielectric: dielectric.unwrap(),
    height_mm: height_mm.unwrap(),
    termination: termination.unwrap(),
    unit_cost: unit_cost.unwrap(),
    area_mm2: area_mm2.unwrap(),
    bias_curve: behaviour.bias_curve.unwrap(),
    temperature_curve: behaviour.temperature_curve.unwrap(),
    ageing_percent_per_decade: behaviour.ageing_percent_per_decade.unwrap(),
    esr_table: behaviour.esr_table.unwrap(),
    impedance_table: behaviour.impedance_table.unwrap(),
    esr_tolerance_percent: behaviour.esr_tolerance_percent.unwrap(),
    esl_tolerance_percent: behaviour.esl_tolerance_percent.unwrap(),
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
