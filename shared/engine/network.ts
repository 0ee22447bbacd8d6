import type { Farad, Henry, Ohm } from '../units/quantity';

/**
 * What a rail is to the engine: everything in parallel at one node (the load's pins), then, if there is a
 * package, its series impedance and the die's capacitance behind it. SI units throughout.
 */
export interface RailNetwork {
  source: SourceModel;
  /** The plane pair as one series R–L–C from the node to ground. */
  plane?: SeriesBranch;
  lines: LineModel[];
  package?: PackageModel;
  /** Where the impedance is looked at. At the pins, the package and die hang on the node as a load branch. */
  observe: 'pins' | 'die';
}

/** R + jωL + 1/(jωC); `capacitance_F` = Infinity for a branch without a capacitor. */
export interface SeriesBranch {
  resistance_ohm: Ohm;
  inductance_H: Henry;
  capacitance_F: Farad;
}

/** Output impedance of the regulator, as the board sees it. */
export type SourceModel =
  | { kind: 'rl'; resistance_ohm: Ohm; inductance_H: Henry }
  | {
      /** Z = R0 + jωL0 + ((RL + jωL) ∥ (R1 + jωL1)) */
      kind: 'damped';
      series_resistance_ohm: Ohm;
      series_inductance_H: Henry;
      inductor_resistance_ohm: Ohm;
      inductance_H: Henry;
      damping_ohm: Ohm;
      damping_inductance_H: Henry;
    }
  | { kind: 'table'; table: ImpedanceTable }
  | { kind: 'open' };

/** Z(f), frequencies strictly rising. Interpolated linearly in log f for R and X (see table.ts). */
export interface ImpedanceTable {
  frequency_Hz: Float64Array;
  re_ohm: Float64Array;
  im_ohm: Float64Array;
}

/** ESR over frequency, frequencies strictly rising; straight on log–log paper between its points, level beyond its ends. */
export interface EsrTable {
  frequency_Hz: Float64Array;
  resistance_ohm: Float64Array;
}

/** One bank line: `count` equal capacitors, each with its mount and its path to the load. */
export interface LineModel {
  /** Names the line in results, e.g. the part's identifier. */
  id: string;
  count: number;
  esr_ohm: Ohm;
  capacitance_F: Farad;
  /** ESL + mount + path. */
  inductance_H: Henry;
  /** ESR over frequency instead of `esr_ohm`. */
  esr_table?: EsrTable;
  /**
   * Replaces R, C and ESL where it stands: Z = `resistance_factor`·Re + j(Im + ω·`added_inductance_H` − `added_elastance_perF`/ω),
   * with mount, path and a changed ESL in the inductance, and in the elastance (1/F) what a changed capacitance adds.
   */
  table?: ImpedanceTable;
  added_inductance_H?: number;
  added_elastance_perF?: number;
  resistance_factor?: number;
}

/** R + jωL from the pins to the die; C_die with R_die in series there. `die_capacitance_F` 0: nothing there. */
export interface PackageModel {
  resistance_ohm: Ohm;
  inductance_H: Henry;
  die_capacitance_F: Farad;
  die_resistance_ohm: Ohm;
}
