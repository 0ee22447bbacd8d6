import type { RailSpecInput } from '@shared/schemas/rail-spec.schema';
import { partId } from './people';

export const railSpec = (name: string): RailSpecInput => ({
  name,
  voltage_V: 1.2,
  target: { kind: 'flat', impedance_ohm: 0.06 },
  band_Hz: [10e3, 10e6],
  source: { kind: 'rl', resistance_ohm: 0.002, inductance_H: 20e-9 },
});

export const railBody = (name: string) => ({
  spec: railSpec(name),
  bank: [
    { partId: partId('AB-P7343-220U-6V3-9M'), count: 1 },
    { partId: partId('AB-C0402-X6S-1U-10'), count: 6 },
  ],
});
