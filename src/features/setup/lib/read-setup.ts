import { type BoardSetup, boardSetupSchema } from '@shared/schemas/board-setup.schema';
import { formatPath } from '@shared/schemas/common.schema';
import { type Parsed, parseLength, parseQuantity } from '@shared/units/parse';
import type { LayerForm, RecipeForm, SetupForm } from './setup-form';

export interface Fault {
  /** As the schema names it: `stackup.layers[3].thickness_m`. */
  path: string;
  message: string;
}

/** Text → number, or NaN with its fault noted at `path`. */
export type Take = (path: string, parsed: Parsed) => number;

const number = (text: string): Parsed => parseQuantity(text, '');

function readLayer(layer: LayerForm, path: string, take: Take): unknown {
  const common = { name: layer.name, thickness_m: take(`${path}.thickness_m`, parseLength(layer.thickness)) };
  if (layer.kind !== 'dielectric') return { kind: 'copper', ...common, use: layer.kind };
  const relative_permittivity = take(`${path}.relative_permittivity`, number(layer.permittivity));
  return { kind: 'dielectric', ...common, relative_permittivity };
}

/** The schema’s view of a typed recipe, not checked yet. */
export function readRecipe(recipe: RecipeForm, path: string, take: Take): unknown {
  const length = (field: string, text: string) => take(`${path}.${field}`, parseLength(text));
  return {
    id: recipe.id,
    name: recipe.name,
    trace_length_m: length('trace_length_m', recipe.traceLength),
    trace_width_m: length('trace_width_m', recipe.traceWidth),
    via_drill_m: length('via_drill_m', recipe.drill),
    via_spacing_m: length('via_spacing_m', recipe.spacing),
    via_pairs: take(`${path}.via_pairs`, number(recipe.pairs)),
    coupling: take(`${path}.coupling`, number(recipe.coupling)),
  };
}

/** Reads the form without what is to be removed: a setup that may be saved, or what is wrong and where. */
export function readSetup(form: SetupForm): { setup: BoardSetup } | { faults: Fault[] } {
  const unread: Fault[] = [];
  const take: Take = (path, parsed) => {
    if (parsed.ok) return parsed.value;
    unread.push({ path, message: parsed.reason });
    return Number.NaN;
  };
  const layers = form.layers?.map((layer, i) => readLayer(layer, `stackup.layers[${i}]`, take));
  const kept = form.recipes.filter((recipe) => !recipe.removed);
  const recipes = kept.map((recipe, i) => readRecipe(recipe, `recipes[${i}]`, take));
  const checked = boardSetupSchema.safeParse({ stackup: layers ? { layers } : null, recipes });
  if (checked.success) return { setup: checked.data };
  // What could not be read stands there as NaN and has its own sentence already.
  const said = new Set(unread.map((fault) => fault.path));
  const refused = checked.error.issues
    .map((issue) => ({ path: formatPath(issue.path), message: issue.message }))
    .filter((fault) => !said.has(fault.path));
  return { faults: [...unread, ...refused] };
}
