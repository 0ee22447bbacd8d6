import { EngineError } from '../errors';
import type { CompiledRail } from '../rail';
import { directResistance, endAtInfinity } from './ends';
import { disagreement } from './form-impedance';
import { type Ladder, ladderOf } from './ladder';
import { overProduct } from './residues';
import { settleZeros } from './settle-zeros';
import { lumpedRail } from './stand-in';
import { logCoefficients } from './start-guess';
import { type ComplexList, findZeros } from './zeros';

/**
 * The impedance that the load sees as Z(s) = s·L + R + Σ r_i/(s − p_i), s in rad/s. A complex pole stands in the lists once, with
 * Im p > 0, and counts with its conjugate.
 */
export interface PoleForm {
  /** L: above zero where every branch has inductance, so that a current without rise time would need an infinite voltage. */
  inductance_H: number;
  /** R: what is left of Z at very high frequency beside s·L. */
  resistance_ohm: number;
  /** Z(0). */
  dc_ohm: number;
  /** Poles in rad/s, all with Re < 0; Im ≥ 0. */
  poleRe: Float64Array;
  poleIm: Float64Array;
  /** Residues in ohm·rad/s. */
  residueRe: Float64Array;
  residueIm: Float64Array;
  /** Members whose tables over frequency a fixed series R–L–C stands in for, by identifier. */
  approximated: string[];
}

/** How closely the form must agree with the engine's own Z(jω), relative to |Z|. */
const AGREEMENT = 1e-8;
/** Agreement that no other try need improve. */
const GOOD = 1e-11;
/** How far near-double poles are set apart: first not at all, since most near poles lie on near zeros and do no harm. */
const APART = [0, 1e-5];
/** A pole with less damping than this share of its frequency never comes to rest for all that the numbers tell. */
const LEAST_DAMPING = 1e-9;

/**
 * The pole form of a rail. The rail is a linear network of lumped elements with one node (and the die behind the package), so Z(s)
 * is a fraction of polynomials: from its poles and residues every response in time follows exactly at any instant, where
 * stepping through a companion model would need steps far below the fastest time constant and still be off by their size.
 * Poles by Ehrlich and Aberth (zeros.ts), residues A/B′ (residues.ts); the result is compared with `railImpedance`.
 * Throws EngineError: `source` when nothing passes direct current, `network` when the rail has no losses or the poles
 * cannot be found to 1e-8, and what stand-in.ts refuses.
 */
export function poleForm(given: CompiledRail): PoleForm {
  const { rail, approximated } = lumpedRail(given);
  const ladder = ladderOf(rail);
  const dc_ohm = directResistance(ladder);
  if (!Number.isFinite(dc_ohm))
    throw new EngineError('source', 'the source is open: after a load step the voltage never settles');
  const logB = logCoefficients(ladder).b;
  let best: PoleForm | null = null;
  let least = AGREEMENT;
  const found = findZeros(ladder, logB);
  for (const apart of APART) {
    const zeros = found && settleZeros(ladder, logB[logB.length - 1], found, apart);
    if (!zeros) continue;
    const form = { ...endAtInfinity(ladder), dc_ohm, ...partialFractions(ladder, logB, zeros), approximated };
    if (!hasLosses(form))
      throw new EngineError(
        'network',
        'the rail has next to no losses and would ring without end: give it resistance',
      );
    const error = disagreement(form, rail);
    if (error <= least) {
      least = error;
      best = form;
    }
    if (least <= GOOD) break;
  }
  if (best) return best;
  throw new EngineError(
    'network',
    'the rail’s natural frequencies could not be found exactly enough for a response in time',
  );
}

const hasLosses = ({ poleRe, poleIm }: PoleForm): boolean =>
  poleRe.every((re, i) => re < -LEAST_DAMPING * Math.hypot(re, poleIm[i]));

function partialFractions(
  ladder: Ladder,
  logB: readonly number[],
  zeros: ComplexList,
): Pick<PoleForm, 'poleRe' | 'poleIm' | 'residueRe' | 'residueIm'> {
  const places = Array.from(zeros.re.keys())
    .filter((i) => zeros.im[i] >= 0)
    .sort((i, j) => Math.hypot(zeros.re[i], zeros.im[i]) - Math.hypot(zeros.re[j], zeros.im[j]));
  const residue = new Float64Array(2);
  const rows = places.map((i) => {
    overProduct(ladder, logB[logB.length - 1], zeros, i, 'A', residue);
    return [zeros.re[i], zeros.im[i], residue[0], zeros.im[i] === 0 ? 0 : residue[1]];
  });
  const column = (k: number) => Float64Array.from(rows, (row) => row[k]);
  return { poleRe: column(0), poleIm: column(1), residueRe: column(2), residueIm: column(3) };
}
