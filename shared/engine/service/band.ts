import type { Estimate } from './part-behaviour';

/** A middle value and the ends of the band that it lies in; all three alike where no band is known. */
export interface Band extends Estimate {
  low: number;
  high: number;
}

/** A value without a band. */
export const steady = (factor: number, estimated: boolean, basis: string): Band => ({
  factor,
  low: factor,
  high: factor,
  estimated,
  basis,
});
