import type { ReactNode } from 'react';
import { cx } from '@/lib/class-names';

/** The body of a page that is not the bench: title, what can be done, content. */
export function Page({
  title,
  lead,
  actions,
  children,
  narrow = false,
}: {
  title: ReactNode;
  lead?: ReactNode;
  actions?: ReactNode;
  children: ReactNode;
  narrow?: boolean;
}) {
  return (
    <div className={cx('flex flex-col gap-6 px-6 py-6', narrow && 'max-w-3xl')}>
      <div className="flex flex-wrap items-start justify-between gap-4">
        <div className="min-w-0">
          <h1 className="text-large font-semibold wrap-anywhere">{title}</h1>
          {lead && <div className="mt-1 max-w-prose text-stone wrap-anywhere">{lead}</div>}
        </div>
        {actions && <div className="flex flex-wrap items-center gap-3">{actions}</div>}
      </div>
      {children}
    </div>
  );
}

/** A group of things under a lower-case head. */
export function Section({
  title,
  children,
  className,
}: {
  title: ReactNode;
  children: ReactNode;
  className?: string;
}) {
  return (
    <section className={className}>
      <h2 className="section-head mb-2">{title}</h2>
      {children}
    </section>
  );
}

/** Nothing here yet, and what to do about it. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: string;
  children: ReactNode;
  action?: ReactNode;
}) {
  return (
    <div className="border-y py-10">
      <p className="font-semibold">{title}</p>
      <div className="mt-1 max-w-prose text-stone">{children}</div>
      {action && <div className="mt-4">{action}</div>}
    </div>
  );
}

export function Loading({ what }: { what: string }) {
  return (
    <p role="status" className="px-6 py-10 text-stone">
      fetching {what} …
    </p>
  );
}
