import type { CurveName } from './curve-fields';

/** Points of a curve as a small picture holds them: x and y from 0 to 1, y upwards. */
export interface Sketch {
  points: [number, number][];
  /** What stands at the left, right, lower and upper edge. */
  edges: { left: number; right: number; bottom: number; top: number };
}

const LOGARITHMIC: ReadonlySet<CurveName> = new Set(['esr_table', 'impedance_table']);

/** |Z| of a measured point; of the others their second number. */
const heightOf = ([, first, second]: readonly number[]): number =>
  second === undefined ? first : Math.hypot(first, second);

/** The picture of what has been typed so far, or null while there is no line to draw. */
export function sketchOf(name: CurveName, rows: readonly (readonly number[])[]): Sketch | null {
  const isLog = LOGARITHMIC.has(name);
  const pairs = rows.map((row) => [row[0], heightOf(row)] as const);
  if (pairs.length < 2 || (isLog && pairs.some(([x, y]) => !(x > 0 && y > 0)))) return null;
  const xs = pairs.map(([x]) => x);
  const ys = pairs.map(([, y]) => y);
  const edges = {
    left: Math.min(...xs),
    right: Math.max(...xs),
    // A factor is looked at from nothing up to what the catalogue says.
    bottom: isLog ? Math.min(...ys) : 0,
    top: isLog ? Math.max(...ys) : Math.max(1, ...ys),
  };
  if (!(edges.right > edges.left)) return null;
  const scale = (value: number) => (isLog ? Math.log(value) : value);
  const part = (value: number, low: number, high: number) =>
    high > low ? (scale(value) - scale(low)) / (scale(high) - scale(low)) : 0.5;
  return {
    points: pairs.map(([x, y]) => [part(x, edges.left, edges.right), part(y, edges.bottom, edges.top)]),
    edges,
  };
}
