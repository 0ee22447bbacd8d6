import { branchAdmittance } from './branch';
import { EngineError } from './errors';
import type { CompiledRail } from './rail';

/** A member's impedance anywhere in [r0, r1] + j[x0, x1], `count` times in parallel (all alike). */
interface Box {
  count: number;
  r0: number;
  r1: number;
  x0: number;
  x1: number;
}

/**
 * Upper bound of |Z| (ohm) over a list of frequencies when every member may sit anywhere between its low and its high self,
 * each on its own: wider than all corners that move all parts alike. `low` and `high` are the same rail with every part at its
 * low ends (ESR, ESL, C) and at its high ends; reactance rises with L and with C, so the two span the box.
 *
 * The node's admittances form a set whose convex hull is the sum of the members' hulls. For any direction u the least ⟨u, Y⟩
 * over the sum is the sum of the members' leasts, and the hull's distance from a point is the largest of these over u: so every
 * direction tried gives a true bound, and the best of them the hull's own. Seen from the die, |Z| > t is a disk in the plane of
 * the node's admittance (Z is a Möbius map of it); t rises until that disk touches the hull.
 */
export function intervalBound(
  low: CompiledRail,
  high: CompiledRail,
  frequency_Hz: ArrayLike<number>,
): Float64Array {
  if (low.members.length !== high.members.length)
    throw new EngineError('network', 'low and high must be the same rail');
  return Float64Array.from({ length: frequency_Hz.length }, (_, i) => {
    const boxes = boxesAt(low, high, frequency_Hz[i]);
    return low.view ? dieBound(low, boxes, frequency_Hz[i]) : 1 / distance(boxes, 0, 0);
  });
}

const out = new Float64Array(4);

function boxesAt(low: CompiledRail, high: CompiledRail, f: number): Box[] {
  return low.members.flatMap((member, k) => {
    if (member.count === 0) return [];
    branchAdmittance(member.branch, f, out, member.id);
    const a = 1 / (out[0] * out[0] + out[1] * out[1]);
    const [ra, xa] = [out[0] * a, -out[1] * a];
    branchAdmittance(high.members[k].branch, f, out, member.id);
    const b = 1 / (out[0] * out[0] + out[1] * out[1]);
    const [rb, xb] = [out[0] * b, -out[1] * b];
    return [
      {
        count: member.count,
        r0: Math.max(0, Math.min(ra, rb)),
        r1: Math.max(ra, rb),
        x0: Math.min(xa, xb),
        x1: Math.max(xa, xb),
      },
    ];
  });
}

const GOLDEN = (Math.sqrt(5) - 1) / 2;
/** Golden sections of half a turn down to 0.001 rad: the cosine of that error is 5e-7 short. */
const SECTIONS = 17;

/**
 * A lower bound of the distance in siemens of the node's admittances from a + jb; 0 when it lies inside. The least ⟨u, Y − c⟩ over the
 * set is one-topped over the directions in which it is positive, and these lie within a right angle of the way to any point of the set.
 */
function distance(boxes: readonly Box[], a: number, b: number): number {
  let re = -a;
  let im = -b;
  for (const { count, r0, r1, x0, x1 } of boxes) {
    const r = 0.5 * (r0 + r1);
    const x = 0.5 * (x0 + x1);
    const z2 = r * r + x * x;
    if (z2 === 0) continue;
    re += (count * r) / z2;
    im -= (count * x) / z2;
  }
  const along = (angle: number): number => {
    const c = Math.cos(angle);
    const s = Math.sin(angle);
    let sum = -(c * a + s * b);
    for (const box of boxes) sum += box.count * least(box, c, s);
    return sum;
  };
  const middle = Math.atan2(im, re);
  let from = middle - Math.PI / 2;
  let to = middle + Math.PI / 2;
  let left = to - GOLDEN * (to - from);
  let right = from + GOLDEN * (to - from);
  let l = along(left);
  let r = along(right);
  let best = Math.max(0, along(middle), l, r);
  for (let k = 0; k < SECTIONS; k++) {
    if (l > r) {
      to = right;
      right = left;
      r = l;
      left = to - GOLDEN * (to - from);
      l = along(left);
      if (l > best) best = l;
    } else {
      from = left;
      left = right;
      l = r;
      right = from + GOLDEN * (to - from);
      r = along(right);
      if (r > best) best = r;
    }
  }
  return best;
}

/**
 * Least c·Re Y + s·Im Y of Y = 1/(R + jX) over a box: on its rim, since the map has no inner extremum; there at a corner or where
 * an edge's arc is tangent: R = X(s ± 1)/c for fixed X, X = R(c ± 1)/s for fixed R.
 */
function least({ r0, r1, x0, x1 }: Box, c: number, s: number): number {
  // Where nothing holds the current back the admittance has no end: no bound in this direction.
  if (r0 === 0 && x0 <= 0 && x1 >= 0) return Number.NEGATIVE_INFINITY;
  let low = Math.min(part(r0, x0, c, s), part(r1, x1, c, s));
  if (x1 > x0 || r1 > r0) low = Math.min(low, part(r0, x1, c, s), part(r1, x0, c, s));
  if (x1 > x0 && Math.abs(s) > 1e-12) {
    low = Math.min(low, onUpright(r0, (c + 1) / s, x0, x1, c, s), onUpright(r0, (c - 1) / s, x0, x1, c, s));
    if (r1 > r0)
      low = Math.min(low, onUpright(r1, (c + 1) / s, x0, x1, c, s), onUpright(r1, (c - 1) / s, x0, x1, c, s));
  }
  if (r1 > r0 && Math.abs(c) > 1e-12) {
    low = Math.min(low, onLevel(x0, (s + 1) / c, r0, r1, c, s), onLevel(x0, (s - 1) / c, r0, r1, c, s));
    if (x1 > x0)
      low = Math.min(low, onLevel(x1, (s + 1) / c, r0, r1, c, s), onLevel(x1, (s - 1) / c, r0, r1, c, s));
  }
  return low;
}

const part = (r: number, x: number, c: number, s: number): number => (r * c - x * s) / (r * r + x * x);

function onUpright(r: number, t: number, x0: number, x1: number, c: number, s: number): number {
  const x = r * t;
  return x > x0 && x < x1 ? part(r, x, c, s) : Number.POSITIVE_INFINITY;
}

function onLevel(x: number, t: number, r0: number, r1: number, c: number, s: number): number {
  const r = x * t;
  return r > r0 && r < r1 ? part(r, x, c, s) : Number.POSITIVE_INFINITY;
}

const HALVINGS = 40;

/**
 * Seen from the die, 1/Z = Y_d + Y/(1 + Z_p·Y). |Z| ≥ t means |Y·(1 + Z_p·Y_d) + Y_d| ≤ |1 + Z_p·Y|/t: with A = 1 + Z_p·Y_d the points
 * Y inside the circle |A·Y + Y_d|² = |1 + Z_p·Y|²/t², a disk while |A| > |Z_p|/t.
 */
function dieBound(rail: CompiledRail, boxes: readonly Box[], f: number): number {
  const view = rail.view;
  if (!view) return Number.POSITIVE_INFINITY;
  const zp = { re: view.r, im: 2 * Math.PI * f * view.l };
  let yd = { re: 0, im: 0 };
  if (view.die) {
    branchAdmittance(view.die, f, out, 'die');
    yd = { re: out[0], im: out[1] };
  }
  const a = { re: 1 + zp.re * yd.re - zp.im * yd.im, im: zp.re * yd.im + zp.im * yd.re };
  const a2 = a.re ** 2 + a.im ** 2;
  const zp2 = zp.re ** 2 + zp.im ** 2;
  const reaches = (t: number): boolean => {
    const k = 1 / (t * t);
    const m = a2 - k * zp2;
    if (m <= 0) return true;
    // |A·Y + Y_d|² − k|1 + Z_p·Y|² = m·|Y − centre|² + rest
    const cRe = -(a.re * yd.re + a.im * yd.im - k * zp.re) / m;
    const cIm = -(a.re * yd.im - a.im * yd.re + k * zp.im) / m;
    const rest = yd.re ** 2 + yd.im ** 2 - k;
    const radius2 = cRe ** 2 + cIm ** 2 - rest / m;
    return radius2 > 0 && distance(boxes, cRe, cIm) <= Math.sqrt(radius2);
  };
  let under = Math.sqrt(zp2 / a2);
  let over = Math.max(under, 1e-12) * 2;
  for (let i = 0; i < 200 && reaches(over); i++) over *= 2;
  for (let i = 0; i < HALVINGS && over / under > 1 + 1e-6; i++) {
    const middle = under > 0 ? Math.sqrt(under * over) : over / 2;
    if (reaches(middle)) under = middle;
    else over = middle;
  }
  return over;
}
