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

/** One bank line: `count` equal capacitors, each with its mount and its path to the load. */
export interface LineModel {
  /** Names the line in results, e.g. the part's identifier. */
  id: string;
  count: number;
  esr_ohm: Ohm;
  capacitance_F: Farad;
  /** ESL + mount + path. */
  inductance_H: Henry;
  /** Replaces R, C and ESL where it stands; `added_inductance_H` (mount + path) is put in series with it. */
  table?: ImpedanceTable;
  added_inductance_H?: Henry;
}

/** R + jωL from the pins to the die; C_die with R_die in series there. `die_capacitance_F` 0: nothing there. */
export interface PackageModel {
  resistance_ohm: Ohm;
  inductance_H: Henry;
  die_capacitance_F: Farad;
  die_resistance_ohm: Ohm;
}
