import type { LiveLayer } from './live-layers';

export type Span = readonly [from: number, to: number];

export interface SectionLayer {
  layer: LiveLayer;
  /** Inwards from the outer face of the side's copper. */
  from: number;
  to: number;
  /** Its copper along the section, with the clearances around vias that pass; empty for a dielectric. */
  copper: Span[];
}

const MM = 1000;
/** What is shown of the board beneath the pair, so that one sees that it goes on. */
const BELOW = 0.08;
const CLEARANCE = 0.15;

/** The layers from the surface down to the farther plane of the pair, and a little of what follows. */
export function cutLayers(inwards: readonly LiveLayer[], last: string): Omit<SectionLayer, 'copper'>[] {
  const end = inwards.findIndex((layer) => layer.name === last);
  let z = 0;
  return inwards.slice(0, end + 2).map((layer, i) => {
    const thickness = layer.thickness_m * MM;
    const from = z;
    z += i > end ? Math.min(BELOW, thickness) : thickness;
    return { layer, from, to: z };
  });
}

/** A plane goes on but for clearances around the vias that do not end on it; what signal layers carry there nobody knows. */
export function copperOf(
  layer: LiveLayer,
  ends: readonly [string, string],
  path: { vias: Span; width: number },
  drill: number,
): Span[] {
  if (layer.kind !== 'copper' || layer.use !== 'plane') return [];
  const gaps = path.vias
    .filter((_, i) => ends[i] !== layer.name)
    .map((via): Span => [via - drill / 2 - CLEARANCE, via + drill / 2 + CLEARANCE]);
  return without([0, path.width], gaps);
}

/** What is left of a span without the gaps, which come in rising order. */
export function without([from, to]: Span, gaps: readonly Span[]): Span[] {
  const left: Span[] = [];
  let at = from;
  for (const [start, end] of gaps) {
    if (start > at) left.push([at, Math.min(start, to)]);
    at = Math.max(at, end);
  }
  return at < to ? [...left, [at, to]] : left;
}
