import { describe, expect, it } from 'vitest';
import { MU0_H_PER_M } from '../constants';
import { coaxVia_H, signalVia_H } from './signal-via';
import { viaPairLog_H } from './via';

const fault = (field: string) => expect.objectContaining({ name: 'EngineError', field });
const [HEIGHT, DISTANCE, DIAMETER] = [1.6e-3, 1e-3, 0.25e-3];

/** The same loop from partial inductances of thin wires, −(μ₀h/2π)·ΣΣ iⱼ·iₖ·ln a for unit current: an independent sum. */
function byEnergy(returns: number): number {
  const wires = [
    { x: 0, y: 0, i: 1 },
    ...Array.from({ length: returns }, (_, k) => ({
      x: DISTANCE * Math.cos((2 * Math.PI * k) / returns),
      y: DISTANCE * Math.sin((2 * Math.PI * k) / returns),
      i: -1 / returns,
    })),
  ];
  let sum = 0;
  for (const a of wires)
    for (const b of wires)
      sum -= a.i * b.i * Math.log(a === b ? DIAMETER / 2 : Math.hypot(a.x - b.x, a.y - b.y));
  return ((MU0_H_PER_M * HEIGHT) / (2 * Math.PI)) * sum;
}

describe('signal via with returns round it', () => {
  it.each([1, 2, 3, 4, 6, 8])('agrees with the energy of thin wires for %d returns', (returns) => {
    expect(signalVia_H(HEIGHT, DISTANCE, DIAMETER, returns) / byEnergy(returns)).toBeCloseTo(1, 12);
  });

  it('is the pair of thin wires with one return and nears the closed cylinder with many', () => {
    expect(signalVia_H(HEIGHT, DISTANCE, DIAMETER, 1)).toBeCloseTo(
      viaPairLog_H(HEIGHT, DISTANCE, DIAMETER),
      20,
    );
    const thin = 1e-6;
    const many = signalVia_H(HEIGHT, DISTANCE, thin, 2000) / coaxVia_H(HEIGHT, DISTANCE, thin);
    expect(many).toBeGreaterThan(0.999);
    expect(many).toBeLessThan(1.001);
  });

  it('names what it refuses', () => {
    for (const bad of [0, -1, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(() => signalVia_H(bad, DISTANCE, DIAMETER, 2)).toThrow(fault('height_m'));
      expect(() => signalVia_H(HEIGHT, bad, DIAMETER, 2)).toThrow(fault('distance_m'));
      expect(() => coaxVia_H(HEIGHT, DISTANCE, bad)).toThrow(fault('diameter_m'));
      expect(() => signalVia_H(HEIGHT, DISTANCE, DIAMETER, bad)).toThrow(fault('returns'));
    }
    expect(() => coaxVia_H(HEIGHT, DIAMETER, DIAMETER)).toThrow(fault('distance_m'));
    expect(() => signalVia_H(HEIGHT, DISTANCE, DIAMETER, 2.5)).toThrow(fault('returns'));
    // Thirty barrels of 0.25 mm do not fit on a circle of 6.3 mm.
    expect(() => signalVia_H(HEIGHT, DISTANCE, DIAMETER, 30)).toThrow(fault('returns'));
  });
});
