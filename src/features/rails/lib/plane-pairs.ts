import { EngineError } from '@shared/engine/errors';
import { planePairs } from '@shared/engine/inductance/stackup';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { formatLength } from '@shared/units/format';
import { permittivityText } from './plane-words';

export interface PairChoice {
  upper: string;
  lower: string;
  text: string;
}

/** The pairs of planes that a board's stack-up offers, from the top down. */
export function pairChoices({ stackup }: BoardSetup): PairChoice[] {
  if (!stackup) return [];
  try {
    return planePairs(stackup.layers).map(({ upper, lower, spacing_m, relative_permittivity }) => ({
      upper,
      lower,
      text: `${upper} – ${lower}: ${formatLength(spacing_m)}, εr ${permittivityText(relative_permittivity)}`,
    }));
  } catch (error) {
    if (error instanceof EngineError) return [];
    throw error;
  }
}
