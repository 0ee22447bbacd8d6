import { EngineError } from '../errors';
import { notNegative } from './checks';

/** Which end of a tolerance. */
export type End = 'low' | 'nominal' | 'high';

/** Common practice where a part says nothing of its own: ± per cent. */
export const USUAL_ESR_PERCENT = 30;
export const USUAL_ESL_PERCENT = 20;

/**
 * Factor of ESR or ESL at an end of its tolerance (± per cent), 1 in the middle. `usual` stands in where the part has no own
 * figure, and is then an estimate; 0 there: taken as it stands. Throws EngineError naming `field` for less than 0 or 100 and more.
 */
export function parasiticFactor(
  field: string,
  own_percent: number | undefined,
  end: End,
  { usual }: { usual: number },
): { factor: number; estimated: boolean } {
  const percent = notNegative(field, own_percent ?? usual);
  if (percent >= 100) throw new EngineError(field, 'must be below 100 %');
  const factor = { low: 1 - percent / 100, nominal: 1, high: 1 + percent / 100 }[end];
  return { factor, estimated: own_percent === undefined && factor !== 1 };
}
