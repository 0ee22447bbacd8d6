import type { InputHTMLAttributes, SelectHTMLAttributes, TextareaHTMLAttributes } from 'react';
import { cx } from '@/lib/class-names';

const BOX =
  'w-full border border-stone/60 bg-transparent px-2 py-1.5 text-ink aria-invalid:border-kingfisher disabled:opacity-60';

export function Input({ className, ...rest }: InputHTMLAttributes<HTMLInputElement>) {
  return <input className={cx(BOX, className)} autoComplete="off" spellCheck={false} {...rest} />;
}

export function Textarea({ className, ...rest }: TextareaHTMLAttributes<HTMLTextAreaElement>) {
  return <textarea className={cx(BOX, 'min-h-20', className)} {...rest} />;
}

export function Select({ className, ...rest }: SelectHTMLAttributes<HTMLSelectElement>) {
  return <select className={cx(BOX, 'bg-paper', className)} {...rest} />;
}

export function Checkbox({
  label,
  className,
  ...rest
}: Omit<InputHTMLAttributes<HTMLInputElement>, 'type'> & { label: string }) {
  return (
    <label className={cx('inline-flex cursor-pointer items-center gap-2', className)}>
      <input type="checkbox" className="size-3.5 accent-deep" {...rest} />
      {label}
    </label>
  );
}
