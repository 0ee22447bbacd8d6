import type { Tightest } from '../engine/headroom';
import { seenImpedance } from '../engine/rail';
import type { Prepared } from './prepare';
import { type Reach, reachAt } from './reach';
import type { Rows } from './rows';

const PREFIXES: [number, string][] = [
  [1e9, 'G'],
  [1e6, 'M'],
  [1e3, 'k'],
  [1, ''],
  [1e-3, 'm'],
  [1e-6, 'µ'],
  [1e-9, 'n'],
  [1e-12, 'p'],
];

/** A maximum per part below this is worth mentioning as a reason. */
const FEW = 20;

/** A quantity with three digits and an SI prefix, e.g. 11.6 mΩ. */
export function engineering(value: number, unit: string): string {
  const size = Math.abs(value);
  const [scale, prefix] = PREFIXES.find(([s]) => size >= s * 0.9995) ?? PREFIXES[PREFIXES.length - 1];
  return `${Number((value / scale).toPrecision(3))} ${prefix}${unit}`;
}

/** |Z| in ohm that the load sees at row `f` with Y = x + jy at the node. */
function impedanceAt({ rail }: Prepared, rows: Rows, f: number, x: number, y: number): number {
  const out = Float64Array.of(x, y, 0, 0);
  seenImpedance(rail, rows.frequency_Hz[f], out);
  return Math.hypot(out[0], out[1]);
}

/** Why no mix can meet the row of `reach`: what the best candidate and all together leave there, and what is to blame. */
export function explainReach(prepared: Prepared, rows: Rows, reach: Reach): string {
  const exact = rows.exact.findLast((f) => f <= reach.row) as number;
  const at = `At ${engineering(rows.frequency_Hz[exact], 'Hz')}`;
  const target = `the target of ${engineering(rows.zt[exact], 'Ω')}`;
  const series = Math.hypot(rows.zsRe[exact], rows.zsIm[exact]);
  const view = prepared.rail.view;
  if (rows.a[exact] < 0 && view && series > rows.zt[exact])
    return `${at} the package's ${engineering(view.l, 'H')} and ${engineering(view.r, 'Ω')} alone are ${engineering(series, 'Ω')}, above ${target}: no bank on the board can bring that down.`;
  let best = { ohm: Number.POSITIVE_INFINITY, k: -1 };
  prepared.parts.forEach((part, k) => {
    const more = part.max - part.min;
    const x = rows.y0x[exact] + more * rows.yx[k][exact];
    const y = rows.y0y[exact] + more * rows.yy[k][exact];
    const ohm = impedanceAt(prepared, rows, exact, x, y);
    if (more > 0 && ohm < best.ohm) best = { ohm, k };
  });
  const together = reachAt(prepared, rows, exact);
  const all = engineering(impedanceAt(prepared, rows, exact, together.x, together.y), 'Ω');
  if (best.k < 0) return `${at} what is fixed leaves ${all}, above ${target}, and no candidate may be added.`;
  const part = prepared.parts[best.k];
  const some = part.max === 1 ? `one ${part.id}` : `${part.max} of ${part.id}`;
  const leave = part.max === 1 ? 'leaves' : 'leave';
  const limit = part.max < FEW ? `; no more than ${part.max} of a part may be used` : '';
  // Z = 1/Y of one piece: its reactance has the sign of −Im Y
  const re = rows.yx[best.k][exact];
  const im = rows.yy[best.k][exact];
  const inductance =
    im < 0 ? 'its inductance with mount and path is too large' : 'its capacitance is too small';
  const cause = Math.abs(im) < re ? 'its ESR is too large' : inductance;
  return `${at} even ${some}, the best candidate there, ${leave} ${engineering(best.ohm, 'Ω')}, and the best use of all candidates within their maxima ${all}, above ${target}: ${cause}${limit}.`;
}

/** Every frequency alone is within reach, but every combination has been tried. */
export function explainExhausted(prepared: Prepared, closest: Tightest | null): string {
  const all = 'Every combination within the maxima and the number of kinds is excluded';
  return `${all}${nearest(prepared, closest)}.`;
}

/** The time was up before any mix was found. */
export function explainTimeout(prepared: Prepared, seconds: number, closest: Tightest | null): string {
  const none = `No mix was found in ${Number(seconds.toPrecision(2))} s, and none is proven impossible`;
  return `${none}${nearest(prepared, closest)}.`;
}

/** How close the best attempt came, and whether the package alone is to blame there. */
function nearest({ rail }: Prepared, closest: Tightest | null): string {
  if (!closest) return '';
  const { frequency_Hz, impedance_ohm, target_ohm, headroom_dB } = closest;
  const short = Number(Math.max(0, -headroom_dB).toPrecision(3));
  const attempt = `: the closest still has ${engineering(impedance_ohm, 'Ω')} at ${engineering(frequency_Hz, 'Hz')}, ${short} dB above the target of ${engineering(target_ohm, 'Ω')}`;
  if (!rail.view) return attempt;
  const series = Math.hypot(rail.view.r, 2 * Math.PI * frequency_Hz * rail.view.l);
  if (series <= target_ohm) return attempt;
  return `${attempt}; the package's ${engineering(rail.view.l, 'H')} and ${engineering(rail.view.r, 'Ω')} alone are ${engineering(series, 'Ω')} there`;
}
