import { EngineError } from '../errors';
import { heightBetween, platesBetween, type StackLayer } from './layers';

export type { StackLayer };

export interface PlanePair {
  /** Between the facing surfaces. */
  spacing_m: number;
  /** Of the dielectrics in series: h/Σ(hᵢ/εᵢ). */
  relative_permittivity: number;
  /** From the outer copper's inner face to the nearer plane's facing one; 0 when that plane is the outer copper. */
  depthFromTop_m: number;
  depthFromBottom_m: number;
}

function planeAt(layers: readonly StackLayer[], field: string, name: string): number {
  const index = layers.findIndex((layer) => layer.kind === 'copper' && layer.name === name);
  const layer = layers[index];
  if (!layer) throw new EngineError(field, `the stack-up has no copper layer called ${name}`);
  if (layer.kind === 'copper' && layer.use !== 'plane')
    throw new EngineError(field, `${name} is a signal layer, not a plane`);
  return index;
}

/**
 * Two planes of a stack-up by name, the upper one first: spacing and depth in metres, permittivity of what lies between. Throws
 * EngineError('upperName' or 'lowerName', …) for a name that is no copper plane, the same layer twice, the wrong order, copper
 * or nothing in between; `layers[name].…` for a thickness or permittivity that cannot be.
 */
export function planePair(layers: readonly StackLayer[], upperName: string, lowerName: string): PlanePair {
  const upper = planeAt(layers, 'upperName', upperName);
  const lower = planeAt(layers, 'lowerName', lowerName);
  if (upper === lower) throw new EngineError('lowerName', `${lowerName} cannot be both planes of a pair`);
  if (lower < upper)
    throw new EngineError('lowerName', `${lowerName} lies above ${upperName}: name the upper plane first`);
  const copper = layers.slice(upper + 1, lower).find((layer) => layer.kind === 'copper');
  if (copper)
    throw new EngineError(
      'lowerName',
      `${copper.name} lies between ${upperName} and ${lowerName}: choose planes with only dielectric between`,
    );
  return {
    ...platesBetween(layers, upper, lower),
    depthFromTop_m: heightBetween(layers, 0, upper),
    depthFromBottom_m: heightBetween(layers, lower, layers.length - 1),
  };
}

/** All pairs of planes with only dielectric between them, from the top down, as a chooser offers them. Throws as `planePair` does. */
export function planePairs(layers: readonly StackLayer[]): (PlanePair & { upper: string; lower: string })[] {
  const coppers = layers.filter((layer) => layer.kind === 'copper');
  return coppers.slice(1).flatMap((lower, i) => {
    const upper = coppers[i];
    if (upper.use !== 'plane' || lower.use !== 'plane') return [];
    return [{ upper: upper.name, lower: lower.name, ...planePair(layers, upper.name, lower.name) }];
  });
}

/**
 * Height in metres of a side's outer copper over the nearest plane below it, face to face: what a trace there returns on. Throws
 * EngineError('layers', …) when there is no plane below.
 */
export function heightToPlane(layers: readonly StackLayer[], side: 'top' | 'bottom'): number {
  const inwards = side === 'top' ? layers : layers.toReversed();
  const plane = inwards.findIndex((layer, i) => i > 0 && layer.kind === 'copper' && layer.use === 'plane');
  if (plane < 0) throw new EngineError('layers', `no plane lies below the ${side} side`);
  return heightBetween(inwards, 0, plane);
}
