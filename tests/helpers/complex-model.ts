import type { RailNetwork } from '@shared/engine/network';
import Complex from 'complex.js';

/** The rail once more, written as the formulas read, one complex object a number: slow, plain, and not the engine's code. */
export function complexImpedance(network: RailNetwork, frequency_Hz: number): Complex {
  const jw = new Complex(0, 2 * Math.PI * frequency_Hz);
  const rlc = (r: number, l: number, c: number) => {
    const z = new Complex(r, 0).add(jw.mul(l));
    return Number.isFinite(c) ? z.add(new Complex(1, 0).div(jw.mul(c))) : z;
  };
  const parallel = (a: Complex, b: Complex) => a.mul(b).div(a.add(b));
  let y = new Complex(0, 0);
  const hang = (z: Complex) => {
    y = y.add(new Complex(1, 0).div(z));
  };
  const { source, plane, package: model } = network;
  if (source.kind === 'rl') hang(rlc(source.resistance_ohm, source.inductance_H, Number.POSITIVE_INFINITY));
  if (source.kind === 'damped') {
    const inductor = rlc(source.inductor_resistance_ohm, source.inductance_H, Number.POSITIVE_INFINITY);
    const damping = rlc(source.damping_ohm, source.damping_inductance_H, Number.POSITIVE_INFINITY);
    const series = rlc(source.series_resistance_ohm, source.series_inductance_H, Number.POSITIVE_INFINITY);
    hang(series.add(parallel(inductor, damping)));
  }
  if (plane) hang(rlc(plane.resistance_ohm, plane.inductance_H, plane.capacitance_F));
  for (const line of network.lines)
    for (let i = 0; i < line.count; i++) hang(rlc(line.esr_ohm, line.inductance_H, line.capacitance_F));
  const one = new Complex(1, 0);
  if (!model) return one.div(y);
  const series = rlc(model.resistance_ohm, model.inductance_H, Number.POSITIVE_INFINITY);
  const die = model.die_capacitance_F > 0 ? rlc(model.die_resistance_ohm, 0, model.die_capacitance_F) : null;
  if (network.observe === 'pins') return die ? one.div(y.add(one.div(series.add(die)))) : one.div(y);
  const throughPackage = series.add(one.div(y));
  return die ? parallel(throughPackage, die) : throughPackage;
}
