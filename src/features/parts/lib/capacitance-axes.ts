import { linearTicks } from '@/components/chart/linear-axis';
import { type LinearAxis, placeOn } from './axis-places';
import type { CapacitanceCurve, CurvePoint } from './capacitance-curves';

export const PLOT_HEIGHT = 184;
export const MARGIN = { left: 60, right: 16, top: 10, bottom: 24 };

/** The paper of a capacitance chart: its condition from left to right, farads from nothing upwards. */
export interface CapacitanceAxes {
  x: LinearAxis;
  y: LinearAxis;
  /** The farads that are marked; the last one is the paper's edge. */
  rows: number[];
}

/** Ends at a round value with room above the highest curve for the text of the point in service. */
export function capacitanceAxes(
  curve: CapacitanceCurve,
  catalogue_F: number,
  width: number,
): CapacitanceAxes {
  const most_F = Math.max(catalogue_F, ...[...curve.chosen, ...curve.alone].map((point) => point.high_F));
  const step_F = linearTicks(0, most_F, 5)[1];
  const steps = Math.ceil((most_F * 1.1) / step_F - 1e-9);
  const rows = linearTicks(0, step_F * steps, steps);
  return {
    x: { low: curve.range[0], high: curve.range[1], length: width },
    y: { low: 0, high: rows[rows.length - 1], length: PLOT_HEIGHT },
    rows,
  };
}

/** Height of a capacitance in px from the top of the plot. */
export const heightOf = ({ y }: CapacitanceAxes, capacitance_F: number): number =>
  y.length - placeOn(y, capacitance_F);

const at = (axes: CapacitanceAxes, x: number, capacitance_F: number) =>
  `${placeOn(axes.x, x).toFixed(1)} ${heightOf(axes, capacitance_F).toFixed(1)}`;

export const linePath = (axes: CapacitanceAxes, points: readonly CurvePoint[]): string =>
  `M${points.map((p) => at(axes, p.x, p.capacitance_F)).join('L')}`;

/** The band between the limits, there and back; nothing where there is none. */
export function bandPath(axes: CapacitanceAxes, points: readonly CurvePoint[]): string {
  if (!points.some((p) => p.high_F > p.low_F * (1 + 1e-9))) return '';
  const upper = points.map((p) => at(axes, p.x, p.high_F));
  const lower = [...points].reverse().map((p) => at(axes, p.x, p.low_F));
  return `M${[...upper, ...lower].join('L')}Z`;
}
