import type { RailNetwork } from '@shared/engine/network';
import { compileRail, railImpedance, scratch } from '@shared/engine/rail';
import fc from 'fast-check';
import { add, type Complex, complex, divide, lusolve, type Matrix, matrix, multiply, subtract } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { frequency, railNetwork } from '../helpers/random-network';

/**
 * Against nodal analysis: every branch stamped into a node-admittance matrix, 1 A injected where the impedance is looked
 * at, the linear system solved by mathjs (open library). Nodes: 0 the pins, 1 the die.
 */
function nodalImpedance(network: RailNetwork, f: number): Complex {
  const omega = 2 * Math.PI * f;
  const hasPackage = network.package !== undefined;
  const size = hasPackage ? 2 : 1;
  const y: Complex[][] = Array.from({ length: size }, () =>
    Array.from({ length: size }, () => complex(0, 0)),
  );
  const admittance = (r: number, l: number, c: number) =>
    divide(1, complex(r, omega * l - (Number.isFinite(c) ? 1 / (omega * c) : 0))) as Complex;
  const toGround = (node: number, value: Complex, times = 1) => {
    y[node][node] = add(y[node][node], multiply(times, value)) as Complex;
  };
  const { source, plane, package: model } = network;
  if (source.kind === 'rl')
    toGround(0, admittance(source.resistance_ohm, source.inductance_H, Number.POSITIVE_INFINITY));
  if (source.kind === 'damped') {
    const a = admittance(source.inductor_resistance_ohm, source.inductance_H, Number.POSITIVE_INFINITY);
    const b = admittance(source.damping_ohm, source.damping_inductance_H, Number.POSITIVE_INFINITY);
    const pair = divide(1, add(a, b)) as Complex;
    const series = complex(source.series_resistance_ohm, omega * source.series_inductance_H);
    toGround(0, divide(1, add(series, pair)) as Complex);
  }
  if (plane) toGround(0, admittance(plane.resistance_ohm, plane.inductance_H, plane.capacitance_F));
  for (const line of network.lines)
    toGround(0, admittance(line.esr_ohm, line.inductance_H, line.capacitance_F), line.count);
  if (model) {
    const through = admittance(model.resistance_ohm, model.inductance_H, Number.POSITIVE_INFINITY);
    toGround(0, through);
    toGround(1, through);
    y[0][1] = subtract(y[0][1], through) as Complex;
    y[1][0] = subtract(y[1][0], through) as Complex;
    if (model.die_capacitance_F > 0)
      toGround(1, admittance(model.die_resistance_ohm, 0, model.die_capacitance_F));
  }
  const node = network.observe === 'die' ? 1 : 0;
  const current = Array.from({ length: size }, (_, k) => [complex(k === node ? 1 : 0, 0)]);
  const solution = lusolve(matrix(y as never) as never, current as never) as unknown as Matrix;
  return solution.get([node, 0]) as unknown as Complex;
}

describe('the engine against nodal analysis', () => {
  it('agrees to 1e-9 of |Z| on 300 random rails', () => {
    const out = scratch();
    fc.assert(
      fc.property(railNetwork, frequency, (network, f) => {
        railImpedance(compileRail(network), f, out);
        const expected = nodalImpedance(network, f);
        const error =
          Math.hypot(out[0] - expected.re, out[1] - expected.im) / Math.hypot(expected.re, expected.im);
        expect(error).toBeLessThan(1e-9);
      }),
      { numRuns: 300, seed: 21 },
    );
  });
});
