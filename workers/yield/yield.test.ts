import { type RailDocument, railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { describe, expect, it } from 'vitest';
import { Yield } from './yield';

const document: RailDocument = railDocumentSchema.parse({
  format: 'millpond-rail',
  version: 1,
  rail: {
    name: 'VDD',
    voltage_V: 1,
    target: { kind: 'flat', impedance_ohm: 0.02 },
    band_Hz: [1e4, 1e7],
    source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 2e-8 },
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
    },
  ],
  bank: [{ part: 'bulk', count: 2 }],
});

describe('the yield in a worker', () => {
  it('tells how far it is and ends with the same answer for the same seed', async () => {
    const heard: number[] = [];
    const run = (seed: number) =>
      new Yield().run({ document, draws: 1000, seed }, ({ done }) => heard.push(done));
    const first = await run(5);
    expect(heard).toEqual([250, 500, 750]);
    if (first.status !== 'done') throw new Error('no answer');
    expect(first.value).toMatchObject({ draws: 1000, seed: 5 });
    expect(first.value.influence[0]).toMatchObject({ line: 0, part: 'bulk' });
    await expect(run(5)).resolves.toEqual(first);
  });

  it('stops when it is cancelled, and says when there is nothing to draw', async () => {
    const worker = new Yield();
    const answer = worker.run({ document, draws: 100_000, seed: 1 }, () => void worker.cancel());
    await expect(answer).resolves.toEqual({ status: 'stale' });
    const bare: RailDocument = {
      ...document,
      parts: [{ id: 'bulk', capacitance_F: 3.3e-4, esr_ohm: 7e-3, esl_H: 1.6e-9, mount_H: 9e-10 }],
    };
    await expect(new Yield().run({ document: bare, draws: 10, seed: 1 }, () => {})).resolves.toMatchObject({
      status: 'failed',
      field: 'conditions.vary',
    });
  });
});
