import type { MountShape } from '@shared/engine/inductance/mount';
import { BODY, PAD, planGeometry } from './plan-geometry';
import type { Place, PlacedMount } from './recipe-mount';
import { copperOf, cutLayers, type SectionLayer, type Span } from './section-layers';

/**
 * The mount unfolded along pad → via → via → pad, in millimetres: x along the path, z inwards from the outer face. The two loops
 * that the formulas sum are rectangles in it.
 */
export interface SectionGeometry {
  width: number;
  depth: number;
  layers: SectionLayer[];
  pads: readonly Span[];
  /** The part's ends standing on the pads. */
  part: readonly Span[];
  vias: Span;
  /** How deep each via carries current. */
  viaEnds: Span;
  drill: number;
  /** Copper around the vias' mouths. */
  rings: readonly Span[];
  /** The copper's inner face: traces and pads lie above it. */
  surface: number;
  /** Traces (none: via in pad), each over its rectangle down to the nearest plane. */
  traces: readonly Span[];
  traceBottom: number;
  /** The vias' rectangle goes down to the nearer plane of the pair. */
  viaBottom: number;
}

const MM = 1000;
const EDGE = 0.14;

export function sectionGeometry(recipe: MountShape, place: Place, mount: PlacedMount): SectionGeometry {
  const { pair, side } = place;
  const inwards = side === 'top' ? place.layers : place.layers.toReversed();
  const [near, far] = side === 'top' ? [pair.upper, pair.lower] : [pair.lower, pair.upper];
  const path = recipe.trace_length_m === 0 ? pathInPad(recipe) : pathOnTraces(recipe);
  const drill = recipe.via_drill_m * MM;
  const { ring } = planGeometry(recipe);
  const layers = cutLayers(inwards, far).map(
    (one, i): SectionLayer => ({
      ...one,
      copper: i === 0 ? [] : copperOf(one.layer, [near, far], path, drill),
    }),
  );
  const bottomOf = (name: string) => layers.find((one) => one.layer.name === name)?.to ?? 0;
  const surface = layers[0].to;
  return {
    ...path,
    depth: layers[layers.length - 1].to,
    layers,
    drill,
    rings: path.vias.map((via): Span => [via - ring / 2, via + ring / 2]),
    surface,
    viaEnds: [bottomOf(near), bottomOf(far)],
    traceBottom: surface + mount.traceHeight_m * MM,
    viaBottom: surface + mount.viaDepth_m * MM,
  };
}

type Path = Pick<SectionGeometry, 'width' | 'pads' | 'part' | 'vias' | 'traces'>;

/** From the middle of one pad to its edge, the trace, via to via, and back in the mirror. */
function pathOnTraces(recipe: MountShape): Path {
  const trace = recipe.trace_length_m * MM;
  const first = EDGE + PAD.half + trace;
  const second = first + recipe.via_spacing_m * MM;
  const width = second + trace + PAD.half + EDGE;
  const pads: Span[] = [
    [EDGE, EDGE + PAD.half],
    [width - EDGE - PAD.half, width - EDGE],
  ];
  return {
    width,
    pads,
    part: pads,
    vias: [first, second],
    traces: [
      [pads[0][1], first],
      [second, pads[1][0]],
    ],
  };
}

/** Straight along the part: pads and vias where they are. */
function pathInPad(recipe: MountShape): Path {
  const half = Math.max(PAD.outer, ((recipe.via_spacing_m + 2 * recipe.via_drill_m) * MM) / 2) + EDGE;
  const away = (recipe.via_spacing_m * MM) / 2;
  return {
    width: 2 * half,
    pads: [
      [half - PAD.outer, half - PAD.inner],
      [half + PAD.inner, half + PAD.outer],
    ],
    part: [[half - BODY.length / 2, half + BODY.length / 2]],
    vias: [half - away, half + away],
    traces: [],
  };
}
