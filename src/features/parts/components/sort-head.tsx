import { Th } from '@/components/ui/table';
import type { PartFilter } from '../lib/part-filter';

interface Props {
  label: string;
  sort: PartFilter['sort'];
  filter: PartFilter;
  numeric?: boolean;
  onSort: (sort: PartFilter['sort']) => void;
}

/** A column's head that sorts by it; pressed again, the other way round. */
export function SortHead({ label, sort, filter, numeric, onSort }: Props) {
  const isSorted = filter.sort === sort;
  const isUp = filter.order === 'asc';
  // Before a column of figures, so that its head stays flush with them.
  const arrow = <span aria-hidden>{isUp ? '↑' : '↓'}</span>;
  return (
    <Th numeric={numeric} aria-sort={isSorted ? (isUp ? 'ascending' : 'descending') : undefined}>
      <button
        type="button"
        onClick={() => onSort(sort)}
        className={`underline-offset-4 hover:underline ${isSorted ? 'font-semibold text-ink' : ''}`}
      >
        {isSorted && numeric && arrow}
        {label}
        {isSorted && !numeric && arrow}
      </button>
    </Th>
  );
}
