import { formatQuantity } from '@shared/units/format';
import { type FrequencyAxis, type ImpedanceAxis, xOf, yOf } from './axis';

/** Decades inside [low, high], both ends included when they are decades. */
function decades(low: number, high: number): number[] {
  const slack = 1e-9;
  const found: number[] = [];
  for (let k = Math.ceil(Math.log10(low) - slack); k <= Math.log10(high) + slack; k++) found.push(10 ** k);
  return found;
}

/** Labels for an axis: its decades, and zoomed to less than two of them its two ends. */
function labelled(low: number, high: number): number[] {
  const inside = decades(low, high);
  return inside.length >= 2 ? inside : [...new Set([low, ...inside, high])];
}

/** Labels of the impedance scale: decades, and where fewer than three of them show, 2 and 5 of each as well. */
function impedanceLabels(low: number, high: number): number[] {
  const whole = decades(low, high);
  if (whole.length >= 3) return whole;
  const slack = 1e-9;
  const found: number[] = [];
  for (let k = Math.floor(Math.log10(low)); k <= Math.log10(high) + slack; k++)
    for (const step of [1, 2, 5]) {
      const value = step * 10 ** k;
      if (value >= low * (1 - slack) && value <= high * (1 + slack)) found.push(value);
    }
  return found;
}

/** Room that a frequency's label takes with some air, px. */
const LABEL_WIDTH = 72;

/** Every label where there is room, else every second or third one, the first always. */
function thinned(labels: readonly number[], width: number): number[] {
  const step = Math.max(1, Math.ceil((LABEL_WIDTH * (labels.length - 1)) / Math.max(width, 1)));
  return labels.filter((_, i) => i % step === 0);
}

/** The numbers of both scales: the outermost ones of the frequency axis stay inside its ends. */
export function ScaleLabels({ x, y }: { x: FrequencyAxis; y: ImpedanceAxis }) {
  const trim = { trim: true, digits: 3 };
  return (
    <svg
      aria-hidden="true"
      width={x.width}
      height={y.height}
      className="pointer-events-none absolute top-0 left-0 overflow-visible"
    >
      {thinned(labelled(x.low_Hz, x.high_Hz), x.width).map((f) => {
        const px = xOf(x, f);
        const anchor = px < 24 ? 'start' : px > x.width - 24 ? 'end' : 'middle';
        return (
          <text key={f} x={px} y={y.height + 19} textAnchor={anchor} className="fill-stone text-small">
            {formatQuantity(f, 'Hz', trim)}
          </text>
        );
      })}
      {impedanceLabels(y.low_ohm, y.high_ohm).map((z) => (
        <text
          key={z}
          x={-9}
          y={Math.min(y.height, Math.max(9, yOf(y, z) + 4))}
          textAnchor="end"
          className="fill-stone text-small"
        >
          {formatQuantity(z, 'Ω', trim)}
        </text>
      ))}
    </svg>
  );
}
