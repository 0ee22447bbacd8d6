import { checkRail } from '@shared/rail/checks';
import { IN_SERVICE } from '@shared/rail/corner';
import { documentIn } from '@shared/rail/in-service';
import { headroomOf } from '@shared/rail/worst-cases';
import { type RailDocument, railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { describe, expect, it } from 'vitest';
import { Checks } from './checks';

const document: RailDocument = railDocumentSchema.parse({
  format: 'millpond-rail',
  version: 1,
  rail: {
    name: 'VDD',
    voltage_V: 1,
    target: { kind: 'step', ripple_percent: 4, step_A: 3 },
    band_Hz: [1e4, 2e7],
    source: { kind: 'rl', resistance_ohm: 5e-4, inductance_H: 2e-8 },
    load_step: { before_A: 1, step_A: 3, rise_s: 2e-8, hold_s: 5e-5, fall_s: 2e-8 },
  },
  parts: [
    {
      id: 'bulk',
      capacitance_F: 3.3e-4,
      esr_ohm: 7e-3,
      esl_H: 1.6e-9,
      mount_H: 9e-10,
      technology: 'polymer',
      tolerance: 'M',
      rated_voltage_V: 2.5,
    },
    {
      id: 'mid',
      capacitance_F: 1e-5,
      esr_ohm: 4e-3,
      esl_H: 4e-10,
      mount_H: 6e-10,
      technology: 'ceramic',
      dielectric: 'X5R',
      case: '0402',
      tolerance: 'M',
      rated_voltage_V: 4,
    },
  ],
  bank: [
    { part: 'bulk', count: 2 },
    { part: 'mid', count: 6 },
  ],
});
const request = { document, span_Hz: [1e4, 1e8] as const };

describe('the checks of a bench', () => {
  it('agree with what a revision keeps', async () => {
    const kept = checkRail(document);
    const verdicts = await new Checks().verdicts(request);
    const time = await new Checks().inTime(request);
    if (verdicts.status !== 'done' || time.status !== 'done' || !kept) throw new Error('no answer');
    expect(verdicts.value.service).toEqual(kept.service);
    expect(verdicts.value.service).toEqual(headroomOf(documentIn(document, IN_SERVICE)));
    expect(verdicts.value.corners[0]).toMatchObject({
      name: kept.worst.corner,
      tightest: kept.worst.tightest,
    });
    expect(verdicts.value.missing[0]).toEqual(kept.missing);
    expect(verdicts.value.parts).toEqual(kept.parts);
    expect(time.value.step?.droop_V).toBe(kept.step?.droop_V);
    expect(time.value.pattern?.fall.bound_V).toBe(kept.pattern?.fall_V);
    expect(time.value.start_up).toEqual(kept.start_up);
    expect(time.value.allowance_V).toBeCloseTo(0.04, 15);
    const { frequency_Hz, high_ohm } = verdicts.value.envelope;
    expect([frequency_Hz[0], frequency_Hz[frequency_Hz.length - 1]]).toEqual([1e4, 1e8]);
    expect(high_ohm.every((z) => z > 0)).toBe(true);
  });

  it('say why there is nothing in time, and which part cannot be used', async () => {
    const open = { ...document, rail: { ...document.rail, source: { kind: 'open' as const } } };
    await expect(new Checks().inTime({ ...request, document: open })).resolves.toMatchObject({
      status: 'done',
      value: { step: null, reason: expect.stringContaining('open') },
    });
    const silent: RailDocument = {
      ...document,
      rail: { ...document.rail, target: { kind: 'flat', impedance_ohm: 0.01 }, load_step: undefined },
    };
    await expect(new Checks().inTime({ ...request, document: silent })).resolves.toMatchObject({
      status: 'done',
      value: { load: null, reason: 'the specification says no load step' },
    });
    const over = { ...document, rail: { ...document.rail, voltage_V: 3 } };
    await expect(new Checks().verdicts({ ...request, document: over })).resolves.toMatchObject({
      status: 'failed',
      field: 'parts[0].rated_voltage_V',
    });
  });

  it('try the target’s own step where none is described, and say so', async () => {
    const assumed: RailDocument = { ...document, rail: { ...document.rail, load_step: undefined } };
    const answer = await new Checks().inTime({ ...request, document: assumed });
    if (answer.status !== 'done') throw new Error('no answer');
    expect(answer.value).toMatchObject({ assumed: true, load: { before_A: 0, step_A: 3 } });
    // 0.35 ÷ 20 MHz
    expect(answer.value.load?.rise_s).toBeCloseTo(1.75e-8, 15);
    expect(answer.value.step?.droop_V).toBeGreaterThan(0);
  });
});
