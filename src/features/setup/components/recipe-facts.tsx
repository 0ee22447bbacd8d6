import type { MountRecipe } from '@shared/schemas/board-setup.schema';
import { formatLength } from '@shared/units/format';
import { Facts } from '@/components/ui/facts';

/** The geometry of a recipe for who may only look. */
export function RecipeFacts({ recipe }: { recipe: MountRecipe }) {
  return (
    <Facts
      rows={[
        ['trace length l', recipe.trace_length_m === 0 ? 'via in pad' : formatLength(recipe.trace_length_m)],
        ['trace width w', formatLength(recipe.trace_width_m)],
        ['via spacing s', formatLength(recipe.via_spacing_m)],
        ['via drill d', formatLength(recipe.via_drill_m)],
        ['via pairs n', recipe.via_pairs],
        ['coupling k', recipe.coupling],
      ]}
    />
  );
}
