import type { toleranceSchema } from '@shared/schemas/part.schema';
import type { z } from 'zod';

export type Tolerance = z.infer<typeof toleranceSchema>;

/** IEC 60062 tolerance letters for 10 pF and above. */
export const TOLERANCES: Readonly<Record<Tolerance, string>> = {
  B: '±0.1 %',
  C: '±0.25 %',
  D: '±0.5 %',
  F: '±1 %',
  G: '±2 %',
  J: '±5 %',
  K: '±10 %',
  M: '±20 %',
  Z: '−20 +80 %',
};

/** Below 10 pF the letters B to G mean picofarads (IEC 60062). */
const BELOW_10_pF: Partial<Record<Tolerance, string>> = {
  B: '±0.1 pF',
  C: '±0.25 pF',
  D: '±0.5 pF',
  F: '±1 pF',
  G: '±2 pF',
};

export const toleranceText = (tolerance: Tolerance, capacitance_F: number): string =>
  (capacitance_F < 10e-12 && BELOW_10_pF[tolerance]) || TOLERANCES[tolerance];
