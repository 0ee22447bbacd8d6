/** The one frequency axis that chart, share strips and plumb lines hang from: logarithmic, `width` px wide. */
export interface FrequencyAxis {
  low_Hz: number;
  high_Hz: number;
  width: number;
}

/** Place of a frequency in px from the axis' start; outside 0 … width when it is not shown. */
export function xOf(axis: FrequencyAxis, frequency_Hz: number): number {
  return (Math.log(frequency_Hz / axis.low_Hz) / Math.log(axis.high_Hz / axis.low_Hz)) * axis.width;
}

/** Frequency at a place in px. */
export function frequencyAt(axis: FrequencyAxis, x: number): number {
  return axis.low_Hz * (axis.high_Hz / axis.low_Hz) ** (x / axis.width);
}

/** Whole decades around a band, so that a chart does not move when its edges do. */
export function decadesAround(low: number, high: number): [number, number] {
  const slack = 1e-9;
  const from = 10 ** Math.floor(Math.log10(low) + slack);
  const to = 10 ** Math.ceil(Math.log10(high) - slack);
  return to > from ? [from, to] : [from, from * 10];
}

/** The impedance scale, ohm: also logarithmic, from the bottom up. */
export interface ImpedanceAxis {
  low_ohm: number;
  high_ohm: number;
  height: number;
}

export function yOf(axis: ImpedanceAxis, impedance_ohm: number): number {
  return axis.height * (1 - Math.log(impedance_ohm / axis.low_ohm) / Math.log(axis.high_ohm / axis.low_ohm));
}

/**
 * Scale that shows the curve and the waterline with room above it; a curve that shoots far above (an empty bank) is
 * cut two decades over the waterline, so that the waterline stays readable.
 */
export function impedanceScale(
  curve_ohm: ArrayLike<number>,
  target_ohm: readonly number[],
): [number, number] {
  let low = Number.POSITIVE_INFINITY;
  let high = 0;
  for (let i = 0; i < curve_ohm.length; i++) {
    if (curve_ohm[i] < low) low = curve_ohm[i];
    if (curve_ohm[i] > high) high = curve_ohm[i];
  }
  const lowTarget = Math.min(...target_ohm);
  const highTarget = Math.max(...target_ohm);
  const floor = Math.max(Math.min(low, lowTarget / 2), lowTarget / 1000);
  const ceiling = Math.max(highTarget * 5, Math.min(high, highTarget * 40));
  return [roundStep(floor, 'down'), roundStep(ceiling, 'up')];
}

/** The next 1, 2 or 5 of a decade, downwards or upwards. */
function roundStep(value: number, way: 'down' | 'up'): number {
  const decade = 10 ** Math.floor(Math.log10(value) + 1e-9);
  const ratio = value / decade;
  const steps = way === 'down' ? [5, 2, 1] : [1, 2, 5, 10];
  const step = steps.find((one) => (way === 'down' ? one <= ratio + 1e-9 : one >= ratio - 1e-9)) ?? 1;
  return decade * step;
}
