import type { toleranceSchema } from '@shared/schemas/part.schema';
import type { z } from 'zod';

export type Tolerance = z.infer<typeof toleranceSchema>;

/** IEC 60062 tolerance letters; B, C and D are picofarads and go with parts below 10 pF only. */
export const TOLERANCES: Readonly<Record<Tolerance, string>> = {
  B: '±0.1 pF',
  C: '±0.25 pF',
  D: '±0.5 pF',
  F: '±1 %',
  G: '±2 %',
  J: '±5 %',
  K: '±10 %',
  M: '±20 %',
  Z: '−20 +80 %',
};
