import type { RailInTime } from '@workers/checks/checks.interface';
import { describe, expect, it } from 'vitest';
import { whyPatternFails } from './pattern-words';

const run = (bound_V: number) => ({
  bound_V,
  edges: [],
  corners: [],
  time_s: new Float64Array(1),
  deviation_V: new Float64Array(1),
  simulated_V: bound_V,
  simulated_time_s: 0,
});

function told(more: {
  swing_V?: number;
  edge_V?: number;
  dominant?: { frequency_Hz: number; q: number; share: number } | null;
}): Pick<RailInTime, 'pattern' | 'allowance_V' | 'edge_V' | 'load'> {
  const { swing_V = 0.04, edge_V = 0.002, dominant = { frequency_Hz: 1.25e7, q: 5.2, share: 0.7 } } = more;
  return {
    allowance_V: 0.024,
    edge_V,
    load: { before_A: 0, step_A: 2, rise_s: 1e-8, hold_s: 1e-5, fall_s: 1e-8 },
    pattern: { fall: run(swing_V), rise: run(0.9 * swing_V), variation_ohm: 0.03, dc_ohm: 0.001, dominant },
  };
}
const band = [1e4, 4e7] as const;

describe('why a pattern of the load goes too far', () => {
  it('says nothing while it does not', () => {
    expect(whyPatternFails(told({ swing_V: 0.02 }), true, band)).toBeNull();
    expect(whyPatternFails({ ...told({}), allowance_V: null }, true, band)).toBeNull();
  });

  it('names the resonance in the band that rings on', () => {
    const text = whyPatternFails(told({}), true, band);
    expect(text).toMatch(/^Holds over frequency, yet .*: the target limits each frequency alone/);
    expect(text).toMatch(/resonance at 12\.5\sMHz \(Q 5\.2\), which rings on/);
  });

  it('does not blame the sum of frequencies for a resonance beyond the band', () => {
    const dominant = { frequency_Hz: 1.37e8, q: 9.3, share: 0.6 };
    const text = whyPatternFails(told({ dominant }), true, band);
    expect(text).toMatch(/^Holds over its band, yet/);
    expect(text).toContain('beyond the band: the target asks nothing there');
    expect(text).not.toContain('limits each frequency alone');
  });

  it('names the edge where its own L·dI/dt is most of it, and several where none stands out', () => {
    expect(whyPatternFails(told({ edge_V: 0.03 }), true, band)).toMatch(
      /one edge of 10\sns alone drops 30\.0\smV/,
    );
    const dominant = { frequency_Hz: 1e6, q: 0.8, share: 0.9 };
    expect(whyPatternFails(told({ dominant }), false, band)).toMatch(
      /^A pattern .* several resonances, each mild/,
    );
    expect(whyPatternFails(told({ dominant: null }), false, band)).toMatch(/several resonances/);
  });
});
