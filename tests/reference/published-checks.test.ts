import { readFileSync } from 'node:fs';
import { lineBranch, selfResonance_Hz } from '@shared/engine/branch';
import { MU0_H_PER_M } from '@shared/engine/constants';
import type { LineModel, RailNetwork } from '@shared/engine/network';
import { findPeaks } from '@shared/engine/peaks';
import { cavityResonances, pathInductance, planeCapacitance } from '@shared/engine/plane';
import { compileRail, impedanceMagnitude } from '@shared/engine/rail';
import { risingTarget, spectrumCorner_Hz, targetAt, targetFromStep } from '@shared/engine/target';
import { describe, expect, it } from 'vitest';

/** Published values and worked examples; each entry of the fixture names its source and whether it was read, computed or remembered. */
interface Check {
  id: string;
  inputs: Record<string, number>;
  expected: number;
  tolerance_rel?: number;
  source: string;
  mark: string;
}
const checks: Check[] = JSON.parse(
  readFileSync(new URL('../fixtures/published-checks.json', import.meta.url), 'utf8'),
);
const byId = new Map(checks.map((check) => [check.id, check]));
const INCH = 0.0254;

function compare(id: string, compute: (inputs: Record<string, number>) => number): void {
  const check = byId.get(id);
  if (!check) throw new Error(`no published check ${id}`);
  it(`${id} (${check.mark}: ${check.source.slice(0, 90)})`, () => {
    const error = Math.abs(compute(check.inputs) / check.expected - 1);
    expect(error).toBeLessThanOrEqual((check.tolerance_rel ?? 0) * (1 + 1e-6) + 1e-15);
  });
}

const capacitors = (...lines: Omit<LineModel, 'id' | 'count'>[]): RailNetwork => ({
  source: { kind: 'open' },
  lines: lines.map((line, i) => ({ id: String(i), count: 1, ...line })),
  observe: 'pins',
});

describe('target impedance', () => {
  // The printed column of 1999 rounds: 1993 and 1996 follow V²·ripple/P, which is V·ripple/(P/V).
  for (const year of [1990, 1993, 1996, 1999, 2002])
    compare(`zt-1999-${year}`, (c) => 1e3 * targetFromStep(c.V_V, 100 * c.ripple_fraction, c.P_W / c.V_V));
  compare('zt-ug863', (c) => 1e3 * targetFromStep(c.V_V, c.ac_ripple_pct, c.step_A));
  compare('zt-lesson', (c) => 1e3 * targetFromStep(c.V_V, c.ripple_pct, c.step_A));
  compare('zt-cpu', (c) => 1e3 * targetFromStep(c.dV_mV * 1e-3, 100, c.dI_A));
  compare('zt-ott-a', (c) => 1e3 * targetFromStep(c.dV_mV * 1e-3, 100, c.dI_A));
  compare('zt-ott-fbreak', (c) => 1e-6 * spectrumCorner_Hz(c.tr_ns * 1e-9));
  // So many parts that together they stay under a target that rises from the spectrum's corner: n·Z_t = |Z| of one there.
  for (const id of ['zt-ott-n', 'zt-ott2-n'])
    compare(id, (c) => {
      const target = risingTarget(c.Zt_mohm * 1e-3, spectrumCorner_Hz(c.tr_ns * 1e-9));
      const one = compileRail(capacitors({ esr_ohm: 0, capacitance_F: 1, inductance_H: c.L_each_nH * 1e-9 }));
      const above = 7 * target.frequency_Hz[0];
      return impedanceMagnitude(one, above) / targetAt(target, above);
    });
  for (const id of ['zt-ott-C', 'zt-ott2-C'])
    compare(id, (c) => {
      const bank = { esr_ohm: 0, capacitance_F: 1e-9, inductance_H: 0 };
      const z1 = impedanceMagnitude(compileRail(capacitors(bank)), c.f_MHz * 1e6);
      return (z1 / (c.n * c.Zt_mohm * 1e-3)) * (id === 'zt-ott-C' ? 1e3 : 1);
    });
  compare('zt-cmin', (c) => {
    // The capacitance whose |Z| is the target at f, through the engine: solve |Z(C)| = Z by its 1/C law.
    const z1 = impedanceMagnitude(
      compileRail(capacitors({ esr_ohm: 0, capacitance_F: 1e-6, inductance_H: 0 })),
      c.f_MHz * 1e6,
    );
    return z1 / (c.Z_mohm * 1e-3);
  });
});

describe('plane pair', () => {
  compare('pl-225', (c) => 1e12 * planeCapacitance(INCH, c.area_in2 * INCH, c.h_mil * 1e-3 * INCH, c.epsr));
  compare(
    'pl-4mil-fr4',
    (c) => 1e12 * planeCapacitance(INCH, c.area_in2 * INCH, c.h_mil * 1e-3 * INCH, c.epsr),
  );
  compare('pl-100mm', (c) => 1e12 * planeCapacitance(c.a_mm * 1e-3, c.b_mm * 1e-3, c.h_mm * 1e-3, c.epsr));
  compare('res-cvel-10', (c) => 1e-6 * cavityResonances(c.a_mm * 1e-3, c.b_mm * 1e-3, c.epsr)[0]);
  compare('res-cvel-01', (c) => 1e-6 * cavityResonances(c.a_mm * 1e-3, c.b_mm * 1e-3, c.epsr)[1]);
  compare('res-12in', (c) => 1e-6 * cavityResonances(c.a_in * INCH, c.a_in * INCH, c.epsr)[0]);
  // Two small contacts: (μ₀h/2π)·ln(s²/(r·r)) = (μ₀h/π)·ln(s/r).
  compare(
    'spread-two',
    (c) => 1e12 * pathInductance(c.h_mm * 1e-3, c.s_mm * 1e-3, c.r_mm * 1e-3, c.r_mm * 1e-3),
  );
  compare('spread-const', (c) => (1e12 * MU0_H_PER_M * c.h_mil * 1e-3 * INCH) / (2 * Math.PI));
});

describe('series R–L–C', () => {
  const rlc = (c: Record<string, number>, count = 1): RailNetwork => ({
    source: { kind: 'open' },
    lines: [
      { id: 'c', count, esr_ohm: c.R_mohm * 1e-3, capacitance_F: c.C_nF * 1e-9, inductance_H: c.L_nH * 1e-9 },
    ],
    observe: 'pins',
  });
  const resonance = (c: Record<string, number>) =>
    selfResonance_Hz(
      lineBranch(
        {
          id: 'c',
          count: 1,
          esr_ohm: 0,
          capacitance_F: (c.C_nF ?? c.C_uF * 1e3) * 1e-9,
          inductance_H: c.L_nH * 1e-9,
        },
        'line',
      ),
    ) ?? 0;
  for (const id of ['rlc-srf-100n-1n', 'rlc-srf-exact', 'rlc-srf-10u-1n'])
    compare(id, (c) => resonance(c) * 1e-6);
  for (const id of ['rlc-mag-1e+06', 'rlc-mag-1e+07', 'rlc-mag-1.592e+07', 'rlc-mag-1e+08'])
    compare(id, (c) => impedanceMagnitude(compileRail(rlc(c)), c.f_Hz));
  compare('rlc-10-parallel', (c) => impedanceMagnitude(compileRail(rlc(c, c.n)), c.f_Hz));
});

describe('anti-resonance of two capacitors', () => {
  const pair = (c: Record<string, number>) =>
    compileRail(
      capacitors(
        { esr_ohm: c.R1_mohm * 1e-3, capacitance_F: c.C1_uF * 1e-6, inductance_H: c.L1_nH * 1e-9 },
        { esr_ohm: c.R2_mohm * 1e-3, capacitance_F: c.C2_nF * 1e-9, inductance_H: c.L2_nH * 1e-9 },
      ),
    );
  const peak = (c: Record<string, number>) => {
    const found = findPeaks(pair(c), 1e5, 1e8).filter((one) => one.edge === null);
    expect(found).toHaveLength(1);
    return found[0];
  };
  for (const id of ['ar-mag-1e+05', 'ar-mag-1.592e+06', 'ar-mag-2.055e+07', 'ar-mag-1e+08'])
    compare(id, (c) => impedanceMagnitude(pair(c), c.f_Hz));
  compare('ar-peak-f', (c) => peak(c).frequency_Hz * 1e-6);
  compare('ar-peak-Z', (c) => peak(c).impedance_ohm);
});

describe('R–L against R–C', () => {
  const network = (c: Record<string, number>): RailNetwork => ({
    source: { kind: 'rl', resistance_ohm: c.R1_mohm * 1e-3, inductance_H: c.L_nH * 1e-9 },
    lines: [{ id: 'c', count: 1, esr_ohm: c.R2_mohm * 1e-3, capacitance_F: c.C_uF * 1e-6, inductance_H: 0 }],
    observe: 'pins',
  });
  for (const id of ['flat-1e+04', 'flat-1e+06', 'flat-1e+08'])
    compare(id, (c) => impedanceMagnitude(compileRail(network(c)), c.w_rad_s / (2 * Math.PI)));
  compare('rlrc-peak', (c) => findPeaks(compileRail(network(c)), 1e3, 1e8)[0].impedance_ohm);
});

describe('four branches', () => {
  // The network that the entries call “as three-branch-tv”: four series branches.
  const network: RailNetwork = {
    source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 20e-9 },
    lines: [
      { id: 'bulk', count: 1, esr_ohm: 6e-3, capacitance_F: 470e-6, inductance_H: 3e-9 },
      { id: 'ceramic', count: 1, esr_ohm: 1e-3, capacitance_F: 22e-6, inductance_H: 0.4e-9 },
      { id: 'small', count: 1, esr_ohm: 5e-3, capacitance_F: 200e-9, inductance_H: 0 },
    ],
    observe: 'pins',
  };
  for (const f of ['1e+04', '1e+05', '1e+06', '1e+07', '1e+08'])
    compare(`three-branch-Z-${f}`, (c) => impedanceMagnitude(compileRail(network), c.f_Hz));
});
