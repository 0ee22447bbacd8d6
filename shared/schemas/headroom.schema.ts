import { z } from 'zod';

/** Where a rail is closest to its target, or furthest above it. */
export const tightestSchema = z.object({
  frequency_Hz: z.number(),
  impedance_ohm: z.number(),
  target_ohm: z.number(),
  headroom_dB: z.number(),
});
