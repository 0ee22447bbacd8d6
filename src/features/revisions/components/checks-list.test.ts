import { checkRail } from '@shared/rail/checks';
import { railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { describe, expect, it } from 'vitest';
import { checkRows } from './checks-list';

const document = railDocumentSchema.parse({
  format: 'millpond-rail',
  version: 1,
  rail: {
    name: 'VDD',
    voltage_V: 1,
    target: { kind: 'step', ripple_percent: 5, step_A: 2 },
    band_Hz: [1e4, 1e7],
    source: { kind: 'rl', resistance_ohm: 0.002, inductance_H: 2e-8 },
    start_up: { soft_start_s: 1e-3, current_limit_A: 0.1 },
  },
  parts: [
    { id: 'BULK', capacitance_F: 2e-4, esr_ohm: 0.01, esl_H: 1.5e-9, mount_H: 8e-10 },
    { id: 'SMALL', capacitance_F: 1e-6, esr_ohm: 0.015, esl_H: 3e-10, mount_H: 5e-10 },
  ],
  bank: [
    { part: 'BULK', count: 1 },
    { part: 'SMALL', count: 4 },
  ],
});

describe('the checks of a revision', () => {
  const checks = checkRail(document);
  if (!checks) throw new Error('the rail has no result');

  it('name each question once, with its figure and where it shows', () => {
    const rows = checkRows(checks);
    expect(rows.map((row) => row.name)).toEqual([
      'catalogue values',
      'in service',
      'worst of 32 corners',
      'one part open',
      'load step, droop',
      'load step, overshoot',
      'load step, worst corner',
      'worst pattern of the load',
      'inrush',
    ]);
    expect(rows[3]).toMatchObject({ holds: false, note: expect.stringContaining('one BULK') });
    expect(rows[4].note).toMatch(/^of 50\.0\u00a0mV; 0\u00a0A \+ 2\u00a0A in .* \(assumed\)$/);
    expect(rows[6].note).toMatch(/^of 50\.0\u00a0mV; (droop|overshoot), /);
    // 204 µF to 1 V in 1 ms: 0.204 A over a limit of 0.1 A
    expect(rows[8]).toMatchObject({ holds: false });
    expect(rows[8].note).toMatch(/; a soft start of [\d.]+\u00a0ms would keep within it$/);
  });

  it('name the larger of droop and overshoot in the worst corner, and what stands in for tables', () => {
    const rows = checkRows({
      ...checks,
      load_assumed: false,
      approximated: ['BULK'],
      worst_step: { corner: 'cold, aged', droop_V: 0.02, overshoot_V: 0.06 },
    });
    expect(rows[4].note).toMatch(/; ≈ in time taken as series R–L–C: BULK$/);
    expect(rows[4].note).not.toContain('assumed');
    expect(rows[6]).toMatchObject({
      holds: false,
      figure: '60.0\u00a0mV',
      note: 'of 50.0\u00a0mV; overshoot, cold, aged',
    });
  });

  it('say so where nothing is given to hold a figure against', () => {
    const rows = checkRows({
      ...checks,
      allowance_V: null,
      start_up: { ...checks.start_up, limit_A: null, current_A: null, holds: null },
    });
    expect(rows.find((row) => row.name === 'worst pattern of the load')?.holds).toBeNull();
    expect(rows[8]).toMatchObject({ holds: null, figure: '—', note: expect.stringContaining('not given') });
  });
});
