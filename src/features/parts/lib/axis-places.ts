import { linearTicks } from '@/components/chart/linear-axis';

/** A level scale: `low` at its start, `high` `length` px further. */
export interface LinearAxis {
  low: number;
  high: number;
  length: number;
}

export const placeOn = (axis: LinearAxis, value: number): number =>
  ((value - axis.low) / (axis.high - axis.low)) * axis.length;

/** Both ends, and between them the round values that keep `apart` px from either. */
export function ticksWithEnds(axis: LinearAxis, most: number, apart: number): number[] {
  const inside = linearTicks(axis.low, axis.high, most).filter((value) => {
    const place = placeOn(axis, value);
    return place >= apart && place <= axis.length - apart;
  });
  return [axis.low, ...inside, axis.high];
}

/** The step of a control over 0 … `most`: round, 60 to 200 of them, the last exactly at the end; else a hundredth. */
export function controlStep(most: number): number {
  const decade = 10 ** Math.floor(Math.log10(most));
  for (const part of [0.1, 0.05, 0.02, 0.01, 0.005]) {
    const step = Number((part * decade).toPrecision(3));
    const steps = most / step;
    if (steps >= 60 && steps <= 200 && Math.abs(steps - Math.round(steps)) < 1e-6) return step;
  }
  return most / 100;
}
