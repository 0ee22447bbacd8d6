import { formatQuantity } from '@shared/units/format';
import { useId } from 'react';
import { type FrequencyAxis, type ImpedanceAxis, xOf, yOf } from './axis';

interface WaterlineProps {
  x: FrequencyAxis;
  y: ImpedanceAxis;
  /** [Hz, ohm] corners from one end of the band to the other. */
  points: readonly (readonly [number, number])[];
  /** Peaks that break the surface, numbered as in the list beside the chart. */
  marks: readonly { frequency_Hz: number; impedance_ohm: number }[];
}

const HATCH = 20;

/** The waterline with the hatch of forbidden ground above it, its name, and the numbered peaks that break it. */
export function Waterline({ x, y, points, marks }: WaterlineProps) {
  const pattern = useId();
  const clip = useId();
  const corners = points.map(([f, z]) => [xOf(x, f), yOf(y, z)] as const);
  const line = corners.map(([px, py]) => `${px.toFixed(1)},${py.toFixed(1)}`).join(' ');
  const above = [...corners].reverse().map(([px, py]) => `${px.toFixed(1)},${(py - HATCH).toFixed(1)}`);
  const label = labelPlace(corners, x.width);
  const name = points.every(([, z]) => z === points[0][1]) ? ` ${formatQuantity(points[0][1], 'Ω')}` : '';
  return (
    <svg
      aria-hidden="true"
      width={x.width}
      height={y.height}
      className="pointer-events-none absolute top-0 left-0 overflow-visible"
    >
      <defs>
        <pattern
          id={pattern}
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <line x1="0" y1="0" x2="0" y2="6" className="stroke-shallow" strokeWidth="1.6" />
        </pattern>
        <clipPath id={clip}>
          <rect width={x.width} height={y.height} />
        </clipPath>
      </defs>
      <g clipPath={`url(#${clip})`}>
        <polygon points={`${line} ${above.join(' ')}`} fill={`url(#${pattern})`} opacity="0.6" />
        <polyline points={line} fill="none" className="stroke-deep" strokeWidth="2.4" />
        {label && (
          <text
            x={label[0]}
            y={label[1] - 8}
            className="fill-deep text-small"
            stroke="var(--paper)"
            strokeWidth="4"
            paintOrder="stroke"
          >
            waterline{name}
          </text>
        )}
      </g>
      {marks.map((mark, i) => {
        const px = xOf(x, mark.frequency_Hz);
        if (px < 0 || px > x.width) return null;
        const py = Math.min(y.height - 9, Math.max(9, yOf(y, mark.impedance_ohm)));
        return (
          <g key={mark.frequency_Hz}>
            <circle cx={px} cy={py} r="9" className="fill-paper stroke-kingfisher" strokeWidth="1.4" />
            <text x={px} y={py + 4} textAnchor="middle" className="fill-ink" fontSize="11">
              {i + 1}
            </text>
          </g>
        );
      })}
    </svg>
  );
}

/** Where the name stands: about a quarter along the visible part of the line. */
function labelPlace(corners: readonly (readonly [number, number])[], width: number): [number, number] | null {
  const from = Math.max(0, corners[0][0]);
  const to = Math.min(width, corners[corners.length - 1][0]);
  if (to - from < 160) return to > from ? [from + 4, corners[0][1]] : null;
  const x = from + 0.27 * (to - from);
  for (let i = 1; i < corners.length; i++) {
    const [x0, y0] = corners[i - 1];
    const [x1, y1] = corners[i];
    if (x <= x1) return [x, y0 + ((y1 - y0) * (x - x0)) / Math.max(1e-9, x1 - x0)];
  }
  return [x, corners[corners.length - 1][1]];
}
