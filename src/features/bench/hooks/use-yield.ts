import type { YieldProgress } from '@shared/engine/yield';
import type { RailYield } from '@shared/rail/yield';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import { YieldClient } from '@workers/yield/yield.client';
import { useCallback, useEffect, useRef, useState } from 'react';

export const YIELD_DRAWS = 10_000;

export type YieldState =
  | { kind: 'idle' }
  | { kind: 'running'; progress: YieldProgress | null }
  | { kind: 'done'; result: RailYield; question: string }
  | { kind: 'failed'; message: string };

const client = new YieldClient();

/** Monte Carlo on demand; its answer stays beside the question that it was asked, so that an older one shows as such. */
export function useYield() {
  const [state, setState] = useState<YieldState>({ kind: 'idle' });
  /** How far a draw had come that was stopped; null: none was. */
  const [stoppedAt, setStoppedAt] = useState<number | null>(null);
  const done = useRef(0);
  const run = useRef(0);
  const start = useCallback(async (document: RailDocument, seed: number) => {
    const mine = ++run.current;
    const question = yieldQuestion(document);
    setState({ kind: 'running', progress: null });
    setStoppedAt(null);
    done.current = 0;
    const answer = await client.run({ document, draws: YIELD_DRAWS, seed }, (progress) => {
      if (mine !== run.current) return;
      done.current = progress.done;
      setState({ kind: 'running', progress });
    });
    if (mine !== run.current) return;
    run.current++;
    if (answer.status === 'done') setState({ kind: 'done', result: answer.value, question });
    else if (answer.status === 'failed') setState({ kind: 'failed', message: answer.message });
    else setState({ kind: 'idle' });
  }, []);
  const stop = useCallback(() => {
    run.current++;
    void client.cancel();
    setStoppedAt(done.current);
    setState({ kind: 'idle' });
  }, []);
  useEffect(
    () => () => {
      run.current++;
      void client.cancel();
    },
    [],
  );
  return { state, stoppedAt, start, stop };
}

export const yieldQuestion = (document: RailDocument): string => JSON.stringify(document);
