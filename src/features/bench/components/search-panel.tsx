import type { Part } from '@shared/schemas/part.schema';
import type { SearchSettings } from '@shared/schemas/rail.schema';
import { formatDecibel, formatLength } from '@shared/units/format';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { QuantityInput } from '@/components/ui/quantity-input';
import { LEAST, type MixSearchState, mixIn } from '../hooks/use-mix-search';
import { MOST_DISTANCE_M } from '../lib/limits';
import { CandidatesDialog } from './candidates-dialog';
import { ProofMeter } from './proof-meter';
import { WholeField } from './whole-field';

interface SearchPanelProps {
  settings: SearchSettings;
  /** Where parts new to the bank go when the settings do not say. */
  newPartDistance_m: number | null;
  candidates: readonly Part[] | undefined;
  candidatesError: string | null;
  state: MixSearchState;
  /** Capacitors on locked lines: they stay and are not counted in the mix. */
  locked: number;
  previewing: boolean;
  /** The rail, a mount, a distance, a lock or a limit has changed since: the answer is to another question. */
  outdated: boolean;
  /** Which values of the parts the mix has to hold with. */
  values: string;
  /** What was adopted, while the bank is still that. */
  adopted: { text: string; proven: boolean } | null;
  readOnly: boolean;
  onSettings: (settings: SearchSettings) => void;
  onSearch: () => void;
  onStop: () => void;
  onPreview: (on: boolean) => void;
  onAdopt: () => void;
  onDismiss: () => void;
}

/** The mix search: what is asked, the proof as it closes, and what to do with the answer. */
export function SearchPanel(props: SearchPanelProps) {
  const { settings, candidates, state, previewing, readOnly } = props;
  const [choosing, setChoosing] = useState(false);
  const [faulty, setFaulty] = useState(false);
  const running = state.kind === 'running';
  const mix = mixIn(state);
  const among = settings.candidateIds?.length ?? candidates?.length ?? 0;
  return (
    <div className="flex flex-col gap-3">
      {(state.kind === 'idle' || state.kind === 'failed') && (
        <>
          <SettingsForm
            settings={settings}
            newPartDistance_m={props.newPartDistance_m}
            onSettings={props.onSettings}
            onFault={setFaulty}
          />
          <button
            type="button"
            className="w-fit text-left text-deep underline-offset-4 hover:underline disabled:text-stone"
            disabled={!candidates}
            onClick={() => setChoosing(true)}
          >
            among {candidates ? `${among} parts` : '…'}
            {settings.candidateIds === null && candidates ? ' (all approved and rated)' : ''}
          </button>
        </>
      )}
      <p className="text-small text-stone">the mix has to hold {props.values}</p>
      <Outcome state={state} objective={settings.minimise} locked={props.locked} />
      {props.outdated && (
        <Notice tone="caution" title="! outdated">
          The rail, a mount, a distance, a limit or the values have changed since this search began. Search
          again.
        </Notice>
      )}
      {props.adopted && (
        <p className={props.adopted.proven ? 'text-reed' : 'text-brass'}>
          {props.adopted.proven ? '▽' : '!'} the bank is the mix found: {props.adopted.text}
        </p>
      )}
      {state.kind === 'failed' && <Notice tone="error">{state.message}</Notice>}
      {props.candidatesError && <Notice tone="error">{props.candidatesError}</Notice>}
      {candidates?.length === 0 && (
        <p className="text-small text-brass">
          ! no approved part is rated for this rail: approve one in the library first
        </p>
      )}
      <div className="flex flex-wrap gap-2">
        {running && <Button onClick={props.onStop}>Stop</Button>}
        {!running && mix && !previewing && !props.outdated && (
          <Button variant="primary" onClick={() => props.onPreview(true)}>
            Preview the mix
          </Button>
        )}
        {previewing && (
          <>
            {!readOnly && !props.outdated && (
              <Button variant="primary" onClick={props.onAdopt}>
                Adopt
              </Button>
            )}
            <Button onClick={() => props.onPreview(false)}>Back to the bank</Button>
          </>
        )}
        {!running && props.outdated && (
          <Button variant="primary" disabled={!candidates} onClick={props.onSearch}>
            Search again
          </Button>
        )}
        {!running && state.kind !== 'idle' && !previewing && (
          <Button onClick={props.onDismiss}>Dismiss</Button>
        )}
        {(state.kind === 'idle' || state.kind === 'failed') && (
          <Button
            variant="primary"
            disabled={!candidates || candidates.length === 0 || faulty || props.candidatesError !== null}
            onClick={props.onSearch}
          >
            Search the smallest mix
          </Button>
        )}
      </div>
      {choosing && candidates && (
        <CandidatesDialog
          open
          parts={candidates}
          chosen={settings.candidateIds}
          onClose={() => setChoosing(false)}
          onChoose={(candidateIds) => {
            props.onSettings({ ...settings, candidateIds });
            setChoosing(false);
          }}
        />
      )}
    </div>
  );
}

function Outcome({
  state,
  objective,
  locked,
}: {
  state: MixSearchState;
  objective: SearchSettings['minimise'];
  locked: number;
}) {
  if (state.kind === 'done' && !state.result.found)
    return (
      <Notice tone="caution" title={state.result.impossible ? '▲ no mix can hold' : '! none found'}>
        {state.result.reason}
      </Notice>
    );
  if (state.kind === 'done' && state.result.found) {
    const { result } = state;
    return (
      <div aria-live="polite" className="flex flex-col gap-2">
        <ProofMeter objective={objective} {...result} />
        <p className={result.proven ? 'font-semibold text-reed' : 'text-brass'}>
          {result.proven
            ? `▽ ${LEAST[objective]} possible, proven`
            : '! time is up: a smaller mix is not ruled out'}
        </p>
        <p className="text-small text-stone">
          {result.parts} parts, {result.kinds} kinds{locked > 0 && `, beside ${locked} locked`} · headroom{' '}
          {formatDecibel(result.tightest.headroom_dB, 2)} · {result.seconds.toFixed(1)} s ·{' '}
          {result.nodes.toLocaleString('en-GB')} nodes
        </p>
      </div>
    );
  }
  if (state.kind === 'running' || state.kind === 'stopped') {
    const { progress } = state;
    if (!progress)
      return (
        <p className="text-stone">
          {state.kind === 'running' ? 'searching …' : 'stopped before a mix was found'}
        </p>
      );
    return (
      <div className="flex flex-col gap-2">
        <ProofMeter
          objective={objective}
          weight={progress.weight}
          lowerBound={progress.lowerBound}
          proven={false}
        />
        <p className="text-small text-stone">
          {state.kind === 'stopped' ? 'stopped' : progress.phase === 'mix' ? 'improving the mix' : 'proving'}{' '}
          · {progress.seconds.toFixed(1)} s
        </p>
      </div>
    );
  }
  return null;
}

function SettingsForm({
  settings,
  newPartDistance_m,
  onSettings,
  onFault,
}: {
  settings: SearchSettings;
  newPartDistance_m: number | null;
  onSettings: (settings: SearchSettings) => void;
  onFault: (faulty: boolean) => void;
}) {
  const [faults, setFaults] = useState<Record<string, boolean>>({});
  const tellFault = (field: string, faulty: boolean) => {
    const next = { ...faults, [field]: faulty };
    setFaults(next);
    onFault(Object.values(next).some(Boolean));
  };
  return (
    <div className="grid grid-cols-2 gap-3">
      <div className="col-span-2">
        <Field label="the mix with">
          {(control) => (
            <Select
              {...control}
              value={settings.minimise}
              onChange={(event) =>
                onSettings({ ...settings, minimise: event.target.value as SearchSettings['minimise'] })
              }
            >
              <option value="parts">fewest parts</option>
              <option value="cost">lowest cost</option>
              <option value="area">smallest area</option>
            </Select>
          )}
        </Field>
      </div>
      <WholeField
        label="kinds at most"
        value={settings.max_kinds}
        most={100}
        emptyMeans="any"
        onChange={(max_kinds) => onSettings({ ...settings, max_kinds })}
        onFault={(faulty) => tellFault('kinds', faulty)}
      />
      <WholeField
        label="each at most"
        value={settings.max_per_part}
        most={999}
        onChange={(max_per_part) => max_per_part !== null && onSettings({ ...settings, max_per_part })}
        onFault={(faulty) => tellFault('each', faulty)}
      />
      <div className="col-span-2">
        <Field
          label="new parts at a distance of"
          hint={newPartDistance_m === null ? 'none planned: no path is added' : undefined}
        >
          {(control) => (
            <QuantityInput
              {...control}
              unit="mm"
              showFault
              most={MOST_DISTANCE_M}
              value={settings.distance_m}
              placeholder={
                newPartDistance_m === null
                  ? 'not planned'
                  : `${formatLength(newPartDistance_m)} (farthest line)`
              }
              onCommit={(distance_m) => onSettings({ ...settings, distance_m })}
            />
          )}
        </Field>
      </div>
    </div>
  );
}
