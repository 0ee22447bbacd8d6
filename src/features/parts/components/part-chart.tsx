import type { ServiceValues } from '@shared/engine/service/in-service';
import type { Part } from '@shared/schemas/part.schema';
import type { DocumentPart } from '@shared/schemas/rail-document.schema';
import { formatQuantity } from '@shared/units/format';
import { useId, useMemo } from 'react';
import { type FrequencyAxis, type ImpedanceAxis, xOf, yOf } from '@/components/chart/axis';
import { useWidth } from '@/components/chart/use-width';
import { Notice } from '@/components/ui/notice';
import { type Curve, partCurves } from '../lib/part-curves';
import { orRefusal } from '../lib/refusal';
import type { Situation } from '../lib/situation';
import { ImpedanceGrid } from './impedance-grid';
import { PartChartKey } from './part-chart-key';
import { ResonanceMark } from './resonance-mark';

const HEIGHT = 320;
const MARGIN = { left: 60, right: 12, top: 8, bottom: 26 };

interface Props {
  part: Part;
  document: DocumentPart;
  at: Situation;
  values: ServiceValues | null;
}

/** |Z| over frequency of one capacitor, log–log: as mounted in service and by the catalogue, and the part alone. */
export function PartChart({ part, document, at, values }: Props) {
  const [ref, width] = useWidth<HTMLElement>();
  const clip = useId();
  const answer = useMemo(() => orRefusal(() => partCurves(document, at)), [document, at]);
  if ('refusal' in answer)
    return (
      <Notice tone="error" title="▲ no curve">
        {answer.refusal}
      </Notice>
    );
  const curves = answer.value;
  const x: FrequencyAxis = {
    low_Hz: curves.band[0],
    high_Hz: curves.band[1],
    width: Math.max(120, width - MARGIN.left - MARGIN.right),
  };
  const y: ImpedanceAxis = {
    low_ohm: curves.impedance[0],
    high_ohm: curves.impedance[1],
    height: HEIGHT - MARGIN.top - MARGIN.bottom,
  };
  const place = ([f, z]: Curve[number]) => `${xOf(x, f).toFixed(1)} ${yOf(y, z).toFixed(1)}`;
  const path = (curve: Curve) => (curve.length > 0 ? `M${curve.map(place).join('L')}` : '');
  const lowest = curves.serviceLowest ?? curves.catalogueLowest;
  const words = lowest
    ? `lowest at ${formatQuantity(lowest[0], 'Hz')} as mounted, there ${formatQuantity(lowest[1], 'Ω')}`
    : 'no self-resonance in the range shown';
  return (
    <figure ref={ref} className="m-0 w-full">
      {width > 0 && (
        <svg
          width={width}
          height={HEIGHT}
          role="img"
          aria-label={`Impedance of ${part.partNumber} over frequency, ${words}`}
          fill="none"
          className="block"
        >
          <defs>
            <clipPath id={clip}>
              <rect width={x.width} height={y.height} />
            </clipPath>
          </defs>
          <g transform={`translate(${MARGIN.left} ${MARGIN.top})`}>
            <ImpedanceGrid x={x} y={y} />
            <g clipPath={`url(#${clip})`}>
              <path d={path(curves.alone)} className="stroke-stone" strokeDasharray="1 3" strokeWidth="1.2" />
              <path d={path(curves.catalogue)} className="stroke-stone" strokeWidth="1.2" />
              <path d={path(curves.service)} className="stroke-ink" strokeWidth="2" />
              {curves.measured.map((point) => (
                <circle
                  key={point[0]}
                  cx={xOf(x, point[0])}
                  cy={yOf(y, point[1])}
                  r="2"
                  className="fill-paper stroke-deep"
                />
              ))}
            </g>
            {lowest && <ResonanceMark x={x} y={y} at={lowest} />}
          </g>
        </svg>
      )}
      <PartChartKey part={part} curves={curves} values={values} />
    </figure>
  );
}
