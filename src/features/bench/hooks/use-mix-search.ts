import type { RailDocument } from '@shared/schemas/rail-document.schema';
import type { MixEntry, Objective, SearchProgress, SearchResult } from '@shared/search/problem';
import { SearchClient } from '@workers/search/search.client';
import { useCallback, useEffect, useRef, useState } from 'react';
import { boundText, weightText } from '../lib/mix';

export type MixSearchState =
  | { kind: 'idle' }
  | { kind: 'running'; progress: SearchProgress | null }
  | { kind: 'done'; result: SearchResult }
  /** Stopped by hand: what was known then. */
  | { kind: 'stopped'; progress: SearchProgress | null }
  | { kind: 'failed'; message: string };

const client = new SearchClient();
/** Long enough for most banks to be proven; the best mix and its bound stand when it ends. */
export const SEARCH_SECONDS = 120;

/**
 * Runs the mix search in its worker. The mix that stands so far is in the state's progress or result; `question` is what it
 * was asked, so that an answer to another question is not taken for one to this.
 */
export function useMixSearch() {
  const [state, setState] = useState<MixSearchState>({ kind: 'idle' });
  const [question, setQuestion] = useState<string | null>(null);
  const run = useRef(0);
  const start = useCallback(async (document: RailDocument) => {
    const mine = ++run.current;
    setQuestion(JSON.stringify(document));
    setState({ kind: 'running', progress: null });
    let last: SearchProgress | null = null;
    // Progress comes over a port of its own and may arrive after the answer: then it says nothing new.
    let answered = false;
    const answer = await client.search({ document, seconds: SEARCH_SECONDS, seed: 1 }, (progress) => {
      if (answered) return;
      last = progress;
      if (mine === run.current) setState({ kind: 'running', progress });
    });
    answered = true;
    if (mine !== run.current) return;
    if (answer.status === 'done') setState({ kind: 'done', result: answer.value });
    else if (answer.status === 'failed') setState({ kind: 'failed', message: answer.message });
    else setState({ kind: 'stopped', progress: last });
  }, []);
  const stop = useCallback(() => void client.cancel(), []);
  const reset = useCallback(() => {
    run.current++;
    void client.cancel();
    setState({ kind: 'idle' });
  }, []);
  useEffect(
    () => () => {
      run.current++;
      void client.cancel();
    },
    [],
  );
  return { state, question, start, stop, reset };
}

/** The mix that stands in a state, if there is one. */
export function mixIn(state: MixSearchState): MixEntry[] | null {
  if (state.kind === 'running' || state.kind === 'stopped') return state.progress?.mix ?? null;
  if (state.kind === 'done') return state.result.mix;
  return null;
}

/** What a search has shown, for beside a bank that was made from it. */
export function proofText(
  state: MixSearchState,
  objective: Objective,
  locked: number,
): { text: string; proven: boolean } {
  const beside = locked > 0 ? ` beside ${locked} locked` : '';
  if (state.kind !== 'done' || !state.result.found) return { text: 'stopped before a proof', proven: false };
  const { proven, weight, lowerBound } = state.result;
  const text = `${weightText(objective, weight)}${beside}`;
  return proven
    ? { text: `${text}, ${LEAST[objective]} possible, proven`, proven }
    : { text: `${text}, proven at least ${boundText(objective, lowerBound)}`, proven };
}

export const LEAST: Record<Objective, string> = { parts: 'fewest', cost: 'cheapest', area: 'smallest area' };
