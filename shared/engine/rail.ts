import {
  type Branch,
  branchAdmittance,
  checkPackage,
  lineBranch,
  loadBranch,
  seriesBranch,
  sourceBranch,
} from './branch';
import { EngineError } from './errors';
import type { RailNetwork } from './network';

/** One thing that hangs on the node: `count` equal branches. `line` is the bank line's index, −1 for the others. */
export interface NodeMember {
  role: 'source' | 'plane' | 'line' | 'load';
  id: string;
  line: number;
  count: number;
  branch: Branch;
}

/** A network checked and made ready for evaluation. */
export interface CompiledRail {
  members: NodeMember[];
  /** Series package and die, when the impedance is looked at from the die. */
  view: { r: number; l: number; die: Branch | null } | null;
}

/** Checks a network and prepares it; throws EngineError naming the field that is wrong. */
export function compileRail(network: RailNetwork): CompiledRail {
  const members: NodeMember[] = [];
  const source = sourceBranch(network.source);
  if (source) members.push({ role: 'source', id: 'source', line: -1, count: 1, branch: source });
  if (network.plane)
    members.push({
      role: 'plane',
      id: 'plane',
      line: -1,
      count: 1,
      branch: seriesBranch(network.plane, 'plane'),
    });
  network.lines.forEach((line, index) => {
    if (!Number.isInteger(line.count) || line.count < 0)
      throw new EngineError(`lines[${index}].count`, 'count must be a whole number, zero or more');
    members.push({
      role: 'line',
      id: line.id,
      line: index,
      count: line.count,
      branch: lineBranch(line, `lines[${index}]`),
    });
  });
  let view: CompiledRail['view'] = null;
  if (network.observe === 'die') {
    if (!network.package) throw new EngineError('observe', 'to look from the die the rail needs a package');
    const model = checkPackage(network.package);
    const die: Branch | null =
      model.die_capacitance_F > 0
        ? { kind: 'series', r: model.die_resistance_ohm, l: 0, d: 1 / model.die_capacitance_F }
        : null;
    view = { r: model.resistance_ohm, l: model.inductance_H, die };
  } else {
    const load = loadBranch(network);
    if (load) members.push({ role: 'load', id: 'package and die', line: -1, count: 1, branch: load });
  }
  if (!members.some((member) => member.count > 0) && !view?.die)
    throw new EngineError('bank', 'nothing feeds this rail: the source is open and the bank is empty');
  return { members, view };
}

/** Where `nodeAdmittance` and `railImpedance` put their answer; one per caller, so that loops allocate nothing. */
export const scratch = (): Float64Array => new Float64Array(4);

/** For one branch at a time; shared by all calls, since nothing here waits between writing and reading it. */
const one = new Float64Array(4);

/** Sum of all members at the node: Y in `out[0..1]` (siemens), dY/d(ln f) in `out[2..3]`. */
export function nodeAdmittance(rail: CompiledRail, frequency_Hz: number, out: Float64Array): void {
  let re = 0;
  let im = 0;
  let dre = 0;
  let dim = 0;
  for (const member of rail.members) {
    if (member.count === 0) continue;
    branchAdmittance(member.branch, frequency_Hz, one, member.id);
    re += member.count * one[0];
    im += member.count * one[1];
    dre += member.count * one[2];
    dim += member.count * one[3];
  }
  out[0] = re;
  out[1] = im;
  out[2] = dre;
  out[3] = dim;
}

/**
 * The impedance that the load sees: Z in `out[0..1]` (ohm), dZ/d(ln f) in `out[2..3]`.
 * At the die: Z = 1/(Y_die + 1/(R + jωL + 1/Y_node)).
 */
export function railImpedance(rail: CompiledRail, frequency_Hz: number, out: Float64Array): void {
  if (!(frequency_Hz > 0) || !Number.isFinite(frequency_Hz))
    throw new EngineError('frequency_Hz', 'frequency must be above 0 Hz and finite', frequency_Hz);
  nodeAdmittance(rail, frequency_Hz, out);
  seenImpedance(rail, frequency_Hz, out);
}

/** Turns the node's admittance in `out` (value and derivative) into the impedance that the load sees, in place. */
export function seenImpedance(rail: CompiledRail, frequency_Hz: number, out: Float64Array): void {
  const view = rail.view;
  const nothing = out[0] === 0 && out[1] === 0;
  if (nothing && !view?.die)
    throw new EngineError('bank', 'nothing feeds this rail at this frequency', frequency_Hz);
  if (!view) {
    invert(out);
    return;
  }
  const omega = 2 * Math.PI * frequency_Hz;
  if (nothing) {
    out.fill(0, 0, 4);
  } else {
    invert(out);
    out[0] += view.r;
    out[1] += omega * view.l;
    out[3] += omega * view.l;
    if (!view.die) return;
    invert(out);
  }
  branchAdmittance(view.die as Branch, frequency_Hz, one, 'package');
  for (let i = 0; i < 4; i++) out[i] += one[i];
  invert(out);
}

/** w = 1/v in place, with the derivative dw = −w²·dv. */
function invert(out: Float64Array): void {
  const [re, im, dre, dim] = out;
  const m = re * re + im * im;
  if (!(m > 0)) throw new EngineError('network', 'impedance is exactly zero at a frequency');
  const wr = re / m;
  const wi = -im / m;
  const w2r = wr * wr - wi * wi;
  const w2i = 2 * wr * wi;
  out[0] = wr;
  out[1] = wi;
  out[2] = -(w2r * dre - w2i * dim);
  out[3] = -(w2r * dim + w2i * dre);
}

/** |Z| in ohm at one frequency. */
export function impedanceMagnitude(rail: CompiledRail, frequency_Hz: number, out = scratch()): number {
  railImpedance(rail, frequency_Hz, out);
  return Math.hypot(out[0], out[1]);
}
