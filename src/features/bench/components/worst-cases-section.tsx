import { formatQuantity } from '@shared/units/format';
import type { RailVerdicts } from '@workers/checks/checks.interface';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { HeadroomSign } from '@/components/ui/headroom-sign';
import { Table, Td, Th } from '@/components/ui/table';

const SHOWN = 6;

/** Every corner, and every line with one of its parts open; the worst of each first. */
export function WorstCasesSection({
  verdicts: { corners, missing },
  nameOf,
}: {
  verdicts: RailVerdicts;
  nameOf: (part: string) => string;
}) {
  const [all, setAll] = useState(false);
  return (
    <div className="grid gap-x-10 gap-y-6 2xl:grid-cols-2">
      <div className="min-w-0">
        <p className="mb-1 text-small text-stone">
          {corners.length} corners that move all parts alike, each at its own tightest frequency
        </p>
        <Table caption="headroom in every corner" head={HEAD('corner')}>
          {(all ? corners : corners.slice(0, SHOWN)).map((one) => (
            <Row
              key={one.name}
              name={one.name}
              holds={one.holds}
              headroom_dB={one.tightest.headroom_dB}
              at={one.tightest}
            />
          ))}
        </Table>
        {corners.length > SHOWN && (
          <Button variant="plain" className="mt-1" onClick={() => setAll(!all)}>
            {all ? 'the worst only' : `all ${corners.length} corners`}
          </Button>
        )}
      </div>
      {missing.length > 0 && (
        <div className="min-w-0">
          <p className="mb-1 text-small text-stone">
            missing part, in service: one capacitor of the line open, all others fitted
          </p>
          <Table caption="headroom with one part open" head={HEAD('one open of')}>
            {missing.map((one) => (
              <Row
                key={one.line}
                name={nameOf(one.part)}
                holds={one.holds}
                headroom_dB={one.tightest?.headroom_dB ?? null}
                at={one.tightest}
              />
            ))}
          </Table>
        </div>
      )}
    </div>
  );
}

const HEAD = (what: string) => (
  <>
    <Th>{what}</Th>
    <Th>state</Th>
    <Th numeric>impedance</Th>
    <Th numeric>tightest at</Th>
  </>
);

interface RowProps {
  name: string;
  holds: boolean;
  headroom_dB: number | null;
  at: { frequency_Hz: number; impedance_ohm: number } | null;
}

function Row({ name, holds, headroom_dB, at }: RowProps) {
  return (
    <tr>
      <Td className="min-w-36">{name}</Td>
      <Td>
        {headroom_dB === null ? (
          <span className="text-kingfisher">▲ nothing left</span>
        ) : (
          <HeadroomSign holds={holds} headroom_dB={headroom_dB} words />
        )}
      </Td>
      <Td numeric>{at ? formatQuantity(at.impedance_ohm, 'Ω') : '—'}</Td>
      <Td numeric>{at ? formatQuantity(at.frequency_Hz, 'Hz') : '—'}</Td>
    </tr>
  );
}
