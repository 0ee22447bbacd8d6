import type { Condition } from './condition';

const DIRECTIONS = 24;

/**
 * Half-planes that contain the disk of a condition with a < 0. There q is concave, so for any anchor Ya
 *   q(Y) ≤ q(Ya) + ∇q(Ya)·(Y − Ya) = 2(a·Ya + p)·Y + (d − a|Ya|²),
 * and q(Y) ≥ 0 implies that the right side is ≥ 0: a row with a' = 0, p' = a·Ya + p, d' = d − a|Ya|², necessary for
 * any anchor, tight where Ya lies on the circle. Anchors: evenly around the circle, and the circle's point nearest to the
 * origin, found by a quadratic formula without cancellation so that it stays good when a → 0 and the circle is huge.
 */
export function tangentRows(c: Condition): Condition[] {
  const rows: Condition[] = [];
  const add = (x: number, y: number): void => {
    const px = c.a * x + c.px;
    const py = c.a * y + c.py;
    const zt = Math.hypot(px, py);
    const d = c.d - c.a * (x * x + y * y);
    if (zt > 0 && Number.isFinite(d)) rows.push({ a: 0, px, py, d, zt });
  };
  const p = Math.hypot(c.px, c.py);
  if (p > 0) {
    // along Y = s·p/|p|: a·s² + 2|p|s + d = 0; the root of smaller size is −d/(|p| + √(p² − a·d)), √… = Zt
    const s = -c.d / (p + Math.sqrt(Math.max(0, p * p - c.a * c.d)));
    add((s * c.px) / p, (s * c.py) / p);
  }
  const radius = c.zt / Math.abs(c.a);
  for (let i = 0; i < DIRECTIONS; i++) {
    const angle = (2 * Math.PI * i) / DIRECTIONS;
    add(-c.px / c.a + radius * Math.cos(angle), -c.py / c.a + radius * Math.sin(angle));
  }
  return rows;
}
