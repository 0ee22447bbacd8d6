import type { YieldProgress } from '@shared/engine/yield';
import { type RailYield, railYield } from '@shared/rail/yield';
import { type Answer, done } from '../host/answer';
import { refusal } from '../host/guard';
import { pause } from '../host/pause';
import type { YieldApi, YieldRequest } from './yield.interface';

/** Draws between two pauses: a few hundredths of a second. */
const CHUNK = 250;

/** Runs one Monte Carlo at a time, pausing so that a cancel is heard. */
export class Yield implements YieldApi {
  private current = 0;

  async run(
    { document, draws, seed }: YieldRequest,
    onProgress: (progress: YieldProgress) => void,
  ): Promise<Answer<RailYield>> {
    const run = ++this.current;
    try {
      const steps = railYield(document, { draws, seed, chunk: CHUNK });
      for (;;) {
        const step = steps.next();
        if (step.done) return done(step.value);
        onProgress(step.value);
        await pause();
        if (run !== this.current) return { status: 'stale' };
      }
    } catch (error) {
      return refusal(error);
    }
  }

  async cancel(): Promise<void> {
    this.current++;
  }
}
