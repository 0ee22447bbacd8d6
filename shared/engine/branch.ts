import { EngineError } from './errors';
import { esrAt, type PreparedEsr, prepareEsr } from './esr-table';
import type { LineModel, PackageModel, RailNetwork, SeriesBranch, SourceModel } from './network';
import { type PreparedTable, prepareTable, tableImpedance } from './table';

/**
 * One impedance of the network in a form that is quick to evaluate. `series` covers capacitors, plane and R–L source;
 * the elastance 1/C is kept instead of C, so that "no capacitor" is 0 and nothing divides by infinity.
 */
export type Branch =
  | { kind: 'series'; r: number; l: number; d: number }
  /** As series, with an ESR that goes with frequency. */
  | { kind: 'lossy'; esr: PreparedEsr; l: number; d: number }
  | { kind: 'damped'; r0: number; l0: number; rl: number; l: number; r1: number; l1: number }
  /** rScale·Re Z + j(Im Z + ωl − d/ω) of the table's Z; l and d may be below zero where the part has become better. */
  | { kind: 'table'; table: PreparedTable; rScale: number; l: number; d: number };

const finite = (value: number, field: string, what: string): number => {
  if (!Number.isFinite(value)) throw new EngineError(field, `${what} must be a finite number`);
  if (value < 0) throw new EngineError(field, `${what} must not be negative`);
  return value;
};

/** Series R–L–C as a branch. Throws EngineError naming `field` for NaN, infinities, negatives and C = 0. */
export function seriesBranch(branch: SeriesBranch, field: string): Branch {
  const r = finite(branch.resistance_ohm, `${field}.resistance_ohm`, 'resistance');
  const l = finite(branch.inductance_H, `${field}.inductance_H`, 'inductance');
  const c = branch.capacitance_F;
  if (!(c > 0)) throw new EngineError(`${field}.capacitance_F`, 'capacitance must be above zero');
  return { kind: 'series', r, l, d: 1 / c };
}

/** The source as a branch, or null when it is open. A source of zero impedance is refused. */
export function sourceBranch(source: SourceModel, field = 'source'): Branch | null {
  switch (source.kind) {
    case 'open':
      return null;
    case 'rl': {
      const r = finite(source.resistance_ohm, `${field}.resistance_ohm`, 'resistance');
      const l = finite(source.inductance_H, `${field}.inductance_H`, 'inductance');
      if (r === 0 && l === 0)
        throw new EngineError(
          field,
          'resistance and inductance are both zero: an ideal source holds any target',
        );
      return { kind: 'series', r, l, d: 0 };
    }
    case 'damped': {
      const branch = {
        kind: 'damped' as const,
        r0: finite(source.series_resistance_ohm, `${field}.series_resistance_ohm`, 'resistance'),
        l0: finite(source.series_inductance_H, `${field}.series_inductance_H`, 'inductance'),
        rl: finite(source.inductor_resistance_ohm, `${field}.inductor_resistance_ohm`, 'resistance'),
        l: finite(source.inductance_H, `${field}.inductance_H`, 'inductance'),
        r1: finite(source.damping_ohm, `${field}.damping_ohm`, 'resistance'),
        l1: finite(source.damping_inductance_H, `${field}.damping_inductance_H`, 'inductance'),
      };
      const pairIsZero = (branch.rl === 0 && branch.l === 0) || (branch.r1 === 0 && branch.l1 === 0);
      if (pairIsZero && branch.r0 === 0 && branch.l0 === 0)
        throw new EngineError(field, 'the source has no impedance: give it a resistance or an inductance');
      return branch;
    }
    case 'table':
      return { kind: 'table', table: prepareTable(source.table, `${field}.points`), rScale: 1, l: 0, d: 0 };
  }
}

/** One capacitor of a line (count not applied), with its mount and path inductance. */
export function lineBranch(line: LineModel, field: string): Branch {
  if (line.table) {
    const l = line.added_inductance_H ?? 0;
    const d = line.added_elastance_perF ?? 0;
    if (!Number.isFinite(l) || !Number.isFinite(d))
      throw new EngineError(field, 'what is put in series with the table must be a finite number');
    const rScale = finite(line.resistance_factor ?? 1, `${field}.resistance_factor`, 'the factor');
    return { kind: 'table', table: prepareTable(line.table, `${field}.table`), rScale, l, d };
  }
  const branch = {
    resistance_ohm: line.esr_ohm,
    inductance_H: line.inductance_H,
    capacitance_F: line.capacitance_F,
  };
  finite(line.esr_ohm, `${field}.esr_ohm`, 'ESR');
  if (!Number.isFinite(line.capacitance_F))
    throw new EngineError(`${field}.capacitance_F`, 'capacitance must be a finite number');
  const series = seriesBranch(branch, field);
  if (!line.esr_table || series.kind !== 'series') return series;
  return { kind: 'lossy', esr: prepareEsr(line.esr_table, `${field}.esr_table`), l: series.l, d: series.d };
}

/** Package in series with the die's R–C as one branch hanging on the pins; null when there is nothing behind it. */
export function loadBranch(network: RailNetwork): Branch | null {
  const model = network.package;
  if (!model || checkPackage(model).die_capacitance_F === 0) return null;
  return {
    kind: 'series',
    r: model.resistance_ohm + model.die_resistance_ohm,
    l: model.inductance_H,
    d: 1 / model.die_capacitance_F,
  };
}

/** Refuses a package with a negative or not finite value. */
export function checkPackage(model: PackageModel): PackageModel {
  finite(model.resistance_ohm, 'package.resistance_ohm', 'resistance');
  finite(model.inductance_H, 'package.inductance_H', 'inductance');
  finite(model.die_capacitance_F, 'package.die_capacitance_F', 'capacitance');
  finite(model.die_resistance_ohm, 'package.die_resistance_ohm', 'resistance');
  return model;
}

/** Self-resonance 1/(2π√(LC)) of a series branch in Hz, or null where it has none. */
export function selfResonance_Hz(branch: Branch): number | null {
  if ((branch.kind !== 'series' && branch.kind !== 'lossy') || branch.d === 0 || branch.l === 0) return null;
  return Math.sqrt(branch.d / branch.l) / (2 * Math.PI);
}

/**
 * Admittance of a branch at `frequency_Hz`: `out[0] + j·out[1]` in siemens, and its derivative by ln f in
 * `out[2] + j·out[3]` (dY/du = −Y²·dZ/du). Throws EngineError where the impedance is exactly zero.
 */
export function branchAdmittance(
  branch: Branch,
  frequency_Hz: number,
  out: Float64Array,
  field = 'network',
): void {
  const omega = 2 * Math.PI * frequency_Hz;
  let zr: number;
  let zi: number;
  let dr = 0;
  let di: number;
  if (branch.kind === 'series') {
    const xl = omega * branch.l;
    const xc = branch.d / omega;
    zr = branch.r;
    zi = xl - xc;
    di = xl + xc;
  } else if (branch.kind === 'lossy') {
    esrAt(branch.esr, frequency_Hz, out);
    const xl = omega * branch.l;
    const xc = branch.d / omega;
    zr = out[0];
    zi = xl - xc;
    dr = out[1];
    di = xl + xc;
  } else if (branch.kind === 'damped') {
    const ar = branch.rl;
    const ai = omega * branch.l;
    const br = branch.r1;
    const bi = omega * branch.l1;
    const sr = ar + br;
    const si = ai + bi;
    const s2 = sr * sr + si * si;
    zr = branch.r0;
    zi = omega * branch.l0;
    di = omega * branch.l0;
    if (s2 > 0) {
      // pa = Zb/(Za+Zb), pb = Za/(Za+Zb): Zp = Za·pa, dZp = dZa·pa² + dZb·pb²
      const par = (br * sr + bi * si) / s2;
      const pai = (bi * sr - br * si) / s2;
      const pbr = 1 - par;
      const pbi = -pai;
      zr += ar * par - ai * pai;
      zi += ar * pai + ai * par;
      const pa2r = par * par - pai * pai;
      const pa2i = 2 * par * pai;
      const pb2r = pbr * pbr - pbi * pbi;
      const pb2i = 2 * pbr * pbi;
      dr -= ai * pa2i + bi * pb2i;
      di += ai * pa2r + bi * pb2r;
    }
  } else {
    tableImpedance(branch.table, frequency_Hz, out);
    const xl = omega * branch.l;
    const xc = branch.d / omega;
    zr = branch.rScale * out[0];
    zi = out[1] + xl - xc;
    dr = branch.rScale * out[2];
    di = out[3] + xl + xc;
  }
  const z2 = zr * zr + zi * zi;
  if (!(z2 > 0))
    throw new EngineError(field, 'impedance is exactly zero here: give it a resistance', frequency_Hz);
  const yr = zr / z2;
  const yi = -zi / z2;
  const y2r = yr * yr - yi * yi;
  const y2i = 2 * yr * yi;
  out[0] = yr;
  out[1] = yi;
  out[2] = -(y2r * dr - y2i * di);
  out[3] = -(y2r * di + y2i * dr);
}
