import { readFileSync, writeFileSync } from 'node:fs';
import type { RailNetwork } from '@shared/engine/network';
import { compileRail, railImpedance, scratch } from '@shared/engine/rail';
import { describe, expect, it } from 'vitest';
import { type AcPoint, acDeck, hasNgspice, runAc } from '../helpers/ngspice';

/**
 * Against ngspice, an open circuit simulator: the same rails as circuits. Recorded results (ngspice 39) with their decks
 * stand in the fixture and are checked always; where ngspice is installed the decks are run anew.
 * `RECORD_NGSPICE=1` writes the fixture.
 */
const fixture = new URL('../fixtures/ngspice-ac.json', import.meta.url);

const bank: RailNetwork['lines'] = [
  { id: 'bulk', count: 2, esr_ohm: 6e-3, capacitance_F: 470e-6, inductance_H: 2.6e-9 },
  { id: 'mid', count: 3, esr_ohm: 3.5e-3, capacitance_F: 22e-6, inductance_H: 1.1e-9 },
  { id: 'small', count: 7, esr_ohm: 0.02, capacitance_F: 100e-9, inductance_H: 0.7e-9 },
];
const plane = { capacitance_F: 2e-9, resistance_ohm: 1e-3, inductance_H: 1e-11 };
const pack = { resistance_ohm: 8e-4, inductance_H: 2e-11, die_capacitance_F: 2e-8, die_resistance_ohm: 2e-3 };
const rl = { kind: 'rl' as const, resistance_ohm: 5e-4, inductance_H: 2e-8 };
const damped = {
  kind: 'damped' as const,
  series_resistance_ohm: 4e-4,
  series_inductance_H: 3e-10,
  inductor_resistance_ohm: 1e-3,
  inductance_H: 4.7e-7,
  damping_ohm: 0.012,
  damping_inductance_H: 2e-9,
};
const rails: Record<string, RailNetwork> = {
  'bank on an R–L source': { source: rl, lines: bank, observe: 'pins' },
  'with planes': { source: rl, plane, lines: bank, observe: 'pins' },
  'damped source': { source: damped, plane, lines: bank, observe: 'pins' },
  'package and die, seen at the pins': { source: rl, plane, package: pack, lines: bank, observe: 'pins' },
  'package and die, seen at the die': { source: damped, plane, package: pack, lines: bank, observe: 'die' },
  'no source': { source: { kind: 'open' }, plane, lines: bank, observe: 'pins' },
};

type Recorded = Record<string, { deck: string; points: AcPoint[] }>;
const recorded: Recorded = JSON.parse(readFileSync(fixture, 'utf8'));

function worstError(network: RailNetwork, points: readonly AcPoint[]): number {
  const rail = compileRail(network);
  const out = scratch();
  return points.reduce((worst, { frequency_Hz, re_ohm, im_ohm }) => {
    railImpedance(rail, frequency_Hz, out);
    return Math.max(worst, Math.hypot(out[0] - re_ohm, out[1] - im_ohm) / Math.hypot(re_ohm, im_ohm));
  }, 0);
}

const deckOf = (network: RailNetwork) => acDeck(network, 1e4, 1e9, 20);

if (process.env.RECORD_NGSPICE === '1') {
  const fresh: Recorded = {};
  for (const [name, network] of Object.entries(rails)) {
    const deck = deckOf(network);
    fresh[name] = { deck, points: runAc(deck) };
  }
  writeFileSync(fixture, `${JSON.stringify(fresh)}\n`);
}

describe('the engine against ngspice AC', () => {
  for (const [name, network] of Object.entries(rails)) {
    it(`${name}: recorded, to 1e-6`, () => {
      const { deck, points } = recorded[name];
      expect(deck).toBe(deckOf(network));
      expect(points).toHaveLength(101);
      expect(worstError(network, points)).toBeLessThan(1e-6);
    });
    it.runIf(hasNgspice)(`${name}: run live, to 1e-6`, () => {
      const points = runAc(deckOf(network));
      expect(points).toHaveLength(101);
      expect(worstError(network, points)).toBeLessThan(1e-6);
    });
  }
});
