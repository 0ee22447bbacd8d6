import type { ButtonHTMLAttributes } from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { cx } from '@/lib/class-names';

type Variant = 'primary' | 'secondary' | 'plain' | 'danger';

const BASE =
  'inline-flex items-center justify-center gap-2 whitespace-nowrap border py-1.5 font-semibold disabled:cursor-not-allowed disabled:opacity-50';
const VARIANTS: Record<Variant, string> = {
  primary: 'px-3 border-deep bg-deep text-paper hover:not-disabled:opacity-90',
  secondary: 'px-3 border-deep bg-transparent text-deep hover:not-disabled:bg-wash',
  plain: 'border-transparent bg-transparent text-deep hover:not-disabled:underline underline-offset-4',
  danger: 'px-3 border-kingfisher bg-transparent text-kingfisher hover:not-disabled:bg-wash',
};

export function Button({
  variant = 'secondary',
  className,
  type = 'button',
  ...rest
}: ButtonHTMLAttributes<HTMLButtonElement> & { variant?: Variant }) {
  return <button type={type} className={cx(BASE, VARIANTS[variant], className)} {...rest} />;
}

export function ButtonLink({ variant = 'secondary', className, ...rest }: LinkProps & { variant?: Variant }) {
  return <Link className={cx(BASE, VARIANTS[variant], className)} {...rest} />;
}
