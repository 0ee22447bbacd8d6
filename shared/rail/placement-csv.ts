import { csvTable } from '../formats/csv';
import type { Instance } from '../schemas/revision.schema';
import { formatFixed, formatQuantity } from '../units/format';

const plain = (text: string) => text.replace(/\u00a0/g, ' ').replace(/\u2212/g, '-');
const millimetres = (metres: number | null) => (metres === null ? '' : plain(formatFixed(metres * 1000, 1)));

/**
 * The placement list, one row an instance. Distances in millimetres; where there is no farthest distance the last
 * column says why.
 */
export function placementCsv(instances: readonly Instance[]): string {
  const header = [
    'reference designator',
    'part',
    'value',
    'case',
    'side',
    'rail',
    'mount',
    'mount recipe',
    'planned distance mm',
    'farthest distance mm',
    'remark',
  ];
  const rows = instances.map((one) => [
    one.designator,
    one.partNumber,
    plain(one.value),
    one.caseSize,
    one.side,
    one.rail,
    plain(formatQuantity(one.mount_H, 'H')),
    one.recipe ?? '',
    millimetres(one.distance_m),
    millimetres(one.farthest_m),
    one.farthestReason ?? '',
  ]);
  return csvTable([header, ...rows]);
}
