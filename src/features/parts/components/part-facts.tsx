import type { Part } from '@shared/schemas/part.schema';
import { formatLetterCode, formatQuantity } from '@shared/units/format';
import { Facts } from '@/components/ui/facts';
import { formatCost } from '@/lib/format-cost';
import { dayAndTime } from '@/lib/time';
import { lowestOf } from '../lib/part-curves';
import { TOLERANCES } from '../lib/tolerance';
import { PartStateText } from './part-state';

/** All that the library says about a part. */
export function PartFacts({ part }: { part: Part }) {
  const lowest = lowestOf(part);
  return (
    <Facts
      rows={[
        ['state', <PartStateText key="state" state={part.state} />],
        ['technology', part.technology],
        ['dielectric', part.dielectric || '—'],
        ['case', part.caseSize],
        [
          'capacitance',
          `${formatQuantity(part.capacitance_F, 'F', { trim: true })} (${formatLetterCode(Number(part.capacitance_F.toPrecision(12)), 'F')})`,
        ],
        ['tolerance', `${TOLERANCES[part.tolerance]} (${part.tolerance})`],
        ['rated voltage', formatQuantity(part.rated_voltage_V, 'V', { trim: true })],
        ['ESR', formatQuantity(part.esr_ohm, 'Ω')],
        ['ESL', formatQuantity(part.esl_H, 'H')],
        ['usual mount', formatQuantity(part.mount_H, 'H')],
        ['resonance, mounted', lowest === null ? '—' : formatQuantity(lowest[0], 'Hz')],
        ['height', part.height_mm === null ? '—' : formatQuantity(part.height_mm, 'mm', { trim: true })],
        ['area', part.area_mm2 === null ? '—' : formatQuantity(part.area_mm2, 'mm²', { trim: true })],
        ['termination', part.termination],
        ['price each', formatCost(part.unit_cost, 3)],
        ['updated', `${dayAndTime(part.updatedAt)}${part.updatedBy ? `, ${part.updatedBy.name}` : ''}`],
      ]}
    />
  );
}
