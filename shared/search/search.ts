import { MixStage } from './mix-stage';
import { Portfolio } from './portfolio';
import { prepare } from './prepare';
import type { MixProblem, SearchOptions, SearchProgress, SearchResult } from './problem';
import { outOfReach } from './reach';
import { explainExhausted, explainReach, explainTimeout } from './reason';
import { Reporter } from './report';

/** Rounds of destroy and repair before the proof begins, and at most after each pass. */
const FIRST_ROUNDS = 150;
/** Row evaluations that the first rounds may cost together: about 0.2 s. */
const FIRST_WORK = 1e8;

/**
 * Searches for the lightest mix and proves it (portfolio.ts). A generator, so that a worker can look for a
 * cancel between steps: it yields at least every 30 ms or so, and whenever a better mix or a better bound is there.
 */
export function* searchMix(
  problem: MixProblem,
  options: SearchOptions = {},
): Generator<SearchProgress, SearchResult, void> {
  const now = options.now ?? Date.now;
  const start = now();
  const prepared = prepare(problem);
  const stage = new MixStage(prepared, options.gridPoints ?? 160, options.seed ?? 1);
  const report = new Reporter(stage, () => (now() - start) / 1000);
  const limit = options.seconds ?? 60;
  const isOver = (): boolean => report.seconds() >= limit;

  const reach = outOfReach(prepared, stage.rows);
  if (reach) {
    const reason = explainReach(prepared, stage.rows, reach);
    return report.missing(reason, stage.rows.frequency_Hz[reach.row], true);
  }
  stage.growFirst(0);
  yield report.progress('mix');
  if (prepared.maxKinds < prepared.parts.length)
    for (const _ of stage.eliminateKinds()) if (report.isDue()) yield report.progress('mix');
  const rounds = Math.min(FIRST_ROUNDS, FIRST_WORK / (stage.rows.size * prepared.parts.length * 200));
  for (let round = 0; round < rounds && !isOver(); round++)
    if (stage.improve() || report.isDue()) yield report.progress('mix');

  const proof = new Portfolio(stage);
  const slice = options.nodeSlice ?? 2048;
  while (!isOver() && !proof.isClosed) {
    const bound = proof.bound;
    const weight = stage.incumbent?.weight;
    if (proof.step(slice) === 'exhausted')
      return report.missing(
        explainExhausted(prepared, stage.closest),
        stage.closest?.frequency_Hz ?? null,
        true,
      );
    report.bound = proof.bound;
    report.nodes = proof.nodes;
    if (bound !== proof.bound || weight !== stage.incumbent?.weight || report.isDue())
      yield report.progress('proof');
  }
  if (stage.incumbent) return report.found(stage.incumbent);
  const reason = explainTimeout(prepared, report.seconds(), stage.closest);
  return report.missing(reason, stage.closest?.frequency_Hz ?? null, false);
}

/** Runs a search to its end. */
export function runSearch(
  problem: MixProblem,
  options?: SearchOptions,
  onProgress?: (progress: SearchProgress) => void,
): SearchResult {
  const search = searchMix(problem, options);
  for (;;) {
    const step = search.next();
    if (step.done) return step.value;
    onProgress?.(step.value);
  }
}
