import type { BoardSetup } from '@shared/schemas/board-setup.schema';

const differs = (a: unknown, b: unknown): boolean => JSON.stringify(a) !== JSON.stringify(b);

/** What is not the same in two setups, in words: layers and recipes by their names. */
export function differences(before: BoardSetup, after: BoardSetup): string[] {
  return [...stackupDifferences(before, after), ...recipeDifferences(before, after)];
}

function stackupDifferences(before: BoardSetup, after: BoardSetup): string[] {
  const [old, now] = [before.stackup?.layers ?? [], after.stackup?.layers ?? []];
  if (old.length !== now.length) return ['the number of layers'];
  return now.flatMap((layer, i) => (differs(layer, old[i]) ? [`layer ${layer.name}`] : []));
}

function recipeDifferences(before: BoardSetup, after: BoardSetup): string[] {
  const old = new Map(before.recipes.map((recipe) => [recipe.id, recipe]));
  const now = new Set(after.recipes.map((recipe) => recipe.id));
  return [
    ...after.recipes.filter((recipe) => differs(recipe, old.get(recipe.id))),
    ...before.recipes.filter((recipe) => !now.has(recipe.id)),
  ].map((recipe) => `recipe “${recipe.name}”`);
}
