/** Square of the correlation between two equally long lists, 0 … 1; 0 where one of them does not vary. */
export function squaredCorrelation(x: Float64Array, y: Float64Array): number {
  const n = x.length;
  let sx = 0;
  let sy = 0;
  for (let i = 0; i < n; i++) {
    sx += x[i];
    sy += y[i];
  }
  const [mx, my] = [sx / n, sy / n];
  let xy = 0;
  let xx = 0;
  let yy = 0;
  for (let i = 0; i < n; i++) {
    const dx = x[i] - mx;
    const dy = y[i] - my;
    xy += dx * dy;
    xx += dx * dx;
    yy += dy * dy;
  }
  return xx > 0 && yy > 0 ? (xy * xy) / (xx * yy) : 0;
}
