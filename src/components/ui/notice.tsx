import type { ReactNode } from 'react';
import { cx } from '@/lib/class-names';

const TONES = {
  caution: { line: 'border-brass', word: 'text-brass', sign: '! caution' },
  error: { line: 'border-kingfisher', word: 'text-kingfisher', sign: '▲ not done' },
  note: { line: 'border-shallow', word: 'text-stone', sign: 'note' },
} as const;

interface NoticeProps {
  tone: keyof typeof TONES;
  title?: string;
  children: ReactNode;
  className?: string;
  action?: ReactNode;
}

/** A word in the margin: a rule at the left, the tone as a word and never as a colour alone. */
export function Notice({ tone, title, children, className, action }: NoticeProps) {
  const { line, word, sign } = TONES[tone];
  return (
    <div role={tone === 'error' ? 'alert' : 'note'} className={cx('border-l-2 pl-3', line, className)}>
      <p className={cx('text-small font-semibold', word)}>{title ?? sign}</p>
      <div className="text-ink">{children}</div>
      {action && <div className="mt-2">{action}</div>}
    </div>
  );
}
