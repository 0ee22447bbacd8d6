import type { MountShape } from '@shared/engine/inductance/mount';

/** A generic 0402 chip and its pads, millimetres: the recipe is for any part, the drawing needs one. */
export const BODY = { length: 1, width: 0.5 } as const;
export const PAD = { inner: 0.25, outer: 0.75, half: 0.3 } as const;
/** Copper around a hole, as far as the neighbour leaves room for it. */
const RING = 0.1;

export type Point = readonly [x: number, y: number];

/** The mount from above in millimetres: the part's middle at 0/0, x along the part, y downwards, its traces running down. */
export interface PlanGeometry {
  /** Right-hand ones; the left-hand ones are their mirror image. The first is the one that the trace is measured to. */
  vias: Point[];
  drill: number;
  ring: number;
  /** Centre line of the right-hand trace from the pad's edge through all its vias; null: via in pad. */
  trace: Point[] | null;
  width: number;
  /** False: at this spacing a trace of this length does not meet the pads of a 0402; it is drawn dashed. */
  reaches: boolean;
  box: { left: number; right: number; top: number; bottom: number };
}

const MM = 1000;
const SLACK = 1e-9;

export function planGeometry(recipe: MountShape): PlanGeometry {
  const x = (recipe.via_spacing_m * MM) / 2;
  const length = recipe.trace_length_m * MM;
  const drill = recipe.via_drill_m * MM;
  const width = recipe.trace_width_m * MM;
  const pitch = length === 0 ? padPitch(recipe.via_pairs, drill) : drill + 2 * RING;
  const beside = recipe.via_pairs > 1 ? (pitch - drill) / 2.2 : RING;
  const ring = drill + 2 * Math.min(RING, (2 * x - drill) / 4, beside);
  const nearest = Math.min(PAD.outer, Math.max(PAD.inner, x));
  const aside = Math.abs(x - nearest);
  const place = viaPlace(x, length, aside, nearest);
  // Where further pairs stand the recipe does not say: on along the trace, in the pad around its middle.
  const centred = length === 0 || place.start[1] === 0;
  const vias = Array.from({ length: recipe.via_pairs }, (_, k): Point => {
    const step = centred ? k - (recipe.via_pairs - 1) / 2 : k;
    return [x, place.via[1] + step * pitch];
  });
  const last = vias[vias.length - 1];
  const trace = length > 0 ? [place.start, place.via, ...(vias.length > 1 && !centred ? [last] : [])] : null;
  return {
    vias,
    drill,
    ring,
    trace,
    width,
    reaches: aside <= length + SLACK,
    box: boxOf(vias, ring / 2, trace, width / 2),
  };
}

/** Vias in a pad stand as far apart as the pad allows, but never in each other. */
const padPitch = (pairs: number, drill: number): number => Math.max(1.4 * drill, (2 * PAD.half) / pairs);

function viaPlace(x: number, length: number, aside: number, nearest: number): { start: Point; via: Point } {
  if (length === 0) return { start: [x, 0], via: [x, 0] };
  // Just long enough to reach sideways: straight out of the pad's middle.
  if (x > PAD.outer && aside >= 0.995 * length) return { start: [PAD.outer, 0], via: [x, 0] };
  const down = Math.sqrt(Math.max(0, length * length - aside * aside));
  return { start: [nearest, PAD.half], via: [x, PAD.half + down] };
}

function boxOf(vias: Point[], ring: number, trace: Point[] | null, half: number): PlanGeometry['box'] {
  const ys = [-PAD.half, PAD.half, ...vias.flatMap(([, y]) => [y - ring, y + ring])];
  const right = Math.max(
    PAD.outer,
    ...vias.map(([vx]) => vx + ring),
    ...(trace ?? []).map(([tx]) => tx + half),
  );
  return { left: -right, right, top: Math.min(...ys), bottom: Math.max(...ys) };
}
