import { describe, expect, it } from 'vitest';
import { formatPath } from './common.schema';
import { railSpecSchema } from './rail-spec.schema';

const spec = {
  name: 'VDD',
  voltage_V: 0.9,
  target: { kind: 'flat', impedance_ohm: 0.01 },
  band_Hz: [5e4, 3.5e7],
  source: { kind: 'rl', resistance_ohm: 1e-3, inductance_H: 1e-8 },
};
const faults = (change: object) =>
  (railSpecSchema.safeParse({ ...spec, ...change }).error?.issues ?? []).map((issue) =>
    formatPath(issue.path),
  );

describe('the specification of a rail', () => {
  it('takes a band with the basis that gives it, and refuses one that does not', () => {
    const band_basis = { rise_s: 10e-9, knee: 0.35, regulator_bandwidth_Hz: 5e4 };
    expect(faults({ band_basis })).toEqual([]);
    expect(faults({ band_basis, band_Hz: [5e4, 3e7] })).toEqual(['band_Hz[1]']);
    expect(faults({ band_basis: { ...band_basis, regulator_bandwidth_Hz: 1e4 } })).toEqual(['band_Hz[0]']);
  });

  it('names the path of what is wrong', () => {
    expect(faults({ band_Hz: [1e7, 1e6] })).toEqual(['band_Hz[1]']);
    expect(faults({ observe: 'die' })).toEqual(['package']);
    expect(
      faults({
        target: {
          kind: 'mask',
          points: [
            [1e4, 1],
            [1e3, 1],
          ],
        },
      }),
    ).toEqual(['target.points[1][0]']);
    expect(faults({ source: { kind: 'rl', resistance_ohm: 0, inductance_H: 0 } })).toEqual([
      'source.resistance_ohm',
    ]);
    expect(faults({ source: { kind: 'damped', inductance_H: 1e-7, damping_ohm: 0 } })).toEqual([
      'source.damping_ohm',
    ]);
    expect(faults({ voltage_V: Number.NaN })).toEqual(['voltage_V']);
  });
});
