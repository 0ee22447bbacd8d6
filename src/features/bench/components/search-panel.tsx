import type { Part } from '@shared/schemas/part.schema';
import type { SearchSettings } from '@shared/schemas/rail.schema';
import { formatDecibel, formatLength, formatQuantity } from '@shared/units/format';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input, Select } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { QuantityInput } from '@/components/ui/quantity-input';
import { type MixSearchState, mixIn } from '../hooks/use-mix-search';
import { CandidatesDialog } from './candidates-dialog';
import { ProofMeter } from './proof-meter';

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
      <Outcome state={state} objective={settings.minimise} locked={props.locked} />
      {state.kind === 'failed' && <Notice tone="error">{state.message}</Notice>}
      {props.candidatesError && <Notice tone="error">{props.candidatesError}</Notice>}
      {candidates?.length === 0 && (
        <p className="text-small text-brass">
          ! no approved part is rated for this rail: approve one in the library first
        </p>
      )}
      <div className="flex flex-wrap gap-2">
        {running && <Button onClick={props.onStop}>Stop</Button>}
        {!running && mix && !previewing && (
          <Button variant="primary" onClick={() => props.onPreview(true)}>
            Preview the mix
          </Button>
        )}
        {previewing && (
          <>
            {!readOnly && (
              <Button variant="primary" onClick={props.onAdopt}>
                Adopt
              </Button>
            )}
            <Button onClick={() => props.onPreview(false)}>Back to the bank</Button>
          </>
        )}
        {!running && state.kind !== 'idle' && !previewing && (
          <Button onClick={props.onDismiss}>Dismiss</Button>
        )}
        {(state.kind === 'idle' || state.kind === 'failed') && (
          <Button
            variant="primary"
            disabled={!candidates || candidates.length === 0}
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
        {state.result.frequency_Hz !== null && ` (${formatQuantity(state.result.frequency_Hz, 'Hz')})`}
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

const LEAST = { parts: 'fewest', cost: 'cheapest', area: 'smallest area' } as const;

function SettingsForm({
  settings,
  newPartDistance_m,
  onSettings,
}: {
  settings: SearchSettings;
  newPartDistance_m: number | null;
  onSettings: (settings: SearchSettings) => void;
}) {
  const whole = (text: string, most: number) => {
    const value = Number(text);
    return /^\d+$/.test(text) && value >= 1 && value <= most ? value : null;
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
      <Field label="kinds at most">
        {(control) => (
          <Input
            {...control}
            inputMode="numeric"
            placeholder="any"
            defaultValue={settings.max_kinds ?? ''}
            onChange={(event) =>
              onSettings({ ...settings, max_kinds: whole(event.target.value.trim(), 100) })
            }
          />
        )}
      </Field>
      <Field label="each at most">
        {(control) => (
          <Input
            {...control}
            inputMode="numeric"
            defaultValue={settings.max_per_part}
            onChange={(event) => {
              const max_per_part = whole(event.target.value.trim(), 999);
              if (max_per_part !== null) onSettings({ ...settings, max_per_part });
            }}
          />
        )}
      </Field>
      <div className="col-span-2">
        <Field
          label="new parts at a distance of"
          hint={newPartDistance_m === null ? 'none planned: no path is added' : undefined}
        >
          {(control) => (
            <QuantityInput
              {...control}
              unit="mm"
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
