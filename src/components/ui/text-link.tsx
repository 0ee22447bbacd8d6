import { Link, type LinkProps } from 'react-router-dom';
import { cx } from '@/lib/class-names';

export const LINK = 'text-deep underline decoration-shallow underline-offset-4 hover:decoration-current';

export function TextLink({ className, ...rest }: LinkProps) {
  return <Link className={cx(LINK, className)} {...rest} />;
}
