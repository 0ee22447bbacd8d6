import { formatInput } from '@shared/units/format';

/** What stands in a field of points: one a line, reading back as the same numbers. */
export const pointsInput = (points: readonly (readonly number[])[]): string =>
  points.map((row) => row.map(formatInput).join(' ')).join('\n');
