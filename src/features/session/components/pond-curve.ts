import { compileRail, impedanceMagnitude } from '@shared/engine/rail';

/** An invented rail that holds, for the picture on the doors of the house; computed, not drawn by hand. */
const LINES = [
  { id: '470 µF', count: 2, capacitance_F: 470e-6, esr_ohm: 9e-3, inductance_H: 2.6e-9 },
  { id: '47 µF', count: 3, capacitance_F: 38e-6, esr_ohm: 3e-3, inductance_H: 1.1e-9 },
  { id: '10 µF', count: 4, capacitance_F: 7e-6, esr_ohm: 4e-3, inductance_H: 0.7e-9 },
  { id: '1 µF', count: 8, capacitance_F: 0.85e-6, esr_ohm: 9e-3, inductance_H: 0.5e-9 },
  { id: '220 nF', count: 12, capacitance_F: 0.2e-6, esr_ohm: 14e-3, inductance_H: 0.42e-9 },
] as const;

const NETWORK = {
  source: { kind: 'rl', resistance_ohm: 1.4e-3, inductance_H: 22e-9 },
  observe: 'pins',
} as const;

export const POND_BAND_Hz = [1e4, 1e8] as const;
export const POND_TARGET_OHM = 8.5e-3;
/** The waterline ends where the band of this rail ends. */
export const POND_END_Hz = 4e7;

const STEPS = 480;

/** Points [Hz, ohm] of a network over the picture's axis. */
function points(rail: ReturnType<typeof compileRail>): [number, number][] {
  const [low, high] = POND_BAND_Hz;
  return Array.from({ length: STEPS + 1 }, (_, i) => {
    const frequency_Hz = low * (high / low) ** (i / STEPS);
    return [frequency_Hz, impedanceMagnitude(rail, frequency_Hz)];
  });
}

export const pondTotal = () => points(compileRail({ ...NETWORK, lines: [...LINES] }));

export const pondLines = () =>
  LINES.map((line) => ({
    id: line.id,
    points: points(compileRail({ source: { kind: 'open' }, observe: 'pins', lines: [{ ...line }] })),
  }));
