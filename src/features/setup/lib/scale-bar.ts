const STEPS_M = [5e-3, 2e-3, 1e-3, 0.5e-3, 0.2e-3, 0.1e-3, 0.05e-3, 0.02e-3];

/** The longest round length whose bar is no longer than `most` px at `scale` px a metre. */
export function scaleBar(scale: number, most: number): { length_m: number; px: number } {
  const length_m = STEPS_M.find((step) => step * scale <= most) ?? STEPS_M[STEPS_M.length - 1];
  return { length_m, px: length_m * scale };
}
