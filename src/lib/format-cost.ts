import { formatFixed } from '@shared/units/format';

/** A sum of money: two decimals for a bank, three for a single part. */
export const formatCost = (value: number | null, decimals = 2): string =>
  value === null ? '—' : `${formatFixed(value, decimals)}\u00a0€`;
