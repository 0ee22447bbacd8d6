import type { RailYield } from '@shared/rail/yield';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import { formatDecibel, formatFixed } from '@shared/units/format';
import { useState } from 'react';
import { Histogram } from '@/components/chart/histogram';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { useYield, YIELD_DRAWS, yieldQuestion } from '../hooks/use-yield';
import { WholeField } from './whole-field';

const SHOWN_INFLUENCES = 5;
const MOST_SEED = 999_999;
const VALUE_NAMES = { capacitance: 'C', esr: 'ESR', esl: 'ESL' } as const;

/** Monte Carlo over tolerances: the share of boards that hold, how headroom spreads, and whose tolerance matters. */
export function YieldSection({
  document,
  nameOf,
}: {
  document: RailDocument;
  nameOf: (part: string) => string;
}) {
  const { state, stoppedAt, start, stop } = useYield();
  const [seed, setSeed] = useState(1);
  const [faulty, setFaulty] = useState(false);
  if (state.kind === 'running')
    return (
      <div className="flex flex-wrap items-center gap-4">
        <Progress done={state.progress?.done ?? 0} />
        <Button onClick={stop}>Stop</Button>
      </div>
    );
  const isOld = state.kind === 'done' && state.question !== yieldQuestion(document);
  return (
    <div className="flex flex-col gap-3">
      {state.kind === 'failed' && <Notice tone="error">{state.message}</Notice>}
      {isOld && (
        <Notice tone="caution" title="! outdated">
          The rail or its bank has changed since. Draw again.
        </Notice>
      )}
      {state.kind === 'done' && (
        <div className={isOld ? 'opacity-60' : undefined}>
          <YieldResultView result={state.result} nameOf={nameOf} />
        </div>
      )}
      {stoppedAt !== null && (
        <p className="text-stone">Stopped after {stoppedAt} boards; a part of a draw is not kept.</p>
      )}
      <div className="flex flex-wrap items-end gap-4">
        <Button disabled={faulty} onClick={() => void start(document, seed)}>
          {state.kind === 'done' ? 'Draw again' : `Draw ${YIELD_DRAWS} boards`}
        </Button>
        <div className="w-32">
          <WholeField
            label="seed: same seed, same draw"
            value={seed}
            most={MOST_SEED}
            onChange={(value) => setSeed(value ?? 1)}
            onFault={setFaulty}
          />
        </div>
      </div>
    </div>
  );
}

function Progress({ done }: { done: number }) {
  return (
    <>
      <div
        role="progressbar"
        aria-label="boards drawn"
        aria-valuemin={0}
        aria-valuemax={YIELD_DRAWS}
        aria-valuenow={done}
        className="h-2.5 w-60 border border-ink"
      >
        <div className="h-full bg-deep" style={{ width: `${(100 * done) / YIELD_DRAWS}%` }} />
      </div>
      <span>
        {done} of {YIELD_DRAWS}
      </span>
    </>
  );
}

const percent = (share: number, decimals = 1) => `${formatFixed(100 * share, decimals)}\u00a0%`;

function YieldResultView({ result, nameOf }: { result: RailYield; nameOf: (part: string) => string }) {
  const { headroom_dB, influence } = result;
  const at = (q: number) => headroom_dB[Math.min(headroom_dB.length - 1, Math.floor(q * headroom_dB.length))];
  const shown = influence.slice(0, SHOWN_INFLUENCES);
  const rest = 1 - shown.reduce((sum, one) => sum + one.share, 0);
  return (
    <div className="grid gap-x-10 gap-y-4 xl:grid-cols-[minmax(0,1fr)_20rem]">
      <div className="min-w-0">
        <p data-testid="yield" className="mb-2">
          <strong className={result.yield > 0.5 ? 'text-reed' : 'text-kingfisher'}>
            {percent(result.yield, 2)}
          </strong>{' '}
          of {result.draws} boards hold; with 95 % confidence between {percent(result.low, 2)} and{' '}
          {percent(result.high, 2)} (seed {result.seed})
        </p>
        <Histogram
          values={headroom_dB}
          threshold={0}
          unit="dB"
          label={`headroom of ${result.draws} boards: from ${formatDecibel(at(0))} to ${formatDecibel(at(1))}`}
        />
        <p className="text-small text-stone">
          headroom: 1 % of boards below {formatDecibel(at(0.01), 2)}, half below {formatDecibel(at(0.5), 2)},
          99 % below {formatDecibel(at(0.99), 2)}
        </p>
      </div>
      <div>
        <p className="section-head mb-1">whose tolerance matters: share of the headroom’s variance</p>
        <ol>
          {shown.map((one) => (
            <li key={`${one.line} ${one.value}`} className="flex justify-between gap-3">
              <span className="min-w-0 truncate">
                {VALUE_NAMES[one.value]} of {nameOf(one.part)}
              </span>
              <span>{percent(one.share, 0)}</span>
            </li>
          ))}
        </ol>
        {rest > 0.005 && (
          <p className="flex justify-between gap-3 text-stone">
            <span>all others, and what they do together</span>
            <span>{percent(rest, 0)}</span>
          </p>
        )}
      </div>
    </div>
  );
}
