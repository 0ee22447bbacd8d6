import type { RailChecks } from '@shared/schemas/checks.schema';
import { formatFixed, formatQuantity } from '@shared/units/format';
import { Table, Td, Th } from '@/components/ui/table';
import { type Check, neededText, stepRows } from './time-checks';

/** Beside the name there is room on a desk only; a phone has figure and place under the name. */
const WIDE = 'max-sm:hidden';

const headroom = (dB: number) => `${formatFixed(Math.abs(dB), Math.abs(dB) < 0.095 ? 2 : 1)}\u00a0dB`;

/** Every check of a rail in one list, in the order in which a reviewer asks. */
export function checkRows(checks: RailChecks): Check[] {
  const { catalogue, service, worst, missing, allowance_V } = checks;
  const over = (verdict: { holds: boolean; tightest: { headroom_dB: number; frequency_Hz: number } }) => ({
    holds: verdict.holds,
    figure: headroom(verdict.tightest.headroom_dB),
    note: `at ${formatQuantity(verdict.tightest.frequency_Hz, 'Hz')}`,
  });
  const against = (value_V: number) => ({
    holds: allowance_V === null ? null : value_V <= allowance_V,
    figure: formatQuantity(value_V, 'V'),
    note: allowance_V === null ? 'no ripple allowance is given' : `of ${formatQuantity(allowance_V, 'V')}`,
  });
  const rows: Check[] = [
    { name: 'catalogue values', ...over(catalogue) },
    { name: 'in service', ...over(service) },
    {
      name: `worst of ${checks.corners} corners`,
      ...over(worst),
      note: `${worst.corner}; at ${formatQuantity(worst.tightest.frequency_Hz, 'Hz')}`,
    },
  ];
  if (missing)
    rows.push({
      name: 'one part open',
      holds: missing.holds,
      figure: missing.tightest ? headroom(missing.tightest.headroom_dB) : 'nothing left',
      note: `one ${missing.part}${missing.tightest ? `, at ${formatQuantity(missing.tightest.frequency_Hz, 'Hz')}` : ''}`,
    });
  rows.push(...stepRows(checks, against));
  if (checks.pattern) {
    const { swing_V, frequency_Hz, q } = checks.pattern;
    const row = against(swing_V);
    const from =
      frequency_Hz === null || q === null
        ? ''
        : `; most of it at ${formatQuantity(frequency_Hz, 'Hz')}, Q ${q.toPrecision(2)}`;
    rows.push({ name: 'worst pattern of the load', ...row, note: row.note + from });
  }
  if (checks.timeReason)
    rows.push({ name: 'load step', holds: null, figure: '—', note: `none: ${checks.timeReason}` });
  const start = checks.start_up;
  rows.push({
    name: 'inrush',
    holds: start.holds,
    figure: formatQuantity(start.current_A, 'A'),
    note:
      start.limit_A === null
        ? 'soft start and current limit are not given'
        : `of ${formatQuantity(start.limit_A, 'A')}; ${formatQuantity(start.energy_J, 'J')} stored${neededText(start)}`,
  });
  return rows;
}

const HEAD = (
  <>
    <Th>check</Th>
    <Th>result</Th>
    <Th numeric className={WIDE}>
      figure
    </Th>
    <Th className={WIDE}>where</Th>
  </>
);

/** The checks of a rail as they were cut. */
export function ChecksList({ rail, checks }: { rail: string; checks: RailChecks }) {
  return (
    <Table caption={`checks of ${rail}`} head={HEAD}>
      {checkRows(checks).map((row) => (
        <tr key={row.name}>
          <Td className="sm:whitespace-nowrap">
            {row.name}
            <span className="block text-small text-stone sm:hidden">
              {row.figure}, {row.note}
            </span>
          </Td>
          <Td className="sm:whitespace-nowrap">
            <Result holds={row.holds} />
          </Td>
          <Td numeric className={WIDE}>
            {row.figure}
          </Td>
          <Td className={`text-stone ${WIDE}`}>{row.note}</Td>
        </tr>
      ))}
    </Table>
  );
}

function Result({ holds }: { holds: boolean | null }) {
  if (holds === null) return <span className="text-stone">– not held against anything</span>;
  return holds ? (
    <span className="text-reed">▽ holds</span>
  ) : (
    <span className="text-kingfisher">▲ does not hold</span>
  );
}
