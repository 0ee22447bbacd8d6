import type { RevisionPeak } from '@shared/schemas/revision.schema';
import { formatDecibel } from '@shared/units/format';
import { Decimal, decimalRoom } from '@/components/ui/decimal';
import { Table, Td, Th } from '@/components/ui/table';

const HEAD = (
  <>
    <Th numeric>peak</Th>
    <Th numeric>frequency</Th>
    <Th numeric>impedance</Th>
    <Th numeric>target there</Th>
    <Th>against the target</Th>
    <Th>made by</Th>
  </>
);

function Against({ peak: { impedance_ohm, target_ohm } }: { peak: RevisionPeak }) {
  if (target_ohm === null) return <span className="text-stone">outside the band</span>;
  const headroom_dB = 20 * Math.log10(target_ohm / impedance_ohm);
  return headroom_dB < 0 ? (
    <span className="text-kingfisher">▲ breaks the surface, {formatDecibel(headroom_dB)}</span>
  ) : (
    <span className="text-reed">▽ under it, {formatDecibel(headroom_dB)}</span>
  );
}

/** Anti-resonances of the rail, each with the two members that make it. */
export function PeaksTable({ rail, peaks }: { rail: string; peaks: readonly RevisionPeak[] }) {
  if (peaks.length === 0) return <p className="text-stone">No peaks in the band.</p>;
  const rooms = {
    frequency: decimalRoom(
      peaks.map((peak) => peak.frequency_Hz),
      'Hz',
    ),
    impedance: decimalRoom(
      peaks.flatMap((peak) => [peak.impedance_ohm, peak.target_ohm]),
      'Ω',
    ),
  };
  return (
    <Table caption={`peaks of ${rail}`} head={HEAD}>
      {peaks.map((peak, i) => (
        <tr key={peak.frequency_Hz}>
          <Td numeric>{i + 1}</Td>
          <Td numeric>
            <Decimal value={peak.frequency_Hz} unit="Hz" fraction={rooms.frequency} />
          </Td>
          <Td numeric>
            <Decimal value={peak.impedance_ohm} unit="Ω" fraction={rooms.impedance} />
          </Td>
          <Td numeric>
            <Decimal value={peak.target_ohm} unit="Ω" fraction={rooms.impedance} />
          </Td>
          <Td className="whitespace-nowrap">
            <Against peak={peak} />
          </Td>
          <Td className="min-w-52 text-stone">{makersText(peak)}</Td>
        </tr>
      ))}
    </Table>
  );
}

/** The two that make a peak, or the one that makes a rising edge alone. */
function makersText({ inductive, capacitive }: Pick<RevisionPeak, 'inductive' | 'capacitive'>): string {
  if (inductive && capacitive) return `${inductive} against ${capacitive}`;
  return inductive || capacitive ? `${inductive ?? capacitive} alone` : 'resistance';
}
