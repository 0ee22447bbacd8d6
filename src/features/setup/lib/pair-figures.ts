import { EngineError } from '@shared/engine/errors';
import { planeInductance_HPerSquare } from '@shared/engine/inductance/plane-spreading';
import { type PlanePair, planePair } from '@shared/engine/inductance/stackup';
import { planeCapacitance } from '@shared/engine/plane';
import type { LiveLayer } from './live-layers';

const CENTIMETRE_M = 0.01;

export interface PairFigures extends PlanePair {
  /** Keys of the two planes, joined: what a chooser keeps. */
  id: string;
  /** Keys of the layers and their names. */
  upper: string;
  lower: string;
  upperLabel: string;
  lowerLabel: string;
  /** Of one square centimetre. */
  capacitance_F: number;
  /** Of a square of any size. */
  inductance_H: number;
}

/** Every two neighbouring planes of the stack-up with what they give; two that touch, while layers are moved, are no pair. */
export function pairFigures(layers: readonly LiveLayer[]): PairFigures[] {
  const coppers = layers.filter((layer) => layer.kind === 'copper');
  return coppers.slice(1).flatMap((lower, i) => {
    const upper = coppers[i];
    if (upper.use !== 'plane' || lower.use !== 'plane') return [];
    try {
      const pair = planePair(layers, upper.name, lower.name);
      const { spacing_m, relative_permittivity } = pair;
      return [
        {
          ...pair,
          id: `${upper.name} ${lower.name}`,
          upper: upper.name,
          lower: lower.name,
          upperLabel: upper.label,
          lowerLabel: lower.label,
          capacitance_F: planeCapacitance(CENTIMETRE_M, CENTIMETRE_M, spacing_m, relative_permittivity),
          inductance_H: planeInductance_HPerSquare(spacing_m),
        },
      ];
    } catch (error) {
      if (error instanceof EngineError) return [];
      throw error;
    }
  });
}
