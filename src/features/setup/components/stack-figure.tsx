import { formatLength } from '@shared/units/format';
import type { Rows } from '../hooks/use-row-centres';
import { drawnHeights } from '../lib/drawn-heights';
import { type LiveLayer, totalThickness_m } from '../lib/live-layers';
import type { PairFigures } from '../lib/pair-figures';
import { ScaleMark } from './scale-mark';
import { LEAST_PX, StackSection } from './stack-section';

interface Props {
  layers: readonly LiveLayer[];
  pairs: readonly PairFigures[];
  current: string | null;
  /** What is typed cannot be understood now; the drawing is of what stood there before. */
  isOld: boolean;
  /** Where the rows of the table stand, when the drawing stands beside them. */
  rows: Rows | null;
  width: number;
}

const ALONE = 340;

/** The cross-section with what it says under it: total thickness and how true to scale it is. */
export function StackFigure({ layers, pairs, current, isOld, rows, width }: Props) {
  const height = rows?.height || ALONE;
  const drawn = drawnHeights(
    layers.map((layer) => layer.thickness_m),
    height,
    LEAST_PX,
  );
  return (
    <figure className="m-0 shrink-0" style={{ marginTop: rows?.top ?? 0, width }}>
      <StackSection
        layers={layers}
        pairs={pairs}
        current={current}
        width={width}
        height={height}
        drawn={drawn}
        anchors={rows?.centres ?? null}
      />
      <figcaption className={`mt-1 text-small ${rows ? 'text-right' : ''}`}>
        <span className="font-semibold" data-testid="thickness">
          {formatLength(totalThickness_m(layers))} thick
        </span>
        <span className="block text-stone">
          <ScaleMark scale={drawn.scale} most={80} />
        </span>
        <span className="block text-stone">
          {drawn.isThickened.some(Boolean) ? 'to scale, thin layers thickened' : 'to scale'}
          {isOld && ', as last understood'}
        </span>
      </figcaption>
    </figure>
  );
}
