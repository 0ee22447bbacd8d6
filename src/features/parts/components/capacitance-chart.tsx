import type { ReactNode } from 'react';
import { useWidth } from '@/components/chart/use-width';
import { bandPath, capacitanceAxes, linePath, MARGIN, PLOT_HEIGHT } from '../lib/capacitance-axes';
import { type CapacitanceCurve, type CurvePoint, stretches } from '../lib/capacitance-curves';
import { CapacitanceGrid } from './capacitance-grid';
import { CapacitanceMark, type Mark } from './capacitance-mark';
import { FLOAT_PX } from './slider';

interface Props {
  /** What the picture shows, for those who do not see it. */
  label: string;
  curve: CapacitanceCurve;
  catalogue_F: number;
  /** Null while the engine refuses what is chosen. */
  mark: Mark | null;
  writeX: (value: number) => string;
  /** The control under the axis, on the plot's own width. */
  control: ReactNode;
}

const highestAt = (points: readonly CurvePoint[], mark: Mark): number =>
  Math.max(mark.capacitance_F, points.find((p) => p.x >= mark.x)?.high_F ?? 0);

/** C over one condition: as chosen (dashed where estimated, a band where only limits are known), and by this condition alone. */
export function CapacitanceChart({ label, curve, catalogue_F, mark, writeX, control }: Props) {
  const [ref, width] = useWidth<HTMLDivElement>();
  const plotWidth = Math.max(120, width - MARGIN.left - MARGIN.right);
  const axes = capacitanceAxes(curve, catalogue_F, plotWidth);
  const shown = curve.chosen.length > 0 ? curve.chosen : curve.alone;
  const lines = (points: readonly CurvePoint[], className: string, strokeWidth: number) =>
    stretches(points).map((stretch) => (
      <path
        key={stretch.points[0].x}
        d={linePath(axes, stretch.points)}
        className={className}
        strokeWidth={strokeWidth}
        strokeDasharray={stretch.estimated ? '6 4' : undefined}
      />
    ));
  return (
    <div ref={ref} className="min-w-0">
      {width > 0 && (
        <>
          <svg
            width={width}
            height={PLOT_HEIGHT + MARGIN.top + MARGIN.bottom}
            role="img"
            aria-label={label}
            fill="none"
            className="block"
          >
            <g transform={`translate(${MARGIN.left} ${MARGIN.top})`}>
              <path d={bandPath(axes, shown)} className="fill-shallow" fillOpacity="0.5" />
              <CapacitanceGrid axes={axes} writeX={writeX} />
              {lines(curve.alone, 'stroke-stone', 1)}
              {lines(curve.chosen, 'stroke-ink', 2)}
              {mark && <CapacitanceMark axes={axes} mark={mark} above_F={highestAt(shown, mark)} />}
            </g>
          </svg>
          <div style={{ width: plotWidth + FLOAT_PX, marginLeft: MARGIN.left - FLOAT_PX / 2 }}>{control}</div>
        </>
      )}
    </div>
  );
}
