import { targetFromStep } from '@shared/engine/target';
import type { Rail } from '@shared/schemas/rail.schema';
import { formatQuantity, formatVolts } from '@shared/units/format';
import { Link } from 'react-router-dom';
import { HeadroomSign } from '@/components/ui/headroom-sign';
import { Table, Td, Th } from '@/components/ui/table';
import { paths } from '@/config/paths';
import { formatCost } from '@/lib/format-cost';

const trim = { trim: true };

function target({ spec }: Rail): string {
  if (spec.target.kind === 'flat') return formatQuantity(spec.target.impedance_ohm, 'Ω');
  if (spec.target.kind === 'mask') return `mask, ${spec.target.points.length} points`;
  return formatQuantity(targetFromStep(spec.voltage_V, spec.target.ripple_percent, spec.target.step_A), 'Ω');
}

const step = ({ spec }: Rail): string =>
  spec.target.kind === 'step'
    ? formatQuantity(spec.target.step_A, 'A', trim)
    : spec.load_step
      ? formatQuantity(spec.load_step.step_A, 'A', trim)
      : '—';

/** All rails of a board: what they ask, what their banks come to, and where they are tightest. */
export function RailsTable({ rails }: { rails: readonly Rail[] }) {
  return (
    <Table
      caption="rails of this board"
      head={
        <>
          <Th>rail</Th>
          <Th numeric>voltage</Th>
          <Th numeric>load step</Th>
          <Th numeric>target</Th>
          <Th numeric>band</Th>
          <Th numeric>parts · kinds</Th>
          <Th numeric>cost</Th>
          <Th numeric>area</Th>
          <Th numeric>tightest at</Th>
          <Th numeric>state</Th>
        </>
      }
    >
      {rails.map((rail) => {
        const { spec, summary } = rail;
        return (
          <tr key={rail.id} className="hover:bg-wash">
            <Td>
              <Link
                to={paths.bench(rail.boardId, rail.id)}
                className="font-semibold text-deep underline-offset-4 hover:underline"
              >
                {spec.name}
              </Link>
            </Td>
            <Td numeric>{formatVolts(spec.voltage_V)}</Td>
            <Td numeric>{step(rail)}</Td>
            <Td numeric>{target(rail)}</Td>
            <Td numeric>
              {formatQuantity(spec.band_Hz[0], 'Hz', trim)} – {formatQuantity(spec.band_Hz[1], 'Hz', trim)}
            </Td>
            <Td numeric>
              {summary.parts} · {summary.kinds}
            </Td>
            <Td numeric>{formatCost(summary.cost)}</Td>
            <Td numeric>{formatQuantity(summary.area_mm2, 'mm²')}</Td>
            <Td numeric>{summary.tightest ? formatQuantity(summary.tightest.frequency_Hz, 'Hz') : '—'}</Td>
            <Td numeric>
              {summary.error ? (
                <span className="text-brass" title={summary.error}>
                  ! no result
                </span>
              ) : (
                <HeadroomSign
                  holds={summary.holds}
                  headroom_dB={summary.tightest?.headroom_dB ?? null}
                  words
                />
              )}
            </Td>
          </tr>
        );
      })}
    </Table>
  );
}
