import { isClosed } from './budget';
import type { Incumbent, MixStage } from './mix-stage';
import type { MixEntry, SearchProgress, SearchResult } from './problem';

const YIELD_SECONDS = 0.02;

/** Turns the search's inner state (prepared order, units of weight) into what callers see. */
export class Reporter {
  /** In units of weight. */
  bound: number;
  nodes = 0;
  readonly seconds: () => number;
  private readonly stage: MixStage;
  private lastYield = 0;

  constructor(stage: MixStage, seconds: () => number) {
    this.stage = stage;
    this.seconds = seconds;
    this.bound = stage.prepared.baseWeight;
  }

  /** Time to let the caller have a look. */
  isDue(): boolean {
    return this.seconds() - this.lastYield > YIELD_SECONDS;
  }

  progress(phase: 'mix' | 'proof'): SearchProgress {
    this.lastYield = this.seconds();
    const { incumbent } = this.stage;
    return {
      phase,
      mix: incumbent && this.mixOf(incumbent),
      weight: incumbent && this.weightOf(incumbent),
      parts: incumbent && partsOf(incumbent),
      headroom_dB: incumbent?.tightest.headroom_dB ?? null,
      lowerBound: this.lowerBound(incumbent),
      nodes: this.nodes,
      seconds: this.lastYield,
    };
  }

  found(incumbent: Incumbent): SearchResult {
    return {
      found: true,
      mix: this.mixOf(incumbent),
      weight: this.weightOf(incumbent),
      lowerBound: this.lowerBound(incumbent),
      proven: isClosed(this.stage.prepared, this.bound, incumbent.weight),
      holds: true,
      tightest: incumbent.tightest,
      kinds: incumbent.counts.filter((n) => n > 0).length,
      parts: partsOf(incumbent),
      nodes: this.nodes,
      seconds: this.seconds(),
      gridPoints: this.stage.gridPoints,
    };
  }

  missing(reason: string, frequency_Hz: number | null, impossible: boolean): SearchResult {
    const lowerBound = this.lowerBound(null);
    return {
      found: false,
      mix: null,
      reason,
      frequency_Hz,
      impossible,
      lowerBound,
      nodes: this.nodes,
      seconds: this.seconds(),
    };
  }

  private lowerBound(incumbent: Incumbent | null): number {
    const { prepared } = this.stage;
    if (incumbent && isClosed(prepared, this.bound, incumbent.weight)) return this.weightOf(incumbent);
    return this.bound * prepared.unit;
  }

  private weightOf(incumbent: Incumbent): number {
    return Number((incumbent.weight * this.stage.prepared.unit).toPrecision(12));
  }

  /** In the order in which the candidates were given. */
  private mixOf({ counts }: Incumbent): MixEntry[] {
    const { parts, problem } = this.stage.prepared;
    const byId = new Map(parts.map((part, k) => [part.id, counts[k]]));
    return problem.candidates
      .map(({ id }) => ({ id, count: byId.get(id) ?? 0 }))
      .filter(({ count }) => count > 0);
  }
}

const partsOf = ({ counts }: Incumbent): number => counts.reduce((sum, n) => sum + n, 0);
