import { thicknessText } from '../lib/length-text';
import { scaleBar } from '../lib/scale-bar';

/** A bar of a round length at `scale` px a metre, with its length in words. */
export function ScaleMark({ scale, most }: { scale: number; most: number }) {
  const { length_m, px } = scaleBar(scale, most);
  return (
    <span className="inline-flex items-center gap-2">
      <svg aria-hidden="true" width={px + 2} height="9" className="shrink-0 stroke-ink" fill="none">
        <path d={`M1 1v7m0 -3.5h${px}m0 -3.5v7`} />
      </svg>
      {thicknessText(length_m)}
    </span>
  );
}
