import type { Fault } from './read-setup';
import type { LayerForm, RecipeForm, SetupForm } from './setup-form';

export type LayerField = Exclude<keyof LayerForm, 'key'>;
export type RecipeField = Exclude<keyof RecipeForm, 'id' | 'removed'>;

/** What is wrong, at the field it belongs to; layers by their key, recipes by their id. */
export interface FieldFaults {
  layers: Readonly<Record<string, Partial<Record<LayerField, string>>>>;
  recipes: Readonly<Record<string, Partial<Record<RecipeField, string>>>>;
  /** Of the stack-up, the recipes or the whole, where no field can be named. */
  stackup: string[];
  recipeList: string[];
  other: string[];
}

const LAYER_FIELDS: Readonly<Record<string, LayerField>> = {
  name: 'name',
  kind: 'kind',
  use: 'kind',
  thickness_m: 'thickness',
  relative_permittivity: 'permittivity',
};
const RECIPE_FIELDS: Readonly<Record<string, RecipeField>> = {
  name: 'name',
  trace_length_m: 'traceLength',
  trace_width_m: 'traceWidth',
  via_drill_m: 'drill',
  via_spacing_m: 'spacing',
  via_pairs: 'pairs',
  coupling: 'coupling',
};

export const NO_FAULTS: FieldFaults = { layers: {}, recipes: {}, stackup: [], recipeList: [], other: [] };

/**
 * Puts faults found by the schema, here or on the server (whose paths begin with `setup.`), at the rows of the form that was
 * read. The first fault of a field counts.
 */
export function faultsAtFields(form: SetupForm, faults: readonly Fault[]): FieldFaults {
  const kept = form.recipes.filter((recipe) => !recipe.removed);
  const layers: Record<string, Partial<Record<LayerField, string>>> = {};
  const recipes: Record<string, Partial<Record<RecipeField, string>>> = {};
  const rest = { stackup: [] as string[], recipeList: [] as string[], other: [] as string[] };
  for (const { path, message } of faults) {
    const inner = path.replace(/^setup\.?/, '');
    const [, list, index, name] = /^(stackup\.layers|recipes)\[(\d+)\](?:\.(\w+))?/.exec(inner) ?? [];
    const layer = list === 'stackup.layers' ? form.layers?.[Number(index)] : undefined;
    const recipe = list === 'recipes' ? kept[Number(index)] : undefined;
    if (layer) {
      const field = LAYER_FIELDS[name] ?? 'name';
      layers[layer.key] = { [field]: message, ...layers[layer.key] };
    } else if (recipe) {
      const field = RECIPE_FIELDS[name] ?? 'name';
      recipes[recipe.id] = { [field]: message, ...recipes[recipe.id] };
    } else if (inner.startsWith('stackup')) rest.stackup.push(message);
    else if (inner.startsWith('recipes')) rest.recipeList.push(message);
    else rest.other.push(message);
  }
  return { layers, recipes, ...rest };
}

/** Faults of a field: what is wrong with what stands there now comes before what the server said of it. */
export function together(own: FieldFaults, theirs: FieldFaults): FieldFaults {
  const join = <T extends object>(a: Readonly<Record<string, T>>, b: Readonly<Record<string, T>>) =>
    Object.fromEntries(
      [...new Set([...Object.keys(a), ...Object.keys(b)])].map((k) => [k, { ...b[k], ...a[k] }]),
    );
  return {
    layers: join(own.layers, theirs.layers),
    recipes: join(own.recipes, theirs.recipes),
    stackup: [...own.stackup, ...theirs.stackup],
    recipeList: [...own.recipeList, ...theirs.recipeList],
    other: [...own.other, ...theirs.other],
  };
}

/** How many fields or lists have something wrong. */
export const faultCount = (faults: FieldFaults): number =>
  [...Object.values(faults.layers), ...Object.values(faults.recipes)].reduce(
    (sum, row) => sum + Object.keys(row).length,
    faults.stackup.length + faults.recipeList.length + faults.other.length,
  );
