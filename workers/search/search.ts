import { mixProblem } from '@shared/rail/mix-problem';
import type { SearchProgress, SearchResult } from '@shared/search/problem';
import { searchMix } from '@shared/search/search';
import { type Answer, done } from '../host/answer';
import { refusal } from '../host/guard';
import { pause } from '../host/pause';
import type { SearchApi, SearchRequest } from './search.interface';

/** Runs one mix search at a time, pausing between its steps so that a cancel is heard. */
export class Search implements SearchApi {
  private run = 0;

  async search(
    request: SearchRequest,
    onProgress: (progress: SearchProgress) => void,
  ): Promise<Answer<SearchResult>> {
    const run = ++this.run;
    try {
      const steps = searchMix(mixProblem(request.document), {
        seconds: request.seconds,
        seed: request.seed,
        now: () => performance.now(),
      });
      for (;;) {
        const step = steps.next();
        if (step.done) return done(step.value);
        onProgress(step.value);
        await pause();
        if (run !== this.run) return { status: 'stale' };
      }
    } catch (error) {
      return refusal(error);
    }
  }

  async cancel(): Promise<void> {
    this.run++;
  }
}
