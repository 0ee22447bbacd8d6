import type { LayerField } from '../lib/field-faults';
import type { LayerKind } from '../lib/setup-form';

/** Copper is a plane or carries signals. */
export const KIND_WORDS: Readonly<Record<LayerKind, string>> = {
  plane: 'plane',
  signal: 'signal',
  dielectric: 'dielectric',
};

export const kindOf = (text: string): LayerKind =>
  text === 'plane' || text === 'signal' ? text : 'dielectric';

/** How the fields of a layer are called where their faults stand. */
export const FAULT_WORDS: readonly (readonly [LayerField, string])[] = [
  ['name', 'name'],
  ['kind', 'kind'],
  ['thickness', 'thickness'],
  ['permittivity', 'εr'],
];
