import { formatVolts } from '@shared/units/format';

/** A bias voltage; nothing is 0 V, not 0.00 V. */
export const volts = (value: number): string => (value === 0 ? '0\u00a0V' : formatVolts(value));
