import { climb, climbScratch, type Ladder } from './ladder';
import type { ComplexList } from './zeros';

const HUGE = 2 ** 300;
const TINY = 2 ** -300;
const here = climbScratch();

/**
 * P(s_i)/(b·Π_{j≠i}(s_i − s_j)) for zero `i` of B into `out` (re, im), where P is A or B and b the leading coefficient of B,
 * given by its logarithm. With A it is the residue of A/B at s_i; with B, at a guess, Weierstrass' correction. Residues are taken
 * from the zeros as found and not from B′, so that two near zeros and their residues stay true to each other.
 */
export function overProduct(
  ladder: Ladder,
  logLead: number,
  zeros: ComplexList,
  i: number,
  which: 'A' | 'B',
  out: Float64Array,
): void {
  const { re, im } = zeros;
  let exponent = Math.round(logLead / Math.LN2);
  let pRe = Math.exp(logLead - exponent * Math.LN2);
  let pIm = 0;
  for (let j = 0; j < re.length; j++) {
    if (j === i) continue;
    const dx = re[i] - re[j];
    const dy = im[i] - im[j];
    const next = pRe * dx - pIm * dy;
    pIm = pRe * dy + pIm * dx;
    pRe = next;
    const size = Math.max(Math.abs(pRe), Math.abs(pIm));
    if (size > HUGE || size < TINY) {
      const scale = size > HUGE ? TINY : HUGE;
      exponent += size > HUGE ? 300 : -300;
      pRe *= scale;
      pIm *= scale;
    }
  }
  climb(ladder, re[i], im[i], here);
  const k = which === 'A' ? 0 : 2;
  const p2 = pRe * pRe + pIm * pIm;
  const scale = 2 ** (here[6] - exponent);
  out[0] = (scale * (here[k] * pRe + here[k + 1] * pIm)) / p2;
  out[1] = (scale * (here[k + 1] * pRe - here[k] * pIm)) / p2;
}
