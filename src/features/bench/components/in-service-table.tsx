import { conditionsOf } from '@shared/rail/conditions';
import type { PartInService } from '@shared/schemas/checks.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatFixed, formatQuantity, formatVolts } from '@shared/units/format';
import { Table, Td, Th } from '@/components/ui/table';
import { shareUnit } from '@/lib/shared-unit';

/** How each part's catalogue value becomes what the board has. */
export function InServiceTable({
  spec,
  parts,
  nameOf,
}: {
  spec: RailSpec;
  parts: readonly PartInService[];
  nameOf: (part: string) => string;
}) {
  const { conditions } = conditionsOf(spec);
  return (
    <Table
      caption="values of the bank’s parts in service"
      head={
        <>
          <Th>part</Th>
          <Th numeric>catalogue</Th>
          <Th numeric>× bias {formatVolts(spec.voltage_V)}</Th>
          <Th numeric>× {conditions.usual_C} °C</Th>
          <Th numeric>× age</Th>
          <Th numeric>= in service</Th>
          <Th numeric>least … most</Th>
        </>
      }
    >
      {parts.map((part) => (
        <tr key={part.part}>
          <Td>
            {nameOf(part.part)}
            {part.estimated && <span className="text-brass"> ≈ estimated</span>}
          </Td>
          <Td numeric>{formatQuantity(part.catalogue_F, 'F', { trim: true })}</Td>
          {part.factors
            .filter((factor) => factor.kind !== 'tolerance')
            .map((factor) => (
              <Td key={factor.kind} numeric>
                <span className={factor.estimated ? 'text-brass' : undefined}>
                  {factor.estimated && <span aria-hidden>≈ </span>}
                  {formatFixed(factor.factor, 3)}
                </span>
                <span className="block min-w-24 text-small whitespace-normal text-stone">{factor.basis}</span>
              </Td>
            ))}
          <Td numeric className="font-semibold">
            {formatQuantity(part.service_F, 'F')}
          </Td>
          <Td numeric>
            {shareUnit(formatQuantity(part.lowest_F, 'F'), '…', formatQuantity(part.highest_F, 'F'))}
          </Td>
        </tr>
      ))}
    </Table>
  );
}
