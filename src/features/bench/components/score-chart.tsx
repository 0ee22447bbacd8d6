import { lazy, Suspense } from 'react';
import type { FrequencyAxis, ImpedanceAxis } from '@/components/chart/axis';
import { xOf, yOf } from '@/components/chart/axis';
import type { PlotCurve } from '@/components/chart/impedance-plot';
import { PackageReach } from '@/components/chart/package-reach';
import { ScaleLabels } from '@/components/chart/scale-labels';
import { Waterline } from '@/components/chart/waterline';

const ImpedancePlot = lazy(() => import('@/components/chart/impedance-plot'));

interface ScoreChartProps {
  x: FrequencyAxis;
  y: ImpedanceAxis;
  curves: readonly PlotCurve[];
  target_ohm: Float64Array | null;
  waterline: readonly (readonly [number, number])[];
  breaks: readonly { frequency_Hz: number; impedance_ohm: number }[];
  cursor_Hz: number | null;
  /** The range over all corners, shaded. */
  band: { frequency_Hz: Float64Array; low_ohm: Float64Array; high_ohm: Float64Array } | null;
  /** From here on the package keeps the board from the die. */
  reach_Hz: number | null;
  /** A stretch of the axis to look at; null: the whole. */
  onZoom: (span_Hz: [number, number] | null) => void;
  summary: string;
}

/** Room above the plot, as in the plot itself. */
const TOP = 8;
const SCALE = 64;

/** The impedance chart with everything drawn over it. Its plot area starts at this element's left edge. */
export function ScoreChart({
  x,
  y,
  curves,
  target_ohm,
  waterline,
  breaks,
  cursor_Hz,
  band,
  reach_Hz,
  onZoom,
  summary,
}: ScoreChartProps) {
  return (
    <div className="relative" style={{ height: y.height + TOP + 26 }} role="img" aria-label={summary}>
      <div className="absolute top-0" style={{ left: -SCALE }}>
        {x.width > 0 && (
          <Suspense fallback={<p className="p-20 text-stone">fetching the chart …</p>}>
            <ImpedancePlot x={x} y={y} curves={curves} target_ohm={target_ohm} band={band} onZoom={onZoom} />
          </Suspense>
        )}
      </div>
      <div className="pointer-events-none absolute left-0" style={{ top: TOP }}>
        {x.width > 0 && (
          <>
            <svg aria-hidden="true" width={x.width} height={y.height + 26} className="absolute top-0 left-0">
              {breaks.map(({ frequency_Hz, impedance_ohm }) => {
                const px = xOf(x, frequency_Hz);
                if (px < 0 || px > x.width) return null;
                return (
                  <line
                    key={frequency_Hz}
                    x1={px}
                    x2={px}
                    y1={Math.max(0, yOf(y, impedance_ohm))}
                    y2={y.height + 26}
                    className="stroke-kingfisher"
                    strokeDasharray="1.5 3"
                  />
                );
              })}
              {cursor_Hz !== null && (
                <line
                  x1={xOf(x, cursor_Hz)}
                  x2={xOf(x, cursor_Hz)}
                  y1={0}
                  y2={y.height}
                  className="stroke-stone"
                  strokeOpacity="0.7"
                />
              )}
            </svg>
            {reach_Hz !== null && <PackageReach x={x} y={y} reach_Hz={reach_Hz} />}
            <ScaleLabels x={x} y={y} />
            <Waterline x={x} y={y} points={waterline} marks={breaks} />
          </>
        )}
      </div>
    </div>
  );
}
