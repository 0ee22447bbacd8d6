import type { RailInTime } from '@workers/checks/checks.interface';

export interface StepWindow {
  name: 'rise' | 'fall' | 'whole';
  label: string;
  span_s: [number, number];
  /** What its axis counts from. */
  origin_s: number;
}

type Step = NonNullable<RailInTime['step']>;
type Load = NonNullable<RailInTime['load']>;

/** Rise times shown at least, and the place of the extreme in the picture (a quarter in: what comes after matters more). */
const LEAST_RISES = 12;
const EXTREME_AT = 0.25;

/** Stretches of the step worth looking at: around the rise, around the fall, and all of it. */
export function stepWindows(step: Step, { rise_s, hold_s, fall_s }: Load): StepWindow[] {
  const end = step.time_s[step.time_s.length - 1];
  const fallAt = rise_s + hold_s;
  const lengthFor = (since: number, edge_s: number, most: number) =>
    Math.min(most, Math.max(LEAST_RISES * edge_s, since / EXTREME_AT));
  const after = (at: number, length: number): [number, number] => [at - 0.06 * length, at + length];
  const rise = lengthFor(Math.max(0, step.droop_time_s), rise_s, Math.max(fallAt, LEAST_RISES * rise_s));
  const sinceFall = Math.max(0, step.overshoot_time_s - fallAt);
  const fall = lengthFor(
    sinceFall > 0 ? sinceFall : rise * EXTREME_AT,
    fall_s,
    Math.max(end - fallAt, fall_s),
  );
  return [
    { name: 'rise', label: 'around the rise', span_s: after(0, rise), origin_s: 0 },
    { name: 'fall', label: 'from the start of the fall', span_s: after(fallAt, fall), origin_s: fallAt },
    { name: 'whole', label: 'whole', span_s: [Math.min(0, step.time_s[0]), end], origin_s: 0 },
  ];
}
