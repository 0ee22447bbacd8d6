import { formatFixed } from '@shared/units/format';
import { cx } from '@/lib/class-names';

interface VerdictLineProps {
  name: string;
  /** Longer, shown when the pointer rests on the name. */
  title?: string;
  holds: boolean;
  /** null: nothing is left that could carry the current. */
  headroom_dB: number | null;
}

/** `in service … ▲ short 2.7 dB`: one circumstance and what it comes to. */
export function VerdictLine({ name, title, holds, headroom_dB }: VerdictLineProps) {
  const size = Math.abs(headroom_dB ?? 0);
  return (
    <div className="flex items-baseline justify-between gap-3">
      <dt className="min-w-0" title={title ?? name}>
        {name}
      </dt>
      <dd className={cx('whitespace-nowrap', holds ? 'text-reed' : 'text-kingfisher')}>
        <span aria-hidden>{holds ? '▽' : '▲'} </span>
        {headroom_dB === null
          ? 'nothing left'
          : `${holds ? 'holds' : 'short'} ${formatFixed(size, size < 0.095 ? 2 : 1)} dB`}
      </dd>
    </div>
  );
}
