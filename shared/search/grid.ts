import { selfResonance_Hz } from '../engine/branch';
import type { Prepared } from './prepare';

/**
 * Frequencies that the search starts from: `points` log-spaced over the band, the band's edges, the corners of the target
 * mask and every self-resonance in the band. What breaks the surface between them joins later (see verify.ts).
 */
export function startGrid(prepared: Prepared, points: number): number[] {
  const [low, high] = prepared.problem.band_Hz;
  const count = Math.max(2, Math.round(points));
  const grid = [low, high];
  for (let i = 1; i < count - 1; i++) grid.push(low * (high / low) ** (i / (count - 1)));
  for (const member of prepared.rail.members) grid.push(selfResonance_Hz(member.branch) ?? 0);
  for (const f of prepared.problem.target.frequency_Hz) grid.push(f);
  grid.sort((a, b) => a - b);
  return insertNew(
    [],
    grid.filter((f) => f >= low && f <= high),
  );
}

/** `grid` with those of `more` appended that it does not hold yet (1e-9 relative counts as the same). */
export function insertNew(grid: readonly number[], more: readonly number[]): number[] {
  const all = [...grid];
  for (const f of more) if (!all.some((g) => Math.abs(f - g) <= 1e-9 * f)) all.push(f);
  return all;
}
