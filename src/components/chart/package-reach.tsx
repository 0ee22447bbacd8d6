import { formatQuantity } from '@shared/units/format';
import { useId } from 'react';
import { type FrequencyAxis, type ImpedanceAxis, xOf } from './axis';

interface PackageReachProps {
  x: FrequencyAxis;
  y: ImpedanceAxis;
  reach_Hz: number;
}

const DEPTH = 14;

/** The boundary beyond which the package keeps any bank on the board from the die: an upright line, hatched on the far side. */
export function PackageReach({ x, y, reach_Hz }: PackageReachProps) {
  const pattern = useId();
  const px = xOf(x, reach_Hz);
  if (px > x.width) return null;
  const at = Math.max(0, px);
  const right = at > 0.62 * x.width;
  return (
    <svg
      aria-hidden="true"
      width={x.width}
      height={y.height}
      className="pointer-events-none absolute top-0 left-0 overflow-hidden"
    >
      <defs>
        <pattern
          id={pattern}
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(-45)"
        >
          <line x1="0" y1="0" x2="0" y2="6" className="stroke-brass" strokeWidth="1.2" />
        </pattern>
      </defs>
      <rect x={at} width={DEPTH} height={y.height} fill={`url(#${pattern})`} opacity="0.55" />
      <path d={`M${at} 0V${y.height}`} className="stroke-brass" strokeWidth="1.4" />
      {[`beyond ${formatQuantity(reach_Hz, 'Hz')}`, 'the board does not reach the die'].map((line, i) => (
        <text
          key={line}
          x={at + (right ? -6 : DEPTH + 6)}
          y={y.height - 26 + 15 * i}
          textAnchor={right ? 'end' : 'start'}
          className="fill-brass text-small"
          stroke="var(--paper)"
          strokeWidth="4"
          paintOrder="stroke"
        >
          {line}
        </text>
      ))}
    </svg>
  );
}
