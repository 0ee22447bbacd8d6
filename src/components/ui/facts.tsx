import type { ReactNode } from 'react';
import { cx } from '@/lib/class-names';

export type FactRow = readonly [label: string, value: ReactNode];

/** Labels and their values in two columns, as on the bench. */
export function Facts({ rows, className }: { rows: readonly FactRow[]; className?: string }) {
  return (
    <dl className={cx('grid grid-cols-[auto_1fr] gap-x-6 gap-y-0.5', className)}>
      {rows.map(([label, value]) => (
        <div key={label} className="contents">
          <dt className="text-stone">{label}</dt>
          <dd className="min-w-0 break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
