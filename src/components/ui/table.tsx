import type { ReactNode, TdHTMLAttributes, ThHTMLAttributes } from 'react';
import { cx } from '@/lib/class-names';

/** A table in hairlines that scrolls sideways where the page is narrow. */
export function Table({
  caption,
  head,
  children,
}: {
  caption: string;
  head: ReactNode;
  children: ReactNode;
}) {
  return (
    <div className="relative overflow-x-auto">
      <table className="w-full border-collapse">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b">{head}</tr>
        </thead>
        <tbody>{children}</tbody>
      </table>
    </div>
  );
}

export function Th({
  className,
  numeric,
  ...rest
}: ThHTMLAttributes<HTMLTableCellElement> & { numeric?: boolean }) {
  return (
    <th
      scope="col"
      className={cx(
        'section-head px-2 py-1.5 whitespace-nowrap first:pl-0 last:pr-0',
        numeric ? 'text-right' : 'text-left',
        className,
      )}
      {...rest}
    />
  );
}

export function Td({
  className,
  numeric,
  ...rest
}: TdHTMLAttributes<HTMLTableCellElement> & { numeric?: boolean }) {
  return (
    <td
      className={cx(
        'border-b px-2 py-1.5 align-baseline first:pl-0 last:pr-0',
        numeric && 'text-right whitespace-nowrap',
        className,
      )}
      {...rest}
    />
  );
}
