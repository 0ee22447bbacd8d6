import type { Tightest } from '@shared/engine/headroom';
import type { BankFigures } from '@shared/rail/bank-figures';
import type { Corner } from '@shared/rail/corner';
import type { DocumentPart } from '@shared/schemas/rail-document.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import type { RevisionPeak } from '@shared/schemas/revision.schema';
import type { Answer } from '../host/answer';

/** A bank line as the bench has it: count 0 is allowed, the row stays. */
export interface BenchLine {
  part: DocumentPart;
  count: number;
  mount_H: number | null;
  distance_m: number | null;
}

export interface BenchRequest {
  spec: RailSpec;
  lines: BenchLine[];
  /** Where in the rail's conditions its parts are looked at; null: at their catalogue values. */
  corner: Corner | null;
  /** What the chart shows; wider than the band. */
  span_Hz: readonly [number, number];
}

/** One member of the rail's node, over the frequencies of `BenchAnalysis`. */
export interface BenchMember {
  role: 'source' | 'plane' | 'line' | 'load' | 'die';
  id: string;
  /** Index into the request's lines; −1 for the others. */
  line: number;
  /** |Z| of all capacitors of the line together, ohm; null for the die and for a line of count 0. */
  magnitude_ohm: Float64Array | null;
  /** |share| of the load current. */
  share: Float64Array;
  /** ESL + mount + path of one capacitor, henry; null where it is not a bank line. */
  inductance_H: number | null;
  /** C of one capacitor as it was computed with, farad; null where it is not a bank line. */
  capacitance_F: number | null;
  /** An estimate stands in that value where the part has no curve of its own. */
  estimated: boolean;
}

/** A place where |Z| lies above the target, worst first. */
export interface BenchBreak extends Tightest {
  inductive: string | null;
  capacitive: string | null;
}

export interface BenchAnalysis {
  frequency_Hz: Float64Array;
  magnitude_ohm: Float64Array;
  /** The waterline at the same frequencies; NaN outside the band. */
  target_ohm: Float64Array;
  /** Seen from the die: |Z| with the board a perfect short, at the same frequencies; null at the pins. */
  floor_ohm: Float64Array | null;
  members: BenchMember[];
  peaks: RevisionPeak[];
  breaks: BenchBreak[];
  tightest: Tightest;
  holds: boolean;
  figures: BankFigures;
  /** Plane cavity resonances that fall into the span, Hz: the one-node model does not hold there. */
  cavity_Hz: number[];
  /** A measured table ends inside the span and is continued by its fitted R–L–C. */
  extrapolated: boolean;
  /** Time spent computing, ms. */
  elapsed_ms: number;
}

export interface AnalysisApi {
  analyse(request: BenchRequest): Promise<Answer<BenchAnalysis>>;
}
