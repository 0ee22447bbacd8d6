import { formatFixed } from '@shared/units/format';
import { inductanceText } from '../lib/inductance-text';
import type { PlacedMount } from '../lib/recipe-mount';
import { MountBar, SegmentSign } from './mount-bar';

/** Which part of the loop costs how many pH. */
export function SplitBar({ mount }: { mount: PlacedMount }) {
  return (
    <div>
      <MountBar segments={mount.segments} full_H={mount.total_H || 1} height={24} />
      <dl className="mt-2 flex flex-wrap gap-x-8 gap-y-1">
        {mount.segments.map((segment) => (
          <div key={segment.part} className="flex items-center gap-2">
            <dt className="flex items-center gap-2">
              <SegmentSign part={segment.part} />
              {segment.part}
            </dt>
            <dd data-testid={`${segment.part}-inductance`}>
              {inductanceText(segment.inductance_H)} · {formatFixed(100 * segment.share, 0)}&nbsp;%
            </dd>
          </div>
        ))}
      </dl>
    </div>
  );
}
