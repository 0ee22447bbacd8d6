import { branchAdmittance } from './branch';
import { type CompiledRail, nodeAdmittance, scratch } from './rail';

/** The two that make |Z| what it is at a frequency, by name: member ids, `package` or `die`. */
export interface Makers {
  inductive: string | null;
  capacitive: string | null;
}

/** A member whose susceptance is below this share of the whole admittance makes nothing: it only happens to be there. */
const MATTERS = 0.1;

/** The package makes a peak only where its reactance is at least this share of what the board shows. */
const BOARD_RULES = 0.7;

/**
 * Who carries the largest inductive and the largest capacitive current: at an anti-resonance the two lines that pass current
 * back and forth, at a rising edge one alone. Looked at from the die, its capacitance stands against package and board.
 */
export function makersAt(rail: CompiledRail, frequency_Hz: number): Makers {
  const y = scratch();
  nodeAdmittance(rail, frequency_Hz, y);
  const node = nodeMakers(rail, frequency_Hz, Math.hypot(y[0], y[1]));
  if (!rail.view) return node;
  const n2 = y[0] * y[0] + y[1] * y[1];
  const package_ohm = 2 * Math.PI * frequency_Hz * rail.view.l;
  const board_ohm = n2 > 0 ? -y[1] / n2 : Number.POSITIVE_INFINITY;
  const re = rail.view.r + (n2 > 0 ? y[0] / n2 : 0);
  const z2 = re * re + (package_ohm + board_ohm) ** 2;
  const throughBoard = -(package_ohm + board_ohm) / z2;
  let die = 0;
  let whole = 1 / Math.sqrt(z2);
  if (rail.view.die) {
    branchAdmittance(rail.view.die, frequency_Hz, y);
    die = y[1];
    whole = Math.hypot(re / z2 + y[0], throughBoard + y[1]);
  }
  const dieMatters = die > MATTERS * whole;
  // Where the board itself resonates its impedance is large and nearly real: then its own lines make the peak, not the package.
  const packageMatters =
    throughBoard < 0 && package_ohm > Math.max(board_ohm, n2 > 0 ? BOARD_RULES / Math.sqrt(n2) : 0);
  return {
    inductive: packageMatters ? 'package' : node.inductive,
    capacitive: dieMatters ? 'die' : packageMatters ? null : node.capacitive,
  };
}

function nodeMakers(rail: CompiledRail, frequency_Hz: number, whole: number): Makers {
  const y = scratch();
  const least = MATTERS * whole;
  const makers: Makers = { inductive: null, capacitive: null };
  let inductive = least;
  let capacitive = least;
  for (const member of rail.members) {
    if (member.count === 0) continue;
    branchAdmittance(member.branch, frequency_Hz, y, member.id);
    const b = member.count * y[1];
    if (-b > inductive) {
      inductive = -b;
      makers.inductive = member.id;
    }
    if (b > capacitive) {
      capacitive = b;
      makers.capacitive = member.id;
    }
  }
  return makers;
}
