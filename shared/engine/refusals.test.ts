import { describe, expect, it } from 'vitest';
import { sweepCurve } from './curve';
import { EngineError } from './errors';
import { tightestHeadroom } from './headroom';
import type { LineModel, RailNetwork } from './network';
import { compileRail, railImpedance, scratch } from './rail';
import { flatTarget } from './target';

const line: LineModel = { id: 'c', count: 1, esr_ohm: 0.01, capacitance_F: 1e-6, inductance_H: 1e-9 };
const rail: RailNetwork = {
  source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 1e-8 },
  lines: [line],
  observe: 'pins',
};

/** The field that a refusal names. */
function refused(work: () => unknown): string | null {
  try {
    work();
  } catch (error) {
    if (error instanceof EngineError) return error.field;
    throw error;
  }
  return null;
}

describe('where the engine says no', () => {
  it.each([Number.NaN, Number.POSITIVE_INFINITY, -1e-9])('names the field of a bad value (%d)', (bad) => {
    const withLine = (patch: Partial<LineModel>) => () =>
      compileRail({ ...rail, lines: [line, { ...line, ...patch }] });
    expect(refused(withLine({ esr_ohm: bad }))).toBe('lines[1].esr_ohm');
    expect(refused(withLine({ capacitance_F: bad }))).toBe('lines[1].capacitance_F');
    expect(refused(withLine({ inductance_H: bad }))).toBe('lines[1].inductance_H');
    expect(refused(withLine({ count: bad }))).toBe('lines[1].count');
    expect(
      refused(() =>
        compileRail({ ...rail, source: { kind: 'rl', resistance_ohm: bad, inductance_H: 1e-9 } }),
      ),
    ).toBe('source.resistance_ohm');
  });

  it('refuses a capacitor of nothing, half a capacitor, an ideal source and a rail that nothing feeds', () => {
    expect(refused(() => compileRail({ ...rail, lines: [{ ...line, capacitance_F: 0 }] }))).toBe(
      'lines[0].capacitance_F',
    );
    expect(refused(() => compileRail({ ...rail, lines: [{ ...line, count: 1.5 }] }))).toBe('lines[0].count');
    expect(
      refused(() => compileRail({ ...rail, source: { kind: 'rl', resistance_ohm: 0, inductance_H: 0 } })),
    ).toBe('source');
    expect(refused(() => compileRail({ source: { kind: 'open' }, lines: [], observe: 'pins' }))).toBe('bank');
    expect(refused(() => compileRail({ ...rail, observe: 'die' }))).toBe('observe');
  });

  it('refuses 0 Hz, an empty band and frequencies without end', () => {
    const compiled = compileRail(rail);
    const out = scratch();
    for (const f of [0, -1, Number.NaN, Number.POSITIVE_INFINITY])
      expect(refused(() => railImpedance(compiled, f, out))).toBe('frequency_Hz');
    expect(refused(() => sweepCurve(compiled, 0, 1e6))).toBe('band_Hz');
    expect(refused(() => sweepCurve(compiled, 1e6, 1e6))).toBe('band_Hz');
    expect(refused(() => tightestHeadroom(compiled, [1e6, 1e5], flatTarget(1)))).toBe('band_Hz');
  });

  it('never answers NaN: a lossless resonance is an error that names its line', () => {
    // L·C chosen so that X is exactly zero at 1/(2π) Hz.
    const ideal = compileRail({
      source: { kind: 'open' },
      lines: [{ id: 'ideal', count: 1, esr_ohm: 0, capacitance_F: 1, inductance_H: 1 }],
      observe: 'pins',
    });
    expect(refused(() => railImpedance(ideal, 1 / (2 * Math.PI), scratch()))).toBe('ideal');
  });

  it('sweeps past the resonance of a capacitor without resistance', () => {
    const lossless = compileRail({ ...rail, lines: [{ ...line, esr_ohm: 0 }] });
    const { logMagnitude } = sweepCurve(lossless, 1e4, 1e9);
    expect(logMagnitude.every(Number.isFinite)).toBe(true);
    expect(Number.isFinite(tightestHeadroom(lossless, [1e4, 1e9], flatTarget(1)).headroom_dB)).toBe(true);
  });

  it('keeps a line of count zero in its place without counting it', () => {
    const out = scratch();
    railImpedance(compileRail({ ...rail, lines: [{ ...line, count: 0 }] }), 1e6, out);
    expect(out[0]).toBeCloseTo(1e-3, 15);
  });
});
