/** Where `growth` puts e^{pt} = g[0] + j·g[1] and, for its real part less 1, g[2]. */
export const growthScratch = (): Float64Array => new Float64Array(3);

/**
 * e^{pt} for p = re + j·im. e^{pt} − 1 is g[2] + j·g[1]: for a small exponent it must not be had by subtraction,
 * e^x·cos y − 1 = (e^x − 1)·cos y − 2·sin²(y/2).
 */
export function growth(re: number, im: number, t: number, g: Float64Array): void {
  const x = re * t;
  if (im === 0) {
    g[0] = Math.exp(x);
    g[1] = 0;
    g[2] = Math.expm1(x);
    return;
  }
  const y = im * t;
  const grown = Math.exp(x);
  const cosine = Math.cos(y);
  const half = Math.sin(0.5 * y);
  g[0] = grown * cosine;
  g[1] = grown * Math.sin(y);
  g[2] = Math.expm1(x) * cosine - 2 * half * half;
}
