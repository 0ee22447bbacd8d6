import type { Ladder } from './ladder';
import { overProduct } from './residues';
import type { ComplexList } from './zeros';

/** Keeps a real zero real and the conjugate of another its conjugate. */
export function mirror({ re, im }: ComplexList, i: number, realOnes: number): void {
  if (i < realOnes) im[i] = 0;
  else {
    re[i + 1] = re[i];
    im[i + 1] = -im[i];
  }
}

/** Sets near pairs apart and gives the places of the zeros, one of each conjugate pair, that were left alone. */
export function setApart(
  ladder: Ladder,
  logLead: number,
  zeros: ComplexList,
  realOnes: number,
  apart: number,
): number[] {
  const { re, im } = zeros;
  const places: number[] = [];
  for (let i = 0; i < re.length; i += i < realOnes ? 1 : 2) places.push(i);
  const near = new Set<number>();
  for (const i of places)
    for (const j of places) {
      if (j <= i || near.has(i) || near.has(j) || i < realOnes !== j < realOnes) continue;
      if (Math.hypot(re[i] - re[j], im[i] - im[j]) >= apart * Math.hypot(re[i], im[i])) continue;
      near.add(i).add(j);
      for (let round = 0; round < 3; round++) {
        place(zeros, i, j, realOnes, apart);
        if (round < 2) meanStep(ladder, logLead, zeros, i, j);
      }
    }
  return places.filter((i) => !near.has(i));
}

function place(zeros: ComplexList, i: number, j: number, realOnes: number, apart: number): void {
  const { re, im } = zeros;
  const x = 0.5 * (re[i] + re[j]);
  const y = 0.5 * (im[i] + im[j]);
  re[i] = x * (1 - 0.5 * apart);
  im[i] = y * (1 - 0.5 * apart);
  re[j] = x * (1 + 0.5 * apart);
  im[j] = y * (1 + 0.5 * apart);
  mirror(zeros, i, realOnes);
  mirror(zeros, j, realOnes);
}

const one = new Float64Array(2);
const other = new Float64Array(2);

/** Weierstrass' corrections of both: their sum puts the mean right, whatever the distance. */
function meanStep(ladder: Ladder, logLead: number, zeros: ComplexList, i: number, j: number): void {
  overProduct(ladder, logLead, zeros, i, 'B', one);
  overProduct(ladder, logLead, zeros, j, 'B', other);
  zeros.re[i] -= one[0];
  zeros.im[i] -= one[1];
  zeros.re[j] -= other[0];
  zeros.im[j] -= other[1];
}
