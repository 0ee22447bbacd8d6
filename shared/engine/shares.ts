import { branchAdmittance } from './branch';
import { type CompiledRail, scratch } from './rail';

/** Current of each member of the node for 1 A drawn by the load: complex, per frequency. */
export interface MemberShare {
  /** Index into `CompiledRail.members`; −1 for the die's own capacitance when looked at from the die. */
  member: number;
  re: Float64Array;
  im: Float64Array;
  /** |Z| of all of the member's branches together, ohm; Infinity at count 0. */
  impedance_ohm: Float64Array;
}

/** Gives the admittance of one branch of a member at a point of the list, value in `out[0..1]`. */
export type UnitAdmittance = (member: number, point: number, out: Float64Array) => void;

/**
 * Share of the load current by member over frequency (1 = all of it). The complex shares sum to 1; a single magnitude
 * may exceed 1 where two members pass current back and forth (anti-resonance). Looked at from the die, what the die's
 * capacitance carries itself does not reach the board: share = n·Y_k/Y_node · Y_b/(Y_b + Y_die), Y_b = 1/(Z_package + 1/Y_node).
 */
export function memberShares(
  rail: CompiledRail,
  frequency_Hz: ArrayLike<number>,
  unit: UnitAdmittance = (member, point, out) =>
    branchAdmittance(rail.members[member].branch, frequency_Hz[point], out),
): MemberShare[] {
  const n = frequency_Hz.length;
  const shares = rail.members.map((_, member) => blank(member, n));
  const die = rail.view?.die ? blank(-1, n) : null;
  const one = scratch();
  for (let i = 0; i < n; i++) {
    const f = frequency_Hz[i];
    let nodeRe = 0;
    let nodeIm = 0;
    rail.members.forEach((member, k) => {
      if (member.count === 0) {
        shares[k].impedance_ohm[i] = Number.POSITIVE_INFINITY;
        return;
      }
      unit(k, i, one);
      // Kept here until the node's sum is known.
      shares[k].re[i] = member.count * one[0];
      shares[k].im[i] = member.count * one[1];
      nodeRe += shares[k].re[i];
      nodeIm += shares[k].im[i];
    });
    const node2 = nodeRe * nodeRe + nodeIm * nodeIm;
    if (node2 === 0) {
      if (die) die.re[i] = 1;
      continue;
    }
    // k = (share of the board) / Y_node, so that a member's share is n·Y_k·k
    let kRe = nodeRe / node2;
    let kIm = -nodeIm / node2;
    if (rail.view && die && rail.view.die) {
      const zRe = rail.view.r + kRe;
      const zIm = 2 * Math.PI * f * rail.view.l + kIm;
      branchAdmittance(rail.view.die, f, one);
      // board share = 1/(1 + Y_die·(Z_package + 1/Y_node))
      const dRe = 1 + one[0] * zRe - one[1] * zIm;
      const dIm = one[0] * zIm + one[1] * zRe;
      const d2 = dRe * dRe + dIm * dIm;
      const bRe = dRe / d2;
      const bIm = -dIm / d2;
      die.re[i] = 1 - bRe;
      die.im[i] = -bIm;
      const re = kRe * bRe - kIm * bIm;
      kIm = kRe * bIm + kIm * bRe;
      kRe = re;
    }
    for (const { re, im, impedance_ohm } of shares) {
      if (impedance_ohm[i] === Number.POSITIVE_INFINITY) continue;
      const yRe = re[i];
      const yIm = im[i];
      impedance_ohm[i] = 1 / Math.sqrt(yRe * yRe + yIm * yIm);
      re[i] = yRe * kRe - yIm * kIm;
      im[i] = yRe * kIm + yIm * kRe;
    }
  }
  return die ? [...shares, die] : shares;
}

const blank = (member: number, n: number): MemberShare => ({
  member,
  re: new Float64Array(n),
  im: new Float64Array(n),
  impedance_ohm: new Float64Array(n),
});
