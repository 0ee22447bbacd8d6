import type { RailYield } from '@shared/rail/yield';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import { formatDecibel, formatFixed } from '@shared/units/format';
import { Histogram } from '@/components/chart/histogram';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { useYield, YIELD_DRAWS, yieldQuestion } from '../hooks/use-yield';

const SHOWN_INFLUENCES = 5;
const VALUE_NAMES = { capacitance: 'C', esr: 'ESR', esl: 'ESL' } as const;

/** Monte Carlo over tolerances: the share of boards that hold, how headroom spreads, and whose tolerance matters. */
export function YieldSection({
  document,
  nameOf,
}: {
  document: RailDocument;
  nameOf: (part: string) => string;
}) {
  const { state, start, stop } = useYield();
  const begin = () => void start(document, 1);
  if (state.kind === 'running') {
    const done = state.progress?.done ?? 0;
    return (
      <div className="flex flex-wrap items-center gap-4">
        <progress max={YIELD_DRAWS} value={done} aria-label="draws" className="w-60 accent-deep" />
        <span>
          {done} of {YIELD_DRAWS}
        </span>
        <Button onClick={stop}>Stop</Button>
      </div>
    );
  }
  return (
    <div className="flex flex-col gap-3">
      {state.kind === 'failed' && <Notice tone="error">{state.message}</Notice>}
      {state.kind === 'done' && state.question !== yieldQuestion(document) && (
        <Notice tone="caution" title="! outdated">
          The rail or its bank has changed since. Draw again.
        </Notice>
      )}
      {state.kind === 'done' && <YieldResultView result={state.result} nameOf={nameOf} />}
      <Button className="w-fit" onClick={begin}>
        {state.kind === 'done' ? 'Draw again' : `Draw ${YIELD_DRAWS} boards`}
      </Button>
    </div>
  );
}

const percent = (share: number, decimals = 1) => `${formatFixed(100 * share, decimals)}\u00a0%`;

function YieldResultView({ result, nameOf }: { result: RailYield; nameOf: (part: string) => string }) {
  const { headroom_dB, influence } = result;
  const at = (q: number) => headroom_dB[Math.min(headroom_dB.length - 1, Math.floor(q * headroom_dB.length))];
  return (
    <div className="grid gap-x-10 gap-y-4 xl:grid-cols-[minmax(0,1fr)_20rem]">
      <div>
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
          {influence.slice(0, SHOWN_INFLUENCES).map((one) => (
            <li key={`${one.line} ${one.value}`} className="flex justify-between gap-3">
              <span className="min-w-0 truncate">
                {VALUE_NAMES[one.value]} of {nameOf(one.part)}
              </span>
              <span>{percent(one.share, 0)}</span>
            </li>
          ))}
        </ol>
      </div>
    </div>
  );
}
