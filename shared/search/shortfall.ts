import type { Rows } from './rows';

/**
 * Total log-shortfall Σ ln(|Z|/Zt) over the frequencies where |Z| is above the target (nepers; 0: the grid holds), at
 * Y + sign·y_k, or at Y itself for k < 0. From condition.ts |Z|²/Zt² = N/M with N = |1 + Zs·Y|² and M = q + N. Ratios are
 * multiplied up and the logarithm is taken once in a while: it is the dear part.
 */
export function shortfall(rows: Rows, x: Float64Array, y: Float64Array, k = -1, sign = 1): number {
  const { exact, a, px, py, d, zsRe, zsIm } = rows;
  const kx = k < 0 ? x : rows.yx[k];
  const ky = k < 0 ? y : rows.yy[k];
  const factor = k < 0 ? 0 : sign;
  let sum = 0;
  let product = 1;
  for (let j = 0; j < exact.length; j++) {
    const f = exact[j];
    const re = x[f] + factor * kx[f];
    const im = y[f] + factor * ky[f];
    const q = a[f] * (re * re + im * im) + 2 * (px[f] * re + py[f] * im) + d[f];
    if (q >= 0) continue;
    const nr = 1 + zsRe[f] * re - zsIm[f] * im;
    const ni = zsRe[f] * im + zsIm[f] * re;
    const n = nr * nr + ni * ni;
    product *= n / Math.max(q + n, 1e-30 * n);
    if (product > 1e200) {
      sum += Math.log(product);
      product = 1;
    }
  }
  return 0.5 * (sum + Math.log(product));
}
