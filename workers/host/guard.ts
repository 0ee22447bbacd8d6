import { EngineError } from '@shared/engine/errors';
import { type Answer, done, failed } from './answer';

/** Runs `work` and turns what it throws into a tagged answer that names the field at fault. */
export function guard<T>(work: () => T): Answer<T> {
  try {
    return done(work());
  } catch (error) {
    return refusal(error);
  }
}

export function refusal(error: unknown): Answer<never> {
  if (error instanceof EngineError) return failed(error.message, error.field, error.frequency_Hz ?? null);
  return failed(error instanceof Error ? error.message : String(error));
}
