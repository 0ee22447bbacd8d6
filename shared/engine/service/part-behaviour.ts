/** Points of a curve: [x, factor] with x rising. */
export type CurvePoints = readonly (readonly [number, number])[];

/** What the engine needs of a part to say what it is in service. Catalogue values; what is left out is not known. */
export interface PartBehaviour {
  readonly capacitance_F: number;
  readonly esr_ohm: number;
  readonly esl_H: number;
  /** Kind by construction, e.g. `ceramic`, `polymer`; a part without one is bare: its numbers are taken as they stand. */
  readonly technology?: string;
  /** EIA-198 / IEC 60384 code of a ceramic, e.g. `X7R`. */
  readonly dielectric?: string;
  /** Case code in inch, e.g. `0402`; a metric one ends in M. */
  readonly case?: string;
  /** Tolerance letter (IEC 60062). */
  readonly tolerance?: string;
  readonly rated_voltage_V?: number;
  /** C ÷ C(0 V) over DC volts. */
  readonly bias_curve?: CurvePoints;
  /** C ÷ C(25 °C) over °C. */
  readonly temperature_curve?: CurvePoints;
  /** Loss in per cent of the 1000 h value with each decade of hours. */
  readonly ageing_percent_per_decade?: number;
  /** ± per cent. */
  readonly esr_tolerance_percent?: number;
  readonly esl_tolerance_percent?: number;
}

/** A factor, whether it is an estimate rather than the part's own figure, and in a few words where it comes from. */
export interface Estimate {
  factor: number;
  estimated: boolean;
  basis: string;
}
