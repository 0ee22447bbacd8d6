import type { BoardSetup, Layer, MountRecipe } from '@shared/schemas/board-setup.schema';
import { demoId } from './demo-id';

const micro = (micrometres: number): number => Number(`${micrometres}e-6`);
const milli = (millimetres: number): number => Number(`${millimetres}e-3`);

const copper = (name: string, thickness_um: number, use: 'signal' | 'plane'): Layer => ({
  kind: 'copper',
  name,
  thickness_m: micro(thickness_um),
  use,
});
const dielectric = (name: string, thickness_um: number, relative_permittivity: number): Layer => ({
  kind: 'dielectric',
  name,
  thickness_m: micro(thickness_um),
  relative_permittivity,
});

/** `via_pairs` of more than one say what share of a pair's inductance its neighbours add. */
const recipe = (
  name: string,
  trace_mm: number,
  spacing_mm: number,
  [via_pairs, coupling]: [number, number] = [1, 0],
): MountRecipe => ({
  id: demoId('recipe', name),
  name,
  trace_length_m: milli(trace_mm),
  trace_width_m: milli(0.3),
  via_drill_m: milli(0.2),
  via_spacing_m: milli(spacing_mm),
  via_pairs,
  coupling,
});

/** Eight layers, 1.6 mm: a thin pair near the top for the core, a wider one near the bottom for the memory. */
export const demoSetup: BoardSetup = {
  stackup: {
    layers: [
      copper('L1 top', 40, 'signal'),
      dielectric('prepreg 1–2', 80, 3.9),
      copper('L2 gnd', 18, 'plane'),
      dielectric('core 2–3', 100, 4.1),
      copper('L3 core', 18, 'plane'),
      dielectric('prepreg 3–4', 200, 4),
      copper('L4 signal', 18, 'signal'),
      dielectric('core 4–5', 550, 4.2),
      copper('L5 signal', 18, 'signal'),
      dielectric('prepreg 5–6', 200, 4),
      copper('L6 memory', 18, 'plane'),
      dielectric('core 6–7', 200, 4.1),
      copper('L7 gnd', 18, 'plane'),
      dielectric('prepreg 7–8', 80, 3.9),
      copper('L8 bottom', 40, 'signal'),
    ],
  },
  recipes: [
    recipe('via in pad, two pairs', 0, 0.9, [2, 0.3]),
    recipe('vias beside the pads', 0.2, 0.7),
    recipe('short traces', 0.4, 0.9),
    recipe('long traces', 1.5, 1.2),
  ],
};
