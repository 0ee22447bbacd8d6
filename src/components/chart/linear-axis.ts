/** Round places between two ends, about `wanted` of them: multiples of 1, 2 or 5 of a decade. */
export function linearTicks(low: number, high: number, wanted: number): number[] {
  const span = high - low;
  if (!(span > 0) || wanted < 1) return [];
  const raw = span / wanted;
  const decade = 10 ** Math.floor(Math.log10(raw));
  const step = ([1, 2, 5, 10].find((one) => one * decade >= raw * (1 - 1e-9)) ?? 10) * decade;
  const ticks: number[] = [];
  for (let k = Math.ceil(low / step - 1e-9); k * step <= high + 1e-9 * span; k++) {
    // k·step has rounding noise that would show in a label (0.30000000000000004).
    ticks.push(k === 0 ? 0 : Number((k * step).toPrecision(12)));
  }
  return ticks;
}

/**
 * A curve as an SVG path of at most four points a pixel: in each pixel's column its first, lowest, highest and last point, so that
 * no swing is lost.
 */
export function thinnedPath(
  xs: Float64Array,
  ys: Float64Array,
  [from, to]: readonly [number, number],
  x: (value: number) => number,
  y: (value: number) => number,
): string {
  let path = '';
  let column = Number.NaN;
  let pending: number[] = [];
  const flush = () => {
    for (const i of [...new Set(pending)].sort((a, b) => a - b))
      path += `${path === '' ? 'M' : 'L'}${x(xs[i]).toFixed(2)} ${y(ys[i]).toFixed(2)}`;
  };
  for (let i = 0; i < xs.length; i++) {
    // One point beyond each end, so that the line runs out of the picture.
    if (xs[i] < from && xs[i + 1] < from) continue;
    if (xs[i] > to && xs[i - 1] > to) break;
    const here = Math.floor(x(xs[i]));
    if (here !== column) {
      flush();
      column = here;
      pending = [i, i, i, i];
      continue;
    }
    if (ys[i] < ys[pending[1]]) pending[1] = i;
    if (ys[i] > ys[pending[2]]) pending[2] = i;
    pending[3] = i;
  }
  flush();
  return path;
}
