import { readFileSync } from 'node:fs';
import type { RailNetwork } from '@shared/engine/network';
import { compileRail, impedanceMagnitude } from '@shared/engine/rail';
import { edgeResponse } from '@shared/engine/time/edge-response';
import { poleForm } from '@shared/engine/time/pole-form';
import { responseAt } from '@shared/engine/time/response';
import { dischargeTime, hotPlugCurrent, startUp, voltageLeft } from '@shared/engine/time/start-up';
import { worstPattern } from '@shared/engine/time/worst-pattern';
import { describe, expect, it } from 'vitest';

/** Published and computed values in time; each names its source and whether it was read, computed or remembered. */
interface Check {
  id: string;
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
const mine = checks.filter(({ id }) => /^(step|worst|square|inr|en|dis)-|^three-branch-(tv|max)/.test(id));
const seen = new Set<string>();

/** Checks every entry whose id fits at its own tolerance; there must be `count` of them. */
function compare(ids: RegExp, count: number, compute: (inputs: Check['inputs'], id: string) => number): void {
  const found = mine.filter(({ id }) => ids.test(id));
  if (found.length !== count) throw new Error(`${ids} finds ${found.length} published checks, not ${count}`);
  for (const { id, mark, rule_mark, source, inputs, expected, tolerance_rel } of found) {
    seen.add(id);
    const rule = rule_mark === 'MEMORY' && mark !== 'MEMORY' ? ', rule from MEMORY' : '';
    it(`${id} (${mark}${rule}: ${source.slice(0, 90)})`, () => {
      const error = Math.abs(compute(inputs, id) / expected - 1);
      expect(error).toBeLessThanOrEqual(tolerance_rel * (1 + 1e-6) + 1e-15);
    });
  }
}

/** R1 and L in parallel with R2 and C. */
const pair = (R1_mohm: number, L_nH: number, R2_mohm: number, C_uF: number): RailNetwork => ({
  source: { kind: 'rl', resistance_ohm: R1_mohm * 1e-3, inductance_H: L_nH * 1e-9 },
  lines: [{ id: 'c', count: 1, esr_ohm: R2_mohm * 1e-3, capacitance_F: C_uF * 1e-6, inductance_H: 0 }],
  observe: 'pins',
});
const pairOf = (c: Check['inputs']) => poleForm(compileRail(pair(c.R1_mohm, c.L_nH, c.R2_mohm, c.C_uF)));
/** Times in s and heights in ohm of the turns of the response to a jump of 1 A; its own jump at 0 is no turn here. */
const turnsOf = (c: Check['inputs']) => edgeResponse(pairOf(c), 0).turns.slice(1);
const caseA = pair(2, 10, 2, 100);

describe('step response of R–L against R–C', () => {
  compare(/^step-[ABC]-alpha$/, 3, (c) => -pairOf(c).poleRe[0]);
  compare(/^step-[ABC]-wd$/, 3, (c) => pairOf(c).poleIm[0]);
  const jump = [
    [0, 0],
    [0, 1],
  ] as const;
  compare(/^step-[ABC]-v0$/, 3, (c) => -1e3 * responseAt(pairOf(c), jump, Float64Array.of(0))[0]);
  compare(/^step-[ABC]-t\d$/, 12, (c, id) => 1e6 * turnsOf(c)[Number(id.at(-1))][0]);
  compare(/^step-[ABC]-x\d$/, 12, (c, id) => 1e3 * turnsOf(c)[Number(id.at(-1))][1]);
  compare(/^step-[ABC]-tv$/, 3, (c) => 1e3 * edgeResponse(pairOf(c), 0).variation_ohm);
  compare(/^step-flat$/, 1, (c) => -1e3 * responseAt(pairOf(c), jump, Float64Array.of(c.t_us * 1e-6))[0]);
});

describe('worst pattern of R–L against R–C', () => {
  const worst = (c: Check['inputs']) => worstPattern(pairOf(c), { step_A: 1, rise_s: 0 });
  compare(/^worst-[ABC]-max$/, 3, (c) => 1e3 * worst(c).fall.bound_V);
  compare(/^worst-[ABC]-min$/, 3, (c) => -1e3 * worst(c).rise.bound_V);
  compare(/^worst-[ABC]-alt$/, 3, (c) =>
    turnsOf(c)
      .slice(0, 41)
      .reduce((sum, [, ohm], i) => sum + (i % 2 === 0 ? 1e3 : -1e3) * ohm, 0),
  );
  compare(/^worst-A-geom$/, 1, (c) => {
    const [[, x0], [, x1]] = edgeResponse(poleForm(compileRail(caseA)), 0).turns.slice(1);
    const first = 1e3 * x0 - c.R_mohm;
    return c.R_mohm + first / (1 - (c.R_mohm - 1e3 * x1) / first);
  });
});

describe('square wave at the peak of |Z|', () => {
  compare(/^square-A-pp$/, 1, (c) => {
    const period_s = 1e-3 / c.f_kHz;
    const current = Array.from({ length: 80 }, (_, i) => [
      [0.5 * period_s * i, i % 2],
      [0.5 * period_s * i, 1 - (i % 2)],
    ]).flat() as [number, number][];
    const last = Float64Array.from({ length: 4000 }, (_, i) => period_s * (38 + i / 4000));
    const voltage = responseAt(poleForm(compileRail(caseA)), current, last);
    return 1e3 * (Math.max(...voltage) - Math.min(...voltage));
  });
  compare(/^square-A-fund$/, 1, () => {
    const peak_ohm = impedanceMagnitude(compileRail(caseA), 1e6 / (2 * Math.PI));
    return (1e3 * 4 * peak_ohm) / Math.PI;
  });
});

describe('four branches', () => {
  const form = poleForm(
    compileRail({
      source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 20e-9 },
      lines: [
        { id: 'bulk', count: 1, esr_ohm: 6e-3, capacitance_F: 470e-6, inductance_H: 3e-9 },
        { id: 'ceramic', count: 1, esr_ohm: 1e-3, capacitance_F: 22e-6, inductance_H: 0.4e-9 },
        { id: 'small', count: 1, esr_ohm: 5e-3, capacitance_F: 200e-9, inductance_H: 0 },
      ],
      observe: 'pins',
    }),
  );
  compare(/^three-branch-tv$/, 1, () => 1e3 * edgeResponse(form, 0).variation_ohm);
  compare(/^three-branch-max$/, 1, () => 1e3 * worstPattern(form, { step_A: 1, rise_s: 0 }).fall.bound_V);
});

describe('start-up and stored energy', () => {
  const ramp = (C_uF: number, voltage_V: number, soft_start_s: number) =>
    startUp({ capacitance_F: C_uF * 1e-6, voltage_V, soft_start_s });
  compare(/^inr-(528|957)$/, 2, (c) => 1e3 * ramp(c.C_uF, c.dV_V, c.dt_us * 1e-6).current_A);
  compare(/^inr-dt$/, 1, (c) => {
    const limit = {
      capacitance_F: c.C_uF * 1e-6,
      voltage_V: c.dV_V,
      soft_start_s: 1,
      current_limit_A: c.I_mA * 1e-3,
    };
    return 1e6 * (startUp(limit).needed_s ?? 0);
  });
  // The capacitance that draws I: current goes in proportion to it.
  compare(/^inr-tps22966$/, 1, (c) => (c.I_mA * 1e-3) / ramp(1, c.V_V, c.rise_us * 1e-6).current_A);
  compare(/^inr-own$/, 1, (c) => ramp(c.C_uF, c.V_V, c.ramp_ms * 1e-3).current_A);
  compare(/^inr-step$/, 1, (c) => hotPlugCurrent(c.V_V, c.R_mohm * 1e-3));
  compare(/^en-(24V|1500|400)$/, 3, (c) => ramp(c.C_uF, c.V_V, 1).energy_J);
  compare(/^en-12$/, 1, (c) => 1e3 * ramp(c.C_uF, c.V_V, 1).energy_J);
  compare(/^dis-t-320$/, 1, (c) => 1e3 * dischargeTime(c.C_uF * 1e-6, c.R_ohm, c.V0_V, c.V_V));
  compare(/^dis-(t-50|48-60)$/, 2, (c) => dischargeTime(c.C_uF * 1e-6, c.R_ohm, c.V0_V, c.V_V));
  compare(/^dis-37$/, 1, () => voltageLeft(1e-6, 1e3, 1, 1e-3));
});

it('leaves out no entry', () => {
  expect(mine.map(({ id }) => id).filter((id) => !seen.has(id))).toEqual([]);
});
