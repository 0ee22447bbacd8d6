import type { Layer } from '@shared/schemas/board-setup.schema';
import { layerForm, type SetupForm } from './setup-form';

const copper = (name: string, thickness_m: number, use: 'signal' | 'plane'): Layer => ({
  kind: 'copper',
  name,
  thickness_m,
  use,
});
/** Says in its name what it is until somebody has put in the fabricator's. */
const typical = (name: string, thickness_m: number, relative_permittivity: number): Layer => ({
  kind: 'dielectric',
  name: `typical ${name}`,
  thickness_m,
  relative_permittivity,
});

/** 1.6 mm in four layers: planes on both sides of one core. */
const FOUR: Layer[] = [
  copper('L1 top', 35e-6, 'signal'),
  typical('prepreg', 200e-6, 4.2),
  copper('L2 plane', 35e-6, 'plane'),
  typical('core', 1.06e-3, 4.3),
  copper('L3 plane', 35e-6, 'plane'),
  typical('prepreg', 200e-6, 4.2),
  copper('L4 bottom', 35e-6, 'signal'),
];

/** 1.6 mm in eight layers: a thin pair of planes under each side, two signal layers in the middle. */
const EIGHT: Layer[] = [
  copper('L1 top', 40e-6, 'signal'),
  typical('prepreg', 80e-6, 4),
  copper('L2 plane', 18e-6, 'plane'),
  typical('core', 100e-6, 4.2),
  copper('L3 plane', 18e-6, 'plane'),
  typical('prepreg', 220e-6, 4),
  copper('L4 signal', 18e-6, 'signal'),
  typical('core', 600e-6, 4.3),
  copper('L5 signal', 18e-6, 'signal'),
  typical('prepreg', 220e-6, 4),
  copper('L6 plane', 18e-6, 'plane'),
  typical('core', 100e-6, 4.2),
  copper('L7 plane', 18e-6, 'plane'),
  typical('prepreg', 80e-6, 4),
  copper('L8 bottom', 40e-6, 'signal'),
];

/** Plausible stack-ups to begin with; every figure is to be replaced by the fabricator's. */
export const STARTING_POINTS = { four: FOUR, eight: EIGHT } as const;

export const beginWith = (which: keyof typeof STARTING_POINTS): NonNullable<SetupForm['layers']> =>
  STARTING_POINTS[which].map(layerForm);
