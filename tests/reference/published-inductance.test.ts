import { readFileSync } from 'node:fs';
import { EPS0_F_PER_M } from '@shared/engine/constants';
import * as copper from '@shared/engine/inductance/copper';
import * as microstrip from '@shared/engine/inductance/microstrip';
import * as plane from '@shared/engine/inductance/plane-spreading';
import { coaxVia_H, signalVia_H } from '@shared/engine/inductance/signal-via';
import { singleVia_H, viaPair_H, viaPairLog_H } from '@shared/engine/inductance/via';
import { circularLoop_H, INTERNAL_H_PER_M, rectangularLoop_H } from '@shared/engine/inductance/wire-loop';
import { cavityResonances } from '@shared/engine/plane';
import { compileRail, impedanceMagnitude } from '@shared/engine/rail';
import { kneeFrequency } from '@shared/engine/target';
import { describe, expect, it } from 'vitest';

/** Published inductances, plane and copper figures; each names its source and whether it was read, computed or remembered. */
interface Check {
  id: string;
  topic: string;
  inputs: Record<string, number>;
  expected: number;
  tolerance_rel: number;
  source: string;
  mark: string;
  rule_mark?: string;
}
const checks: Check[] = JSON.parse(
  readFileSync(new URL('../fixtures/published-checks.json', import.meta.url), 'utf8'),
);
const mine = checks.filter(({ topic }) => topic === '4 inductance' || topic === '5 planes');
const seen = new Set<string>();
const INCH = 0.0254;
const MIL = 1e-3 * INCH;
const MM = 1e-3;

/** Checks every entry whose id fits at its own tolerance; there must be `count` of them. */
function compare(ids: RegExp, count: number, compute: (inputs: Check['inputs']) => number): void {
  const found = mine.filter(({ id }) => ids.test(id));
  if (found.length !== count) throw new Error(`${ids} finds ${found.length} published checks, not ${count}`);
  for (const { id, mark, rule_mark, source, inputs, expected, tolerance_rel } of found) {
    seen.add(id);
    const rule = rule_mark === 'MEMORY' && mark !== 'MEMORY' ? ', rule from MEMORY' : '';
    it(`${id} (${mark}${rule}: ${source.slice(0, 90)})`, () => {
      const error = Math.abs(compute(inputs) / expected - 1);
      expect(error).toBeLessThanOrEqual(tolerance_rel * (1 + 1e-6) + 1e-15);
    });
  }
}

/** |Z| of an inductance alone, through the engine. */
const reactance_ohm = (inductance_H: number, frequency_Hz: number): number =>
  impedanceMagnitude(
    compileRail({ source: { kind: 'rl', resistance_ohm: 0, inductance_H }, lines: [], observe: 'pins' }),
    frequency_Hz,
  );

describe('vias', () => {
  compare(/^via-(hsdd|50-10)$/, 2, (c) => 1e9 * singleVia_H(c.h_in * INCH, c.d_in * INCH));
  compare(/^via-1p6mm$/, 1, (c) => 1e9 * singleVia_H(c.h_mm * MM, c.d_mm * MM));
  // π·L/t_r is the reactance at 0.5/t_r.
  compare(/^via-(hsdd|50-10)-X$/, 2, (c) => reactance_ohm(c.L_nH * 1e-9, kneeFrequency(c.tr_ns * 1e-9, 0.5)));
  compare(/^via-1p6mm-1GHz$/, 1, (c) => reactance_ohm(c.L_nH * 1e-9, c.f_GHz * 1e9));
  // At 4h = d the logarithm is zero and what is left of the formula is its constant.
  compare(/^via-const$/, 1, () => 1e9 * singleVia_H(INCH, 4 * INCH));
  compare(/^via2-acosh$/, 1, (c) => 1e9 * viaPair_H(c.h_mm * MM, c.s_mm * MM, c.d_mm * MM));
  compare(/^via2-log$/, 1, (c) => 1e9 * viaPairLog_H(c.h_mm * MM, c.s_mm * MM, c.d_mm * MM));
  compare(/^via2-wide-agree$/, 1, (c) => viaPairLog_H(1, c.s_over_d, 1) / viaPair_H(1, c.s_over_d, 1));
  compare(/^via-coax$/, 1, (c) => 1e9 * coaxVia_H(c.h_in * INCH, c.S_in * INCH, c.D_in * INCH));
  compare(
    /^via-[24]ret$/,
    2,
    (c) => 1e9 * signalVia_H(c.h_in * INCH, c.S_in * INCH, c.D_in * INCH, c.returns),
  );
});

describe('plane pair and spreading', () => {
  compare(/^pp-(1mil|32)$/, 2, (c) => 1e12 * plane.planeInductance_HPerSquare(c.h_mil * MIL));
  compare(/^pp-4mil$/, 1, (c) => 1e12 * plane.planeStrip_H(c.h_mil * MIL, c.length_mm * MM, c.width_mm * MM));
  compare(/^spread-100um$/, 1, (c) => 1e12 * plane.spreading_H(c.h_mm * MM, c.r1_mm * MM, c.r2_mm * MM));
  compare(/^spread-const$/, 1, (c) => 1e12 * plane.spreading_H(c.h_mil * MIL, 1, Math.E));
  compare(
    /^spread-two$/,
    1,
    (c) => 1e12 * plane.spreadingBetween_H(c.h_mm * MM, c.s_mm * MM, c.r_mm * MM, c.r_mm * MM),
  );
  compare(/^pl-eps$/, 1, () => 1e12 * EPS0_F_PER_M * INCH);
  // A rectangular cavity's modes are the two sides' first ones, m and n times, at right angles.
  compare(/^res-cvel-/, 10, ({ a_mm, b_mm, epsr, m, n }) => {
    const [a, b] = cavityResonances(a_mm * MM, b_mm * MM, epsr);
    return 1e-6 * Math.hypot(m * a, n * b);
  });
});

describe('wire loops', () => {
  compare(
    /^rect-(1m|100x50mm|3x1mm|1in)$/,
    4,
    (c) => 1e9 * rectangularLoop_H(c.a_mm * MM, c.b_mm * MM, c.wire_radius_mm * MM),
  );
  compare(
    /^rect-square-short$/,
    1,
    (c) => 1e9 * rectangularLoop_H(c.side_mm * MM, c.side_mm * MM, c.wire_radius_mm * MM),
  );
  compare(
    /^rect-square-dc$/,
    1,
    (c) => 1e9 * rectangularLoop_H(c.side_cm * 1e-2, c.side_cm * 1e-2, c.wire_radius_cm * 1e-2, 'uniform'),
  );
  compare(/^rect-internal$/, 1, () => 1e9 * INTERNAL_H_PER_M);
  compare(/^circ-loop$/, 1, (c) => 1e9 * circularLoop_H(c.loop_radius_mm * MM, c.wire_radius_mm * MM));
});

describe('trace over a plane', () => {
  compare(/^ms-5ln$/, 1, (c) => 1e9 * INCH * microstrip.microstripQuick_HPerM(c.w_mil * MIL, c.h_mil * MIL));
  compare(/^ms-hj-/, 4, (c) => 1e9 * MM * microstrip.microstrip_HPerM(c.w_over_h, 1));
  compare(
    /^ms-ipc$/,
    1,
    (c) => 1e9 * INCH * microstrip.microstripIpc_HPerM(c.w_mil * MIL, c.h_mil * MIL, c.t_mil * MIL),
  );
});

describe('copper', () => {
  compare(/^skin-664$/, 1, (c) => 1e6 * copper.skinDepth_m(c.f_Hz));
  compare(/^skin-1e/, 4, (c) => 1e6 * copper.skinDepth_m(c.f_Hz, c.rho_ohm_m));
  compare(/^rho-iacs$/, 1, (c) => copper.copperResistivity_ohmM(c.T_degC));
  const ratio = (from_C: number, to_C: number) =>
    copper.copperResistivity_ohmM(to_C) / copper.copperResistivity_ohmM(from_C);
  compare(/^alpha-cu$/, 1, (c) => ratio(c.T_degC, c.T_degC + 1) - 1);
  compare(/^rho-(90|85)$/, 2, (c) => ratio(c.from_degC, c.to_degC));
  compare(/^foil-.*-um$/, 3, (c) => 1e6 * copper.foilThickness_m(c.foil_oz_per_ft2));
  compare(
    /^foil-.*-sheet$/,
    3,
    (c) => 1e3 * copper.sheetResistance_ohm(copper.foilThickness_m(c.foil_oz_per_ft2)),
  );
  compare(/^foil-35um$/, 1, (c) => 1e3 * copper.sheetResistance_ohm(c.t_um * 1e-6, c.rho_ohm_m));
  compare(/^foil-1000sq$/, 1, (c) =>
    copper.stripResistance_ohm(c.sheet_mohm_per_sq * 1e-3, c.length_mil * MIL, c.width_mil * MIL),
  );
  compare(/^rs-100MHz$/, 1, (c) => 1e3 * copper.surfaceResistance_ohm(c.f_MHz * 1e6, c.rho_ohm_m));
});

/** Plane capacitances, and a resonance of a square board, which `published-checks.test.ts` holds against the plane pair itself. */
const ELSEWHERE = ['pl-225', 'pl-4mil-fr4', 'pl-100mm', 'res-12in'];

it('leaves no published check of these topics out', () => {
  expect(mine.map(({ id }) => id).filter((id) => !seen.has(id))).toEqual(ELSEWHERE);
});
