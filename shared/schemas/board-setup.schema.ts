import { z } from 'zod';
import { idSchema, nameSchema, versionSchema } from './common.schema';

const positive = (what: string, most: number) =>
  z.number().gt(0, `${what} must be above zero`).max(most, `${what} is too large`);

const layerName = z
  .string()
  .trim()
  .min(1, 'must not be empty')
  .max(40, 'at most 40 characters')
  .regex(/^[^\p{Cc}]*$/u, 'must not contain control characters');

/** One layer of the board, as ordered from the fabricator. */
export const layerSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('copper'),
    name: layerName,
    thickness_m: positive('thickness', 0.01),
    use: z.enum(['signal', 'plane']),
  }),
  z.strictObject({
    kind: z.literal('dielectric'),
    name: layerName,
    thickness_m: positive('thickness', 0.05),
    relative_permittivity: z.number().min(1, 'relative permittivity is at least 1').max(1000),
  }),
]);
export type Layer = z.infer<typeof layerSchema>;

/** Layers from the top side down: copper outside, dielectric between every two coppers. */
export const stackupSchema = z
  .strictObject({ layers: z.array(layerSchema).min(3, 'a stack-up has at least three layers').max(80) })
  .superRefine(({ layers }, ctx) => {
    const names = new Set<string>();
    layers.forEach((layer, i) => {
      if (layer.kind === 'copper' && names.has(layer.name))
        ctx.addIssue({
          code: 'custom',
          path: ['layers', i, 'name'],
          message: 'another copper layer has this name',
        });
      if (layer.kind === 'copper') names.add(layer.name);
      if (i > 0 && layer.kind === 'copper' && layers[i - 1].kind === 'copper')
        ctx.addIssue({ code: 'custom', path: ['layers', i, 'kind'], message: 'needs a dielectric above it' });
    });
    for (const i of [0, layers.length - 1])
      if (layers[i]?.kind !== 'copper')
        ctx.addIssue({ code: 'custom', path: ['layers', i, 'kind'], message: 'the outer layers are copper' });
  });
export type Stackup = z.infer<typeof stackupSchema>;

/**
 * A way to mount a capacitor: from each of its two pads a trace to a via down to its plane. Several pairs of vias share the
 * current; `coupling` says how much of each pair's inductance its neighbours add (0: none, 1: all, so that more pairs do not help).
 */
export const mountRecipeSchema = z
  .strictObject({
    id: idSchema,
    name: nameSchema,
    /** From the pad's edge to the via's centre, on each side; 0: via in the pad. */
    trace_length_m: z.number().min(0, 'length must not be negative').max(0.1, 'length is too large'),
    trace_width_m: positive('width', 0.05),
    via_drill_m: positive('drill', 0.01),
    /** Centre to centre of the two vias of a pair. */
    via_spacing_m: positive('spacing', 0.1),
    via_pairs: z.int('must be a whole number').min(1, 'at least one pair').max(8, 'at most 8 pairs'),
    coupling: z.number().min(0, 'at least 0').max(1, 'at most 1'),
  })
  .superRefine((recipe, ctx) => {
    if (recipe.via_spacing_m <= recipe.via_drill_m)
      ctx.addIssue({ code: 'custom', path: ['via_spacing_m'], message: 'must be wider than the drill' });
  });
export type MountRecipe = z.infer<typeof mountRecipeSchema>;

/** What all rails of a board share: how it is built and how parts are mounted on it. */
export const boardSetupSchema = z.strictObject({
  stackup: stackupSchema.nullable(),
  recipes: z
    .array(mountRecipeSchema)
    .max(50, 'at most 50 recipes')
    .superRefine((recipes, ctx) => {
      const seen = new Set<string>();
      recipes.forEach((recipe, i) => {
        const key = recipe.name.toLowerCase();
        if (seen.has(key))
          ctx.addIssue({ code: 'custom', path: [i, 'name'], message: 'another recipe has this name' });
        seen.add(key);
      });
    }),
});
export type BoardSetup = z.infer<typeof boardSetupSchema>;
export const EMPTY_SETUP: BoardSetup = { stackup: null, recipes: [] };

/** A save names the setup's version that it started from. */
export const setBoardSetupSchema = z.strictObject({ version: versionSchema, setup: boardSetupSchema });
