import type { Data, Layout } from 'plotly.js-dist-min';
import { useMemo } from 'react';
import type { FrequencyAxis, ImpedanceAxis } from './axis';
import { Plot } from './plotly';
import { useTokens } from './tokens';

/** A curve over frequency; `style` names what it means, not how it looks. */
export interface PlotCurve {
  name: string;
  style: 'total' | 'line' | 'other' | 'bound' | 'floor';
  frequency_Hz: Float64Array;
  magnitude_ohm: Float64Array;
}

interface ImpedancePlotProps {
  x: FrequencyAxis;
  y: ImpedanceAxis;
  curves: readonly PlotCurve[];
  /** The waterline at the total's frequencies, NaN outside the band: where the total lies above, the gap is filled. */
  target_ohm: Float64Array | null;
  /** Between what and what the impedance moves: shaded. */
  band?: { frequency_Hz: Float64Array; low_ohm: Float64Array; high_ohm: Float64Array } | null;
  /** A stretch of the axis was dragged over, or (null) double-clicked: the whole again. */
  onZoom: (span_Hz: [number, number] | null) => void;
}

/** Room in px at the left for the scale's numbers and at the bottom for those of the frequency axis. */
export const SCALE_WIDTH = 64;
export const TICK_HEIGHT = 26;
const TOP = 8;

/** The page keeps the span itself, so that strips and labels follow; the library only tells what was dragged over. */
const config = {
  displayModeBar: false,
  responsive: false,
  doubleClick: false as const,
  scrollZoom: false,
  showTips: false,
};

/** The impedance chart: double-logarithmic, margins fixed so that what stands below lines up with it to the pixel. */
export default function ImpedancePlot({ x, y, curves, target_ohm, band, onZoom }: ImpedancePlotProps) {
  const tokens = useTokens();
  const data = useMemo<Data[]>(() => {
    const traces: Data[] = [];
    if (band) traces.push(...shaded(band, tokens.shallow));
    const lines = curves.filter((curve) => curve.style === 'line');
    if (lines.length > 0) traces.push(joined(lines, tokens.stone));
    const total = curves.find((curve) => curve.style === 'total');
    if (total && target_ohm) traces.push(...broken(total, target_ohm, tokens.kingfisher));
    for (const curve of curves.filter((one) => one.style === 'other'))
      traces.push(trace(curve, { color: tokens.stone, width: 1.4, dash: '5px,4px' }));
    for (const curve of curves.filter((one) => one.style === 'bound'))
      traces.push(trace(curve, { color: tokens.deep, width: 1.2, dash: '1.5px,3px' }));
    for (const curve of curves.filter((one) => one.style === 'floor'))
      traces.push(trace(curve, { color: tokens.brass, width: 1.2, dash: '7px,3px,1.5px,3px' }));
    if (total) traces.push(trace(total, { color: tokens.ink, width: 2.2 }));
    return traces;
  }, [curves, target_ohm, band, tokens]);
  const layout = useMemo<Partial<Layout>>(
    () => ({
      width: x.width + SCALE_WIDTH,
      height: y.height + TOP + TICK_HEIGHT,
      margin: { l: SCALE_WIDTH, r: 0, t: TOP, b: TICK_HEIGHT, pad: 0 },
      paper_bgcolor: 'transparent',
      plot_bgcolor: 'transparent',
      showlegend: false,
      hovermode: false,
      dragmode: 'zoom',
      font: { family: 'JetBrains Mono, monospace', size: 12, color: tokens.stone },
      xaxis: {
        ...SCALE,
        range: [Math.log10(x.low_Hz), Math.log10(x.high_Hz)],
        gridcolor: tokens.hairline,
        linecolor: tokens.hairline,
        minor: { ticks: 'inside', ticklen: 4, tickcolor: tokens.stone, dtick: 'D1', nticks: 9 },
      },
      yaxis: {
        ...SCALE,
        range: [Math.log10(y.low_ohm), Math.log10(y.high_ohm)],
        gridcolor: tokens.hairline,
        linecolor: tokens.hairline,
        minor: { ticks: 'inside', ticklen: 4, tickcolor: tokens.stone, dtick: 'D1', nticks: 9 },
        fixedrange: true,
      },
    }),
    [x, y, tokens],
  );
  return (
    <Plot
      data={data}
      layout={layout}
      config={config}
      onDoubleClick={() => onZoom(null)}
      onRelayout={(event: Readonly<Record<string, unknown>>) => {
        const range = event['xaxis.range'];
        const [from, to] = Array.isArray(range) ? range : [event['xaxis.range[0]'], event['xaxis.range[1]']];
        if (typeof from === 'number' && typeof to === 'number') onZoom([10 ** from, 10 ** to]);
      }}
    />
  );
}

const SCALE = {
  type: 'log' as const,
  dtick: 1,
  showline: true,
  mirror: true,
  zeroline: false,
  // The scale's numbers are drawn over the plot (scale-labels.tsx), where they can be set in engineering notation.
  showticklabels: false,
};

function trace(curve: PlotCurve, line: { color: string; width: number; dash?: string }): Data {
  return {
    type: 'scatter',
    mode: 'lines',
    x: curve.frequency_Hz,
    y: curve.magnitude_ohm,
    line: { shape: 'linear', ...line } as never,
    hoverinfo: 'skip',
    name: curve.name,
  };
}

/** Points of a thin line at least this far apart, as a share of its span: about two pixels. */
const THIN = 1 / 320;

/** Many thin lines as one trace with gaps: the library's cost is by trace and by point. Their lowest points are kept. */
function joined(curves: readonly PlotCurve[], color: string): Data {
  const x: (number | null)[] = [];
  const y: (number | null)[] = [];
  for (const { frequency_Hz: f, magnitude_ohm: z } of curves) {
    const last = f.length - 1;
    const ratio = (f[last] / f[0]) ** THIN;
    let next = 0;
    for (let i = 0; i <= last; i++) {
      const isTurn = i > 0 && i < last && z[i] < z[i - 1] && z[i] <= z[i + 1];
      if (f[i] < next && !isTurn && i < last) continue;
      next = f[i] * ratio;
      x.push(f[i]);
      y.push(z[i]);
    }
    x.push(null);
    y.push(null);
  }
  return {
    type: 'scatter',
    mode: 'lines',
    x,
    y,
    connectgaps: false,
    line: { color, width: 0.8 },
    hoverinfo: 'skip',
    name: 'bank lines',
  };
}

function shaded(
  { frequency_Hz, low_ohm, high_ohm }: NonNullable<ImpedancePlotProps['band']>,
  color: string,
): Data[] {
  const shared = {
    type: 'scatter' as const,
    mode: 'lines' as const,
    x: frequency_Hz,
    line: { width: 0 },
    hoverinfo: 'skip' as const,
  };
  return [
    { ...shared, y: low_ohm, name: 'least' },
    { ...shared, y: high_ohm, name: 'most', fill: 'tonexty', fillcolor: `${color}66` },
  ];
}

/** The area between waterline and curve, where the curve lies above. */
function broken(total: PlotCurve, target_ohm: Float64Array, color: string): Data[] {
  const from = target_ohm.findIndex((value) => !Number.isNaN(value));
  if (from < 0) return [];
  let to = target_ohm.length;
  while (to > from && Number.isNaN(target_ohm[to - 1])) to--;
  const x = total.frequency_Hz.subarray(from, to);
  const base = target_ohm.subarray(from, to);
  const top = total.magnitude_ohm.subarray(from, to).map((value, i) => Math.max(value, base[i]));
  if (top.every((value, i) => value === base[i])) return [];
  const shared = {
    type: 'scatter' as const,
    mode: 'lines' as const,
    x,
    line: { width: 0 },
    hoverinfo: 'skip' as const,
  };
  return [
    { ...shared, y: base, name: 'waterline' },
    { ...shared, y: top, name: 'breaks the surface', fill: 'tonexty', fillcolor: color },
  ];
}
