import { EngineError } from '../errors';
import { positive } from './checks';

/** One layer of a board; a board's layers are listed from the top side down. */
export type StackLayer =
  | {
      readonly kind: 'copper';
      readonly name: string;
      readonly thickness_m: number;
      readonly use: 'signal' | 'plane';
    }
  | {
      readonly kind: 'dielectric';
      readonly name: string;
      readonly thickness_m: number;
      readonly relative_permittivity: number;
    };

/** Metres between two layers, themselves left out; 0 for neighbours and for a layer and itself. Throws EngineError for a thickness of zero or less. */
export const heightBetween = (layers: readonly StackLayer[], from: number, to: number): number =>
  layers
    .slice(from + 1, to)
    .reduce((sum, layer) => sum + positive(`layers[${layer.name}].thickness_m`, layer.thickness_m), 0);

/**
 * What lies between two plates, as one dielectric: its height in metres and the permittivity of its layers in series, h/Σ(hᵢ/εᵢ).
 * Throws EngineError when nothing lies there or a layer's numbers cannot be. Source: capacitors in series.
 */
export function platesBetween(
  layers: readonly StackLayer[],
  upper: number,
  lower: number,
): { spacing_m: number; relative_permittivity: number } {
  const spacing_m = heightBetween(layers, upper, lower);
  if (!(spacing_m > 0)) throw new EngineError('lowerName', 'the planes touch: no dielectric lies between');
  const inverse = layers.slice(upper + 1, lower).reduce((sum, layer) => {
    if (layer.kind !== 'dielectric') return sum;
    return (
      sum +
      layer.thickness_m / positive(`layers[${layer.name}].relative_permittivity`, layer.relative_permittivity)
    );
  }, 0);
  return { spacing_m, relative_permittivity: spacing_m / inverse };
}
