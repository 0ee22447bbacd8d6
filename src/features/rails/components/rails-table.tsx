import { targetFromStep } from '@shared/engine/target';
import type { Rail, RailSummary } from '@shared/schemas/rail.schema';
import { formatQuantity } from '@shared/units/format';
import type { UnitSymbol } from '@shared/units/quantity';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Decimal, decimalRoom } from '@/components/ui/decimal';
import { HeadroomSign } from '@/components/ui/headroom-sign';
import { Table, Td, Th } from '@/components/ui/table';
import { paths } from '@/config/paths';
import { formatCost } from '@/lib/format-cost';

/** What a reviewer came for stays on a phone; the rest needs room. */
const WIDE = 'hidden sm:table-cell';
const WIDER = 'hidden lg:table-cell';

const HEAD = (
  <>
    <Th>rail</Th>
    <Th>in service</Th>
    <Th className={WIDE}>worst case</Th>
    <Th numeric className={WIDE}>
      target
    </Th>
    <Th numeric className={WIDE}>
      tightest at
    </Th>
    <Th numeric className={WIDE}>
      voltage
    </Th>
    <Th numeric className={WIDER}>
      load step
    </Th>
    <Th numeric className={WIDE}>
      band
    </Th>
    <Th numeric className={WIDE}>
      parts · kinds
    </Th>
    <Th numeric className={WIDER}>
      cost
    </Th>
    <Th numeric className={WIDER}>
      area
    </Th>
  </>
);

/** null: the target is a mask. */
function targetOf({ spec: { target, voltage_V } }: Rail): number | null {
  if (target.kind === 'flat') return target.impedance_ohm;
  return target.kind === 'mask' ? null : targetFromStep(voltage_V, target.ripple_percent, target.step_A);
}

const stepOf = ({ spec }: Rail): number | undefined =>
  spec.target.kind === 'step' ? spec.target.step_A : spec.load_step?.step_A;

type Value = (rail: Rail) => number | null | undefined;

/** A column of figures, its room behind the decimal point found once for all rows. */
function column(rails: readonly Rail[], unit: UnitSymbol, value: Value) {
  const fraction = decimalRoom(rails.map(value), unit);
  return { of: (rail: Rail): ReactNode => <Decimal value={value(rail)} unit={unit} fraction={fraction} /> };
}

function columnsOf(rails: readonly Rail[]) {
  return {
    voltage: column(rails, 'V', ({ spec }) => spec.voltage_V),
    step: column(rails, 'A', stepOf),
    target: column(rails, 'Ω', targetOf),
    low: column(rails, 'Hz', ({ spec }) => spec.band_Hz[0]),
    high: column(rails, 'Hz', ({ spec }) => spec.band_Hz[1]),
    area: column(rails, 'mm²', ({ summary }) => summary.area_mm2),
    tightest: column(rails, 'Hz', ({ summary }) => summary.tightest?.frequency_Hz),
  };
}

function State({ summary }: { summary: RailSummary }) {
  if (summary.error)
    return (
      <span className="whitespace-nowrap text-brass" title={summary.error}>
        ! no result
      </span>
    );
  return <HeadroomSign holds={summary.holds} headroom_dB={summary.tightest?.headroom_dB ?? null} words />;
}

const maskText = ({ spec: { target } }: Rail): string =>
  target.kind === 'mask' ? `mask, ${target.points.length} points` : '—';

/** A figure that stands in a line of its own, with nothing to be aligned to. */
const inLine = (value: number | null, unit: UnitSymbol, otherwise = '—'): string =>
  value === null ? otherwise : formatQuantity(value, unit, { trim: true });

function Row({ rail, columns }: { rail: Rail; columns: ReturnType<typeof columnsOf> }) {
  const { spec, summary } = rail;
  return (
    <tr className="hover:bg-wash">
      <Td>
        <Link
          to={paths.bench(rail.boardId, rail.id)}
          title={spec.name}
          className="block max-w-[16ch] truncate font-semibold text-deep underline-offset-4 hover:underline sm:max-w-[12ch] min-[87.5rem]:max-w-[24ch]"
        >
          {spec.name}
        </Link>
        <span className="block text-small text-stone sm:hidden">
          target {inLine(targetOf(rail), 'Ω', maskText(rail))}
        </span>
      </Td>
      <Td>
        <State summary={summary} />
        <span className="block text-small text-stone sm:hidden">
          {summary.tightest && `at ${inLine(summary.tightest.frequency_Hz, 'Hz')}`}
        </span>
      </Td>
      <Td className={WIDE}>
        {summary.worst ? (
          <span title={summary.worst.corner}>
            <HeadroomSign holds={summary.worst.holds} headroom_dB={summary.worst.tightest.headroom_dB} />
          </span>
        ) : (
          '—'
        )}
      </Td>
      <Td numeric className={WIDE}>
        {spec.target.kind === 'mask' ? maskText(rail) : columns.target.of(rail)}
      </Td>
      <Td numeric className={WIDE}>
        {columns.tightest.of(rail)}
      </Td>
      <Td numeric className={WIDE}>
        {columns.voltage.of(rail)}
      </Td>
      <Td numeric className={WIDER}>
        {columns.step.of(rail)}
      </Td>
      <Td numeric className={WIDE}>
        {columns.low.of(rail)} – {columns.high.of(rail)}
      </Td>
      <Td numeric className={WIDE}>
        {summary.parts} · {summary.kinds}
      </Td>
      <Td numeric className={WIDER}>
        {formatCost(summary.cost)}
      </Td>
      <Td numeric className={WIDER}>
        {columns.area.of(rail)}
      </Td>
    </tr>
  );
}

/** All rails of a board: whether they hold, what they ask, where they are tightest, what their banks come to. */
export function RailsTable({ rails }: { rails: readonly Rail[] }) {
  const columns = columnsOf(rails);
  return (
    <Table caption="rails of this board" head={HEAD}>
      {rails.map((rail) => (
        <Row key={rail.id} rail={rail} columns={columns} />
      ))}
    </Table>
  );
}
