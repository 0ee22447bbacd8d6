import { describe, expect, it } from 'vitest';
import type { RailNetwork } from '../network';
import { compileRail } from '../rail';
import { lumpedRail } from './stand-in';

const frequency_Hz = Float64Array.from({ length: 41 }, (_, i) => 1e4 * 10 ** (i / 8));
/** Z(f) of a series R–L–C as a table. */
const tableOf = (r: number, l: number, d: number) => ({
  frequency_Hz,
  re_ohm: frequency_Hz.map(() => r),
  im_ohm: frequency_Hz.map((f) => 2 * Math.PI * f * l - d / (2 * Math.PI * f)),
});
const base = { id: 'c', count: 1, esr_ohm: 0, capacitance_F: 1e-6, inductance_H: 1e-9 };
const rl = { kind: 'rl' as const, resistance_ohm: 1e-3, inductance_H: 1e-8 };
const network = (change: Partial<RailNetwork>): RailNetwork => ({
  source: rl,
  lines: [base],
  observe: 'pins',
  ...change,
});
const branchOf = (given: RailNetwork, id: string) => {
  const { rail, approximated } = lumpedRail(compileRail(given));
  const branch = rail.members.find((member) => member.id === id)?.branch;
  if (branch?.kind !== 'series') throw new Error('not a series branch');
  return { ...branch, approximated };
};

describe('fixed elements in place of tables', () => {
  it('leaves a rail of fixed elements as it is', () => {
    expect(lumpedRail(compileRail(network({}))).approximated).toEqual([]);
  });

  it('takes an ESR over frequency at the self-resonance', () => {
    const esr_table = {
      frequency_Hz: Float64Array.of(1e3, 1e9),
      resistance_ohm: Float64Array.of(1e-3, 1),
    };
    const resonance_Hz = 1 / (2 * Math.PI * Math.sqrt(1e-15));
    const { r, approximated } = branchOf(network({ lines: [{ ...base, esr_table }] }), 'c');
    expect(r).toBeCloseTo(1e-3 * (resonance_Hz / 1e3) ** 0.5, 9);
    expect(approximated).toEqual(['c']);
    const noInductance = branchOf(network({ lines: [{ ...base, inductance_H: 0, esr_table }] }), 'c');
    expect(noInductance.r).toBeCloseTo(Math.sqrt(1e-3), 9);
  });

  it('takes a measured impedance as its fit and what is in series with it', () => {
    const lines = [
      {
        ...base,
        table: tableOf(0.01, 2e-9, 1e6),
        added_inductance_H: 1e-9,
        added_elastance_perF: 5e5,
        resistance_factor: 2,
      },
    ];
    const { r, l, d } = branchOf(network({ lines }), 'c');
    expect([r / 0.02, l / 3e-9, d / 1.5e6]).toEqual([1, 1, 1].map((one) => expect.closeTo(one, 9)));
  });

  it('takes a source’s table as R–L, whatever capacitance it seems to have', () => {
    const given = network({ source: { kind: 'table', table: tableOf(2e-3, 3e-8, 0) } });
    const { r, l, d, approximated } = branchOf(given, 'source');
    expect([r / 2e-3, l / 3e-8, d]).toEqual([expect.closeTo(1, 9), expect.closeTo(1, 9), 0]);
    expect(approximated).toEqual(['source']);
    expect(branchOf(network({ source: { kind: 'table', table: tableOf(2e-3, 3e-8, 10) } }), 'source').d).toBe(
      0,
    );
  });

  it('refuses a part without capacitance and a source with nothing else', () => {
    const lines = [base, { ...base, id: 'd', table: tableOf(0.01, 2e-9, 0) }];
    expect(() => lumpedRail(compileRail(network({ lines })))).toThrow(
      expect.objectContaining({ name: 'EngineError', field: 'lines[1].table' }),
    );
    const source = { kind: 'table' as const, table: tableOf(0, 0, 1e6) };
    expect(() => lumpedRail(compileRail(network({ source })))).toThrow(
      expect.objectContaining({ name: 'EngineError', field: 'source.points' }),
    );
  });
});
