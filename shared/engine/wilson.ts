import { EngineError } from './errors';

/** Two-sided 95 %: the normal distribution's 97.5 % point. */
const Z95 = 1.959963984540054;

/**
 * Confidence interval of a proportion after `hits` of `draws` (E. B. Wilson, J. Am. Stat. Assoc. 22, 1927): stays inside [0, 1] and
 * says something even after no hit or no miss. Throws EngineError unless 0 ≤ hits ≤ draws and draws ≥ 1.
 */
export function wilsonInterval(hits: number, draws: number, z = Z95): { low: number; high: number } {
  if (!(draws >= 1) || hits < 0 || hits > draws)
    throw new EngineError('draws', 'a proportion needs at least one draw, and no more hits than draws');
  const p = hits / draws;
  const z2 = (z * z) / draws;
  const centre = (p + z2 / 2) / (1 + z2);
  const half = (z / (1 + z2)) * Math.sqrt((p * (1 - p)) / draws + z2 / (4 * draws));
  return { low: Math.max(0, centre - half), high: Math.min(1, centre + half) };
}
