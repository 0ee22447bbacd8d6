import { formatFixed } from '@shared/units/format';
import { Decimal, decimalRoom } from '@/components/ui/decimal';
import { Table, Td, Th } from '@/components/ui/table';
import { thicknessText } from '../lib/length-text';
import type { PairFigures } from '../lib/pair-figures';
import { pairKey, type SetupUsage } from '../lib/setup-usage';

/** What each pair of neighbouring planes gives, from the engine. */
export function PairsTable({ pairs, usage }: { pairs: readonly PairFigures[]; usage: SetupUsage }) {
  if (pairs.length === 0)
    return (
      <p className="text-stone">
        No two planes face each other with only dielectric between: rails can take no plane pair from this
        stack-up.
      </p>
    );
  const capacitance = decimalRoom(
    pairs.map((pair) => pair.capacitance_F),
    'F',
  );
  const inductance = decimalRoom(
    pairs.map((pair) => pair.inductance_H),
    'H',
  );
  return (
    <Table
      caption="plane pairs of this stack-up"
      head={
        <>
          <Th>planes</Th>
          <Th numeric>spacing</Th>
          <Th numeric>εr</Th>
          <Th numeric>C per cm²</Th>
          <Th numeric>L per square</Th>
        </>
      }
    >
      {pairs.map((pair) => {
        const rails = usage.pairs.get(pairKey(pair.upperLabel, pair.lowerLabel)) ?? [];
        return (
          <tr key={pair.id}>
            <Td className="min-w-[8.5rem]">
              {pair.upperLabel} – {pair.lowerLabel}
              <span className="block text-small text-stone">
                {rails.length > 0 ? rails.join(', ') : 'no rail yet'}
              </span>
            </Td>
            <Td numeric>{thicknessText(Number(pair.spacing_m.toPrecision(9)))}</Td>
            <Td numeric>{formatFixed(pair.relative_permittivity, 2)}</Td>
            <Td numeric>
              <Decimal value={pair.capacitance_F} unit="F" fraction={capacitance} />
            </Td>
            <Td numeric>
              <Decimal value={pair.inductance_H} unit="H" fraction={inductance} />
            </Td>
          </tr>
        );
      })}
    </Table>
  );
}
