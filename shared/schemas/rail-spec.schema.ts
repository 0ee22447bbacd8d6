import { z } from 'zod';
import './plain-messages';

/** Finite numbers only (zod refuses NaN and infinities); the ranges keep typing slips out, not real designs. */
const positive = (what: string, max = 1e15) =>
  z.number().gt(0, `${what} must be above zero`).max(max, `${what} is too large`);
const notNegative = (what: string, max = 1e15) =>
  z.number().min(0, `${what} must not be negative`).max(max, `${what} is too large`);

export const frequencySchema = positive('frequency');

const risingFrequencies = (points: readonly (readonly number[])[], ctx: z.RefinementCtx) => {
  for (let i = 1; i < points.length; i++)
    if (points[i][0] <= points[i - 1][0])
      ctx.addIssue({ code: 'custom', path: [i, 0], message: 'frequencies must rise from point to point' });
};

/**
 * A level target may rise by 20 dB a decade from some frequency on: from 1/(π·rise_s), where the spectrum of a trapezoidal load
 * falls by as much, or from where the reactance of `rising_H` reaches it.
 */
const rising = {
  rise_s: positive('rise time', 10)
    .optional()
    .describe(
      'Rise time of the load in s: the target rises 20 dB a decade from 1/(π·rise_s) on. Not together with rising_H',
    ),
  rising_H: positive('inductance', 1)
    .optional()
    .describe(
      'Inductance in H: the target rises 20 dB a decade from where its reactance reaches the level. Not together with rise_s',
    ),
};
const oneRise = (
  target: { rise_s?: number | undefined; rising_H?: number | undefined },
  ctx: z.RefinementCtx,
) => {
  if (target.rise_s !== undefined && target.rising_H !== undefined)
    ctx.addIssue({
      code: 'custom',
      path: ['rising_H'],
      message: 'give a rise time or an inductance, not both',
    });
};

export const targetSchema = z.discriminatedUnion('kind', [
  z
    .strictObject({ kind: z.literal('flat'), impedance_ohm: positive('target impedance', 1e6), ...rising })
    .superRefine(oneRise)
    .describe('One level in ohm over the whole band'),
  z
    .strictObject({
      kind: z.literal('step'),
      ripple_percent: positive('ripple', 100),
      step_A: positive('load step', 1e5),
      ...rising,
    })
    .superRefine(oneRise)
    .describe('Level = voltage_V · ripple_percent / 100 / step_A'),
  z.strictObject({
    kind: z.literal('mask'),
    points: z
      .array(z.tuple([frequencySchema, positive('impedance', 1e6)]))
      .min(1, 'a mask needs at least one point')
      .max(200, 'at most 200 points')
      .superRefine(risingFrequencies)
      .describe(
        '[Hz, ohm], frequencies rising; straight between the points on log–log paper, level beyond its ends',
      ),
  }),
]);
export type Target = z.infer<typeof targetSchema>;

export const bandSchema = z
  .tuple([frequencySchema, frequencySchema])
  .superRefine((band, ctx) => {
    if (band[1] <= band[0])
      ctx.addIssue({ code: 'custom', path: [1], message: 'the end of the band must lie above its start' });
  })
  .describe('[start, end] in Hz: where the impedance is held against the target');

export const sourceSchema = z
  .discriminatedUnion('kind', [
    z.strictObject({
      kind: z.literal('rl'),
      resistance_ohm: notNegative('resistance'),
      inductance_H: notNegative('inductance'),
    }),
    z.strictObject({
      kind: z.literal('damped'),
      series_resistance_ohm: notNegative('resistance').default(0),
      series_inductance_H: notNegative('inductance').default(0),
      inductor_resistance_ohm: notNegative('resistance').default(0),
      inductance_H: notNegative('inductance'),
      damping_ohm: notNegative('resistance'),
      damping_inductance_H: notNegative('inductance').default(0),
    }),
    z.strictObject({
      kind: z.literal('table'),
      points: z
        .array(z.tuple([frequencySchema, notNegative('resistance'), z.number()]))
        .min(2, 'a table needs at least two points')
        .max(20_000, 'at most 20 000 points')
        .superRefine(risingFrequencies)
        .describe(
          '[Hz, Re, Im] in ohm, frequencies rising; read between and beyond its points as a part’s impedance_table is',
        ),
    }),
    z.strictObject({ kind: z.literal('open') }),
  ])
  .superRefine((source, ctx) => {
    if (source.kind === 'damped' && source.series_resistance_ohm === 0 && source.series_inductance_H === 0) {
      // Without R0 and L0 an inductor or a damping of nothing would make the source ideal.
      if (source.damping_ohm === 0 && source.damping_inductance_H === 0)
        ctx.addIssue({
          code: 'custom',
          path: ['damping_ohm'],
          message: 'needs a resistance or an inductance',
        });
      if (source.inductance_H === 0 && source.inductor_resistance_ohm === 0)
        ctx.addIssue({
          code: 'custom',
          path: ['inductance_H'],
          message: 'needs an inductance or a resistance',
        });
    }
    if (source.kind === 'rl' && source.resistance_ohm === 0 && source.inductance_H === 0)
      ctx.addIssue({
        code: 'custom',
        path: ['resistance_ohm'],
        message: 'resistance and inductance are both zero',
      });
  });
export type Source = z.infer<typeof sourceSchema>;

/** What a plane pair's capacitance was computed from, kept so that it can be edited. */
export const planeGeometrySchema = z.strictObject({
  length_m: positive('length', 10).describe('Length of the plane pair in m'),
  width_m: positive('width', 10).describe('Width of the plane pair in m'),
  spacing_m: positive('spacing', 0.1).describe('Dielectric between the two planes in m'),
  relative_permittivity: z.number().min(1, 'relative permittivity is at least 1').max(1000),
  /** Effective radius of a capacitor's vias and of the load's, for the path inductance between them. */
  via_radius_m: positive('radius', 0.1)
    .default(1.5e-4)
    .describe('Effective radius in m of a capacitor’s vias, for the path inductance to the load'),
  load_radius_m: positive('radius', 0.1)
    .default(1.5e-3)
    .describe('Effective radius in m of the load, for the path inductance to it'),
  /** The two copper layers of the board's stack-up that spacing and permittivity come from, by name; upper one first. */
  pair: z.tuple([z.string().min(1).max(40), z.string().min(1).max(40)]).optional(),
});
export type PlaneGeometry = z.infer<typeof planeGeometrySchema>;

export const planeSchema = z.strictObject({
  capacitance_F: positive('capacitance', 1),
  resistance_ohm: notNegative('resistance', 1e6),
  inductance_H: notNegative('inductance', 1),
  geometry: planeGeometrySchema.optional().describe('Without it, distances of the bank count for nothing'),
});
export type Plane = z.infer<typeof planeSchema>;

export const packageSchema = z.strictObject({
  resistance_ohm: notNegative('resistance', 1e6).describe('From pins to die, in series, in ohm'),
  inductance_H: notNegative('inductance', 1).describe('From pins to die, in series, in H'),
  die_capacitance_F: notNegative('capacitance', 1)
    .default(0)
    .describe('Capacitance of the die in F; 0: none'),
  die_resistance_ohm: notNegative('resistance', 1e6)
    .default(0)
    .describe('In series with the die’s capacitance, in ohm'),
});

export const loadStepSchema = z
  .strictObject({
    before_A: notNegative('current', 1e5).describe('Load before the step, in A'),
    step_A: positive('current step', 1e5).describe('What is added to it, in A'),
    rise_s: positive('rise time', 10).describe('From the start of the rise to its end, in s'),
    hold_s: positive('hold time', 1e4).describe('From the end of the rise to the start of the fall, in s'),
    fall_s: positive('fall time', 10).describe('From the start of the fall to its end, in s'),
    end_s: positive('end', 1e4)
      .optional()
      .describe(
        'End of what is computed, in s from the start of the rise; without it as long as the rail needs to settle',
      ),
  })
  .superRefine((step, ctx) => {
    if (step.end_s !== undefined && step.end_s <= step.rise_s)
      ctx.addIssue({ code: 'custom', path: ['end_s'], message: 'must lie after the rise' });
  });

/** How the band was found, kept so that it can be edited: knee/rise time above, regulator bandwidth below. */
export const bandBasisSchema = z.strictObject({
  rise_s: positive('rise time', 1),
  knee: z.union([z.literal(0.35), z.literal(0.5)]).default(0.35),
  regulator_bandwidth_Hz: frequencySchema,
});
export type BandBasis = z.infer<typeof bandBasisSchema>;

const celsius = (what: string) =>
  z.number().min(-100, `${what} is below −100 °C`).max(300, `${what} is above 300 °C`);

/** Under what the rail must hold: in service at the usual temperature and full age, worst cases over all of it. */
export const conditionsSchema = z
  .strictObject({
    coldest_C: celsius('temperature').describe('In °C, one end of the worst cases'),
    usual_C: celsius('temperature').describe('In °C, where parts are in service'),
    hottest_C: celsius('temperature').describe('In °C, the other end of the worst cases'),
    /** Hours that the parts have been in use; ageing counts from 1000 h. */
    age_h: z
      .number()
      .min(0, 'age must not be negative')
      .max(1e6, 'age is too large')
      .describe('Hours in use; ageing counts from 1000 h, 10 years are 87660 h'),
    /** Which tolerances go to their ends in the worst cases. */
    vary: z
      .array(z.enum(['capacitance', 'esr', 'esl']))
      .max(3)
      .describe('Tolerances that go to their ends in the worst cases'),
  })
  .superRefine((c, ctx) => {
    if (c.usual_C < c.coldest_C)
      ctx.addIssue({ code: 'custom', path: ['usual_C'], message: 'must not lie below the coldest' });
    if (c.hottest_C < c.usual_C)
      ctx.addIssue({ code: 'custom', path: ['hottest_C'], message: 'must not lie below the usual' });
    if (new Set(c.vary).size < c.vary.length)
      ctx.addIssue({ code: 'custom', path: ['vary'], message: 'names a tolerance twice' });
  });
export type Conditions = z.infer<typeof conditionsSchema>;

/** What the rail's tolerance is spent on before the bank gets the rest as ripple. */
export const noiseBudgetSchema = z.strictObject({
  /** Rail tolerance of the load, ± per cent of the rail's voltage. */
  tolerance_percent: positive('tolerance', 100).describe('What the load tolerates, ± per cent of voltage_V'),
  setpoint_percent: notNegative('set-point error', 100).describe(
    'Spent on the regulator’s set-point, ± per cent of voltage_V',
  ),
  dc_drop_V: notNegative('DC drop', 1e4).describe('Spent on the way to the load, in V'),
  regulator_ripple_V: notNegative('ripple', 1e4).describe('Spent on the regulator’s own ripple, in V'),
});
export type NoiseBudget = z.infer<typeof noiseBudgetSchema>;

/** Ripple in per cent of the rail that a budget leaves for the bank; zero or less: nothing is left. */
export const rippleLeft_percent = (budget: NoiseBudget, voltage_V: number): number =>
  budget.tolerance_percent -
  budget.setpoint_percent -
  (100 * (budget.dc_drop_V + budget.regulator_ripple_V)) / voltage_V;

export const startUpSchema = z.strictObject({
  /** Time in which the regulator ramps the rail from zero. */
  soft_start_s: positive('soft start', 100),
  /** What the regulator gives before it limits. */
  current_limit_A: positive('current limit', 1e5),
});

export const railNameSchema = z
  .string()
  .trim()
  .min(1, 'must not be empty')
  .max(60, 'at most 60 characters')
  .regex(/^[^\p{Cc}]*$/u, 'must not contain control characters');

/** Everything that is said about a rail but its bank. The `rail` object of the rail document. */
export const railSpecSchema = z
  .strictObject({
    name: railNameSchema,
    voltage_V: positive('voltage', 1e4),
    target: targetSchema,
    band_Hz: bandSchema,
    band_basis: bandBasisSchema.optional(),
    source: sourceSchema,
    plane: planeSchema.optional(),
    package: packageSchema.optional(),
    observe: z.enum(['pins', 'die']).default('pins'),
    load_step: loadStepSchema.optional(),
    conditions: conditionsSchema
      .optional()
      .describe('Under what the rail must hold; without them the usual ones are assumed'),
    noise_budget: noiseBudgetSchema
      .optional()
      .describe(
        'What is left of the tolerance is the bank’s ripple; ripple_percent of a step target must agree',
      ),
    start_up: startUpSchema.optional(),
  })
  .superRefine((rail, ctx) => {
    if (rail.noise_budget) {
      const left = rippleLeft_percent(rail.noise_budget, rail.voltage_V);
      if (!(left > 0))
        ctx.addIssue({
          code: 'custom',
          path: ['noise_budget', 'tolerance_percent'],
          message: 'nothing is left for the bank: the tolerance is spent',
        });
      else if (rail.target.kind === 'step' && Math.abs(rail.target.ripple_percent / left - 1) > 1e-6)
        ctx.addIssue({
          code: 'custom',
          path: ['target', 'ripple_percent'],
          message: `does not agree with noise_budget, which leaves ${left} %`,
        });
    }
    const basis = rail.band_basis;
    if (basis) {
      const expected = [basis.regulator_bandwidth_Hz, basis.knee / basis.rise_s];
      expected.forEach((f, i) => {
        if (Math.abs(rail.band_Hz[i] / f - 1) > 1e-6)
          ctx.addIssue({
            code: 'custom',
            path: ['band_Hz', i],
            message: `does not agree with band_basis, which gives ${f} Hz`,
          });
      });
    }
    if (rail.observe === 'die' && !rail.package)
      ctx.addIssue({
        code: 'custom',
        path: ['package'],
        message: 'to look from the die, say what the package is',
      });
  });
export type RailSpec = z.infer<typeof railSpecSchema>;
export type RailSpecInput = z.input<typeof railSpecSchema>;
