import { boundAbove, budgetBelow, isClosed, nextBudget } from './budget';
import { MixStage } from './mix-stage';
import { prepare } from './prepare';
import type { MixProblem, SearchOptions, SearchProgress, SearchResult } from './problem';
import { ProofPass } from './proof';
import { outOfReach } from './reach';
import { explainExhausted, explainReach, explainTimeout } from './reason';
import { Reporter } from './report';

/** Rounds of destroy and repair before the proof begins, and at most after each pass. */
const FIRST_ROUNDS = 60;
/** Row evaluations that the first rounds may cost together: about 0.2 s. */
const FIRST_WORK = 4e7;

/**
 * Searches for the lightest mix and proves it (see the design in proof.ts). A generator, so that a worker can look for a
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
  const rounds = Math.min(FIRST_ROUNDS, FIRST_WORK / (stage.rows.size * prepared.parts.length * 200));
  for (let round = 0; round < rounds && !isOver(); round++)
    if (stage.improve() || report.isDue()) yield report.progress('mix');

  const pass = new ProofPass(prepared, stage.rows);
  const slice = options.nodeSlice ?? 2048;
  const most = prepared.parts.reduce((sum, part) => sum + part.max * part.weight, 0);
  const stride = 1 / 3;
  for (;;) {
    const { incumbent } = stage;
    if (incumbent && isClosed(prepared, report.bound, incumbent.weight)) break;
    if (!incumbent && report.bound > most) return report.missing(explainExhausted(stage.closest), null, true);
    if (isOver()) break;
    pass.start(nextBudget(prepared, report.bound, incumbent?.weight ?? null, most, stride));
    for (;;) {
      const state = pass.run(slice);
      report.nodes = pass.nodes;
      if (state === 'done') break;
      if (state === 'found') {
        const mix = pass.mix();
        const weight = mix.reduce((sum, n, k) => sum + n * prepared.parts[k].weight, 0);
        const answer = stage.offer(mix, weight);
        if (answer === 'grown') pass.setRows(stage.rows);
        if (answer === 'held') pass.accept(budgetBelow(prepared, weight));
        else pass.reject();
      }
      if (isOver()) break;
      yield report.progress('proof');
    }
    if (isOver()) break;
    report.bound = Math.max(report.bound, boundAbove(prepared, pass.budget));
    yield report.progress('proof');
  }
  const { incumbent } = stage;
  if (!incumbent)
    return report.missing(
      explainTimeout(report.seconds(), stage.closest),
      stage.closest?.frequency_Hz ?? null,
      false,
    );
  return report.found(incumbent);
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
