import type { InputHTMLAttributes } from 'react';
import { cx } from '@/lib/class-names';

/** A box that shows its border where one works: under the pointer, with the focus, or when something is wrong. */
export const CELL =
  'w-full min-w-0 border border-transparent bg-transparent px-1.5 py-1 text-ink hover:border-stone/60 focus:border-stone/60 aria-invalid:border-kingfisher';

/** What ties a field to what is wrong with it. */
export const faultProps = (fault: string | undefined, note: string) =>
  fault ? ({ 'aria-invalid': true, 'aria-describedby': note } as const) : {};

/** A text field in a table, named by `label`. */
export function CellInput({
  label,
  className,
  ...rest
}: InputHTMLAttributes<HTMLInputElement> & { label: string }) {
  return (
    <input
      {...rest}
      aria-label={label}
      autoComplete="off"
      spellCheck={false}
      className={cx(CELL, className)}
    />
  );
}
