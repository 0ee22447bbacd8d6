import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { describe, expect, it } from 'vitest';
import { Analysis, analyseBench } from './analysis';
import type { BenchRequest } from './analysis.interface';

const spec: RailSpec = {
  name: 'VDD',
  voltage_V: 1,
  target: { kind: 'flat', impedance_ohm: 0.01 },
  band_Hz: [1e4, 3e7],
  source: { kind: 'rl', resistance_ohm: 5e-4, inductance_H: 2e-8 },
  observe: 'pins',
};
const part = (id: string, capacitance_F: number) => ({
  id,
  capacitance_F,
  esr_ohm: 0.01,
  esl_H: 5e-10,
  mount_H: 4e-10,
});
const request: BenchRequest = {
  spec,
  lines: [
    { part: part('bulk', 4.7e-4), count: 2, mount_H: null, distance_m: null },
    { part: part('none', 1e-6), count: 0, mount_H: null, distance_m: null },
    { part: part('small', 1e-7), count: 5, mount_H: 2e-10, distance_m: null },
  ],
  corner: null,
  span_Hz: [1e4, 1e8],
};

describe('the analysis of a bench', () => {
  it('keeps lines of count zero in place, with no share', () => {
    const { members, figures } = analyseBench(request, null).analysis;
    const line = (k: number) => members.find((member) => member.line === k);
    expect(members.map((member) => member.line)).toEqual([-1, 0, 1, 2]);
    expect(line(1)?.share.every((share) => share === 0)).toBe(true);
    expect(line(2)?.inductance_H).toBeCloseTo(7e-10, 20);
    expect(figures).toMatchObject({ parts: 7, kinds: 2, cost: null });
  });

  it('has the band’s edges and every place that breaks the surface among its points, worst first', () => {
    const { frequency_Hz, magnitude_ohm, target_ohm, breaks, tightest, holds } = analyseBench(
      request,
      null,
    ).analysis;
    expect(holds).toBe(false);
    expect(breaks[0]).toMatchObject({ frequency_Hz: tightest.frequency_Hz });
    for (const one of breaks) {
      const i = frequency_Hz.indexOf(one.frequency_Hz);
      expect(i).toBeGreaterThanOrEqual(0);
      expect(magnitude_ohm[i] / one.impedance_ohm).toBeCloseTo(1, 12);
      expect(target_ohm[i]).toBeCloseTo(0.01, 15);
    }
    const inBand = frequency_Hz.filter((_, i) => !Number.isNaN(target_ohm[i]));
    expect([inBand[0], inBand[inBand.length - 1]]).toEqual([1e4, 3e7]);
  });

  it('is the same from kept samples as from nothing, whatever the counts were before', () => {
    const counted = (counts: number[]) => ({
      ...request,
      lines: request.lines.map((line, i) => ({ ...line, count: counts[i] })),
    });
    let { samples } = analyseBench(request, null);
    for (const counts of [
      [1, 2, 3],
      [0, 0, 9],
      [40, 1, 0],
      [2, 0, 5],
    ]) {
      const kept = analyseBench(counted(counts), samples);
      samples = kept.samples;
      const { analysis: fresh } = analyseBench(counted(counts), null);
      expect(kept.analysis.tightest.impedance_ohm / fresh.tightest.impedance_ohm).toBeCloseTo(1, 12);
      expect(kept.analysis.frequency_Hz.length).toBe(fresh.frequency_Hz.length);
      kept.analysis.frequency_Hz.forEach((f, i) => {
        expect(f / fresh.frequency_Hz[i]).toBeCloseTo(1, 9);
      });
      kept.analysis.members.forEach((member, k) => {
        member.share.forEach((share, i) => {
          expect(share).toBeCloseTo(fresh.members[k].share[i], 10);
        });
      });
    }
  });

  it('answers what the engine refuses as data that names the field', async () => {
    const bad = { ...request, lines: [{ ...request.lines[0], count: -1 }] };
    await expect(new Analysis().analyse(bad)).resolves.toMatchObject({
      status: 'failed',
      field: 'lines[0].count',
    });
    const nothing: BenchRequest = { ...request, spec: { ...spec, source: { kind: 'open' } }, lines: [] };
    await expect(new Analysis().analyse(nothing)).resolves.toMatchObject({ status: 'failed', field: 'bank' });
  });
});
