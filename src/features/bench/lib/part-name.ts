import type { Part } from '@shared/schemas/part.schema';
import { formatQuantity } from '@shared/units/format';

/** How a part is called on the bench: `47 µF X6S 1206`, `470 µF polymer 7343`. */
export function partName(
  part: Pick<Part, 'capacitance_F' | 'dielectric' | 'technology' | 'caseSize'>,
): string {
  return [
    formatQuantity(part.capacitance_F, 'F', { trim: true }),
    part.technology === 'ceramic' ? part.dielectric : part.technology,
    part.caseSize,
  ]
    .filter(Boolean)
    .join(' ');
}
