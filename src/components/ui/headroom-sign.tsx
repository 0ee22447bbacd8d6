import { formatDecibel, formatFixed } from '@shared/units/format';
import { cx } from '@/lib/class-names';

interface Props {
  holds: boolean | null;
  headroom_dB: number | null;
  /** With words, “holds by 2.4 dB”, “short by 0.3 dB”, instead of the signed headroom, “+2.4 dB”, “−0.3 dB”. */
  words?: boolean;
  className?: string;
}

/** ▽ under the surface (holds), ▲ above it (short): a sign and a number, never a colour alone. */
export function HeadroomSign({ holds, headroom_dB, words = false, className }: Props) {
  if (holds === null || headroom_dB === null)
    return <span className={cx('text-stone', className)}>– no result</span>;
  const size = Math.abs(headroom_dB);
  // A rail that holds by a hair should not read as holding by nothing.
  const decimals = size < 0.095 ? 2 : 1;
  return (
    <span className={cx('whitespace-nowrap', holds ? 'text-reed' : 'text-kingfisher', className)}>
      <span aria-hidden>{holds ? '▽' : '▲'} </span>
      {words ? (
        `${holds ? 'holds by' : 'short by'} ${formatFixed(size, decimals)} dB`
      ) : (
        <>
          <span className="sr-only">{holds ? 'holds, ' : 'short, '}</span>
          {formatDecibel(headroom_dB, decimals)}
        </>
      )}
    </span>
  );
}
