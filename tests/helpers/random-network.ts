import type { LineModel, RailNetwork, SourceModel } from '@shared/engine/network';
import fc from 'fast-check';

/** Log-uniform between two positive numbers. */
const decade = (low: number, high: number) =>
  fc.double({ min: Math.log(low), max: Math.log(high), noNaN: true }).map(Math.exp);

const line = fc.record({
  esr_ohm: decade(1e-4, 1),
  capacitance_F: decade(1e-10, 1e-3),
  inductance_H: decade(1e-11, 1e-8),
  count: fc.integer({ min: 0, max: 40 }),
});

const source: fc.Arbitrary<SourceModel> = fc.oneof(
  fc.record({
    kind: fc.constant('rl' as const),
    resistance_ohm: decade(1e-5, 1),
    inductance_H: decade(1e-10, 1e-5),
  }),
  fc.record({
    kind: fc.constant('damped' as const),
    series_resistance_ohm: fc.oneof(fc.constant(0), decade(1e-5, 0.1)),
    series_inductance_H: fc.oneof(fc.constant(0), decade(1e-11, 1e-8)),
    inductor_resistance_ohm: fc.oneof(fc.constant(0), decade(1e-5, 0.1)),
    inductance_H: decade(1e-9, 1e-5),
    damping_ohm: decade(1e-3, 1),
    damping_inductance_H: fc.oneof(fc.constant(0), decade(1e-11, 1e-8)),
  }),
);

const planePair = fc.record({
  capacitance_F: decade(1e-11, 1e-7),
  resistance_ohm: decade(1e-4, 0.1),
  inductance_H: decade(1e-12, 1e-9),
});

const pack = fc.record({
  resistance_ohm: decade(1e-5, 0.1),
  inductance_H: decade(1e-12, 1e-9),
  die_capacitance_F: fc.oneof(fc.constant(0), decade(1e-10, 1e-6)),
  die_resistance_ohm: decade(1e-4, 0.1),
});

/** Rails of all shapes: both sources, with and without planes and package, seen from the pins or the die. */
export const railNetwork: fc.Arbitrary<RailNetwork> = fc
  .record({
    source,
    lines: fc.array(line, { minLength: 0, maxLength: 8 }),
    plane: fc.option(planePair, { nil: undefined }),
    package: fc.option(pack, { nil: undefined }),
    fromDie: fc.boolean(),
  })
  .map(({ source: feed, lines, plane, package: model, fromDie }) => ({
    source: feed,
    lines: lines.map((one, i): LineModel => ({ id: `line ${i}`, ...one })),
    ...(plane && { plane }),
    ...(model && { package: model }),
    observe: fromDie && model ? 'die' : 'pins',
  }));

export const frequency = decade(1e3, 1e9);
