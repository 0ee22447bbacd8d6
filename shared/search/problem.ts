import type { Tightest } from '../engine/headroom';
import type { LineModel, RailNetwork } from '../engine/network';
import type { TargetMask } from '../engine/target';

/** What a mix is weighed by: its number of capacitors, their price, or the board area they take. */
export type Objective = 'parts' | 'cost' | 'area';

/** A part that the search may use, as one line of the bank (its `count` is not looked at). */
export interface MixCandidate {
  id: string;
  line: LineModel;
  cost?: number;
  area_mm2?: number;
  /** At least so many; these are in every mix, from the start. Default 0. */
  min?: number;
  /** At most so many. Default 80. */
  max?: number;
}

export interface MixProblem {
  /** Source, plane, package, observation point, and the lines that stay as they are. */
  network: RailNetwork;
  candidates: MixCandidate[];
  band_Hz: readonly [number, number];
  target: TargetMask;
  minimise: Objective;
  /** At most so many different candidates with a count above zero. */
  maxKinds?: number;
}

export interface SearchOptions {
  /** Wall-clock limit; default 60 s. What is known then is returned, with the bound reached. */
  seconds?: number;
  /** Seed of the destroy-and-repair stage; default 1. */
  seed?: number;
  /** Log-spaced points over the band to start from, critical points come on top; default 160. */
  gridPoints?: number;
  /** Clock in ms, e.g. performance.now; default Date.now. */
  now?: () => number;
  /** Nodes of the proof between two looks at the clock; default 2048, a few ms. */
  nodeSlice?: number;
}

export interface MixEntry {
  id: string;
  count: number;
}

/** What the search knows so far; `headroom_dB` is the best mix's, refined by the engine. */
export interface SearchProgress {
  phase: 'mix' | 'proof';
  mix: MixEntry[] | null;
  weight: number | null;
  parts: number | null;
  headroom_dB: number | null;
  /** No mix whatever weighs less than this. */
  lowerBound: number;
  nodes: number;
  seconds: number;
}

export interface MixFound {
  found: true;
  mix: MixEntry[];
  weight: number;
  lowerBound: number;
  /** The bound has met the weight: no lighter mix exists. */
  proven: boolean;
  holds: true;
  tightest: Tightest;
  kinds: number;
  parts: number;
  nodes: number;
  seconds: number;
  gridPoints: number;
}

export interface MixMissing {
  found: false;
  mix: null;
  /** The physics, as a sentence for a person. */
  reason: string;
  /** Where it fails, when one frequency is to blame. */
  frequency_Hz: number | null;
  /** True: proven that none exists. False: none found in the time given. */
  impossible: boolean;
  lowerBound: number;
  nodes: number;
  seconds: number;
}

export type SearchResult = MixFound | MixMissing;
