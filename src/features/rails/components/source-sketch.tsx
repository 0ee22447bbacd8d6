import { targetAt } from '@shared/engine/target';
import { targetMask } from '@shared/rail/target-mask';
import { formatQuantity } from '@shared/units/format';
import { useMemo } from 'react';
import { decadesAround, type FrequencyAxis, type ImpedanceAxis, xOf, yOf } from '@/components/chart/axis';
import { useWidth } from '@/components/chart/use-width';
import { liveBand, liveSource, liveTarget } from '../lib/live';
import { sourceMagnitude_ohm, spreadOver } from '../lib/source-curve';
import type { SpecForm } from '../lib/spec-form';

const HEIGHT = 120;
const POINTS = 161;

/** |Z| of the source over the band, log–log, with the waterline where it is known. `text` says the same in words. */
export function SourceSketch({ form, text }: { form: SpecForm; text: string }) {
  const [ref, width] = useWidth<HTMLElement>();
  const lines = useMemo(() => linesOf(form), [form]);
  if (!lines) return null;
  const [low_ohm, high_ohm] = decadesAround(
    Math.min(...lines.source, ...lines.target),
    Math.max(...lines.source, ...lines.target),
  );
  const [low_Hz, high_Hz] = [lines.frequency_Hz[0], lines.frequency_Hz[POINTS - 1]];
  const x: FrequencyAxis = { low_Hz, high_Hz, width };
  const y: ImpedanceAxis = { low_ohm, high_ohm, height: HEIGHT };
  const path = (ohm: readonly number[]) =>
    ohm.length === 0
      ? ''
      : `M${lines.frequency_Hz.map((f, i) => `${xOf(x, f).toFixed(1)} ${yOf(y, ohm[i]).toFixed(1)}`).join('L')}`;
  return (
    <figure ref={ref} className="m-0 flex max-w-xl min-w-0 flex-col gap-1">
      <figcaption className="flex justify-between gap-2 text-small text-stone">
        <span>
          |Z| of the source, {formatQuantity(low_ohm, 'Ω', { trim: true })} to{' '}
          {formatQuantity(high_ohm, 'Ω', { trim: true })}
        </span>
        {lines.target.length > 0 && <span>thick: target</span>}
      </figcaption>
      <svg
        role="img"
        aria-label={`Impedance of the source over the band: ${text}`}
        width={width}
        height={HEIGHT}
        fill="none"
        className="block border"
      >
        <Decades x={x} y={y} />
        <path d={path(lines.target)} className="stroke-deep" strokeWidth="2.4" />
        <path d={path(lines.source)} className="stroke-ink" strokeWidth="1.5" />
      </svg>
      <div aria-hidden className="flex justify-between gap-2 text-small text-stone">
        <span>{formatQuantity(low_Hz, 'Hz', { trim: true })}</span>
        <span>{formatQuantity(high_Hz, 'Hz', { trim: true })}</span>
      </div>
    </figure>
  );
}

function linesOf(form: SpecForm): { frequency_Hz: number[]; source: number[]; target: number[] } | null {
  const source = liveSource(form);
  const band = liveBand(form);
  if (!source || !band) return null;
  const frequency_Hz = spreadOver(band, POINTS);
  const curve = sourceMagnitude_ohm(source, frequency_Hz);
  const target = liveTarget(form);
  const mask = target && targetMask(target);
  return (
    curve && { frequency_Hz, source: curve, target: mask ? frequency_Hz.map((f) => targetAt(mask, f)) : [] }
  );
}

/** Hairlines at the decades inside both axes. */
function Decades({ x, y }: { x: FrequencyAxis; y: ImpedanceAxis }) {
  const across = decadesInside(x.low_Hz, x.high_Hz).map((f) => `M${xOf(x, f).toFixed(1)} 0V${y.height}`);
  const up = decadesInside(y.low_ohm, y.high_ohm).map((z) => `M0 ${yOf(y, z).toFixed(1)}H${x.width}`);
  return <path d={[...across, ...up].join('')} className="stroke-hairline" />;
}

function decadesInside(low: number, high: number): number[] {
  const found: number[] = [];
  for (let k = Math.floor(Math.log10(low)) + 1; 10 ** k < high * (1 - 1e-9); k++) found.push(10 ** k);
  return found;
}
