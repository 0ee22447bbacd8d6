import type { RevisionRail } from '@shared/schemas/revision.schema';
import { formatQuantity } from '@shared/units/format';
import { Decimal, decimalRoom } from '@/components/ui/decimal';
import { HeadroomSign } from '@/components/ui/headroom-sign';
import { Table, Td, Th } from '@/components/ui/table';
import { LINK } from '@/components/ui/text-link';
import { formatCost } from '@/lib/format-cost';

const HEAD = (
  <>
    <Th>rail</Th>
    <Th>tightest headroom</Th>
    <Th>catalogue</Th>
    <Th>worst case</Th>
    <Th>one part open</Th>
    <Th numeric>voltage</Th>
    <Th numeric>target there</Th>
    <Th numeric>impedance</Th>
    <Th numeric>parts</Th>
    <Th numeric>kinds</Th>
    <Th numeric>cost</Th>
    <Th numeric>area</Th>
  </>
);

const CIRCUMSTANCES = ['catalogue', 'worst', 'missing'] as const;

/** The anchor of a rail's section on the revision's page. */
export const railAnchor = (railId: string) => `rail-${railId}`;

function Headroom({ summary }: Pick<RevisionRail, 'summary'>) {
  if (summary.error) return <span className="text-kingfisher">▲ {summary.error}</span>;
  return (
    <>
      <HeadroomSign holds={summary.holds} headroom_dB={summary.tightest?.headroom_dB ?? null} words />
      {summary.tightest && (
        <span className="text-stone"> at {formatQuantity(summary.tightest.frequency_Hz, 'Hz')}</span>
      )}
    </>
  );
}

export function RailResultsTable({ rails }: { rails: readonly RevisionRail[] }) {
  const rooms = {
    voltage: decimalRoom(
      rails.map(({ document }) => document.rail.voltage_V),
      'V',
    ),
    impedance: decimalRoom(
      rails.flatMap(({ summary }) => [summary.tightest?.target_ohm, summary.tightest?.impedance_ohm]),
      'Ω',
    ),
    area: decimalRoom(
      rails.map(({ summary }) => summary.area_mm2),
      'mm²',
    ),
  };
  return (
    <Table caption="rails of this revision and their results" head={HEAD}>
      {rails.map(({ railId, document, summary }) => (
        <tr key={railId} className="hover:bg-wash/50">
          <Td>
            <a
              href={`#${railAnchor(railId)}`}
              title={document.rail.name}
              className={`${LINK} block max-w-[16ch] truncate font-semibold sm:max-w-[24ch]`}
            >
              {document.rail.name}
            </a>
          </Td>
          <Td className="min-w-56">
            <Headroom summary={summary} />
          </Td>
          {[summary.catalogue, summary.worst, summary.missing].map((verdict, i) => (
            <Td key={CIRCUMSTANCES[i]}>
              {verdict ? (
                <HeadroomSign holds={verdict.holds} headroom_dB={verdict.tightest.headroom_dB} />
              ) : (
                '—'
              )}
            </Td>
          ))}
          <Td numeric>
            <Decimal value={document.rail.voltage_V} unit="V" fraction={rooms.voltage} />
          </Td>
          <Td numeric>
            <Decimal value={summary.tightest?.target_ohm} unit="Ω" fraction={rooms.impedance} />
          </Td>
          <Td numeric>
            <Decimal value={summary.tightest?.impedance_ohm} unit="Ω" fraction={rooms.impedance} />
          </Td>
          <Td numeric>{summary.parts}</Td>
          <Td numeric>{summary.kinds}</Td>
          <Td numeric>{formatCost(summary.cost)}</Td>
          <Td numeric>
            <Decimal value={summary.area_mm2} unit="mm²" fraction={rooms.area} />
          </Td>
        </tr>
      ))}
    </Table>
  );
}
