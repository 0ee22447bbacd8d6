import type { Branch } from '../branch';
import { EngineError } from '../errors';
import { esrAt } from '../esr-table';
import type { CompiledRail, NodeMember } from '../rail';
import type { PreparedTable } from '../table';

/** A rail of series R–L–C and damped branches only, and who of its members is not quite what was given. */
export interface LumpedRail {
  rail: CompiledRail;
  /** Identifiers of the members that a fixed R–L–C stands in for. */
  approximated: string[];
}

/**
 * The rail with fixed elements only, since a table over frequency has no poles. An ESR over frequency is taken at the
 * part's self-resonance (without one, in the middle of its table); a measured Z(f) as its fitted series R–L–C with what is
 * put in series with it; a source's table as R–L, for a source passes direct current. Members of count 0 are left out.
 * Throws EngineError for a part whose table shows no capacitance, and for a source whose table shows nothing but capacitance.
 */
export function lumpedRail(rail: CompiledRail): LumpedRail {
  const approximated: string[] = [];
  const members = rail.members
    .filter((member) => member.count > 0)
    .map((member) => {
      const branch = standIn(member);
      if (branch !== member.branch) approximated.push(member.id);
      return { ...member, branch };
    });
  return { rail: { members, view: rail.view }, approximated };
}

function standIn({ branch, role, line }: NodeMember): Branch {
  if (branch.kind === 'lossy') {
    const { u } = branch.esr;
    const resonance_Hz = Math.sqrt(branch.d / branch.l) / (2 * Math.PI);
    const hasResonance = branch.d > 0 && branch.l > 0;
    const esr = new Float64Array(2);
    esrAt(branch.esr, hasResonance ? resonance_Hz : Math.exp(0.5 * (u[0] + u[u.length - 1])), esr);
    return { kind: 'series', r: esr[0], l: branch.l, d: branch.d };
  }
  if (branch.kind !== 'table') return branch;
  const { fit } = branch.table;
  if (role === 'source') return sourceFit(branch.table);
  const d = fit.elastance_perF + branch.d;
  if (!(fit.elastance_perF > 0) || !(d > 0))
    throw new EngineError(
      `lines[${line}].table`,
      'the table shows no capacitance: a response in time needs points below the self-resonance',
    );
  return {
    kind: 'series',
    r: branch.rScale * fit.resistance_ohm,
    l: Math.max(0, fit.inductance_H + branch.l),
    d,
  };
}

/** R and L of a source's table by the same weighted least squares as `fitSeries` (weights 1/|Z|²), with no capacitance allowed. */
function sourceFit({ u, logMagnitude, phase, fit }: PreparedTable): Branch {
  let above = 0;
  let below = 0;
  for (let i = 0; i < u.length; i++) {
    const perOhm = (2 * Math.PI * Math.exp(u[i])) / Math.exp(logMagnitude[i]);
    above += perOhm * Math.sin(phase[i]);
    below += perOhm * perOhm;
  }
  const l = Math.max(0, above / below);
  if (l === 0 && fit.resistance_ohm === 0)
    throw new EngineError('source.points', 'the table shows neither resistance nor inductance');
  return { kind: 'series', r: fit.resistance_ohm, l, d: 0 };
}
