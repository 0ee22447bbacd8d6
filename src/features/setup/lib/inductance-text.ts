import { formatQuantity } from '@shared/units/format';

/** An inductance of a mount; none at all is said in the unit of its neighbours. */
export const inductanceText = (inductance_H: number): string =>
  inductance_H === 0 ? '0\u00a0pH' : formatQuantity(inductance_H, 'H');
