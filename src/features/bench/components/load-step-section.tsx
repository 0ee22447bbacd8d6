import { formatQuantity } from '@shared/units/format';
import type { RailInTime } from '@workers/checks/checks.interface';
import { useMemo, useState } from 'react';
import { TimeChart } from '@/components/chart/time-chart';
import { WordChoice } from '@/components/ui/word-choice';
import { type StepWindow, stepWindows } from '../lib/step-windows';

/** The voltage over time for the load step, and for the pattern of the load that adds up all swings. */
export function LoadStepSection({ time }: { time: RailInTime }) {
  return (
    <div className="flex flex-col gap-8">
      {time.approximated.length > 0 && (
        <p className="text-small text-brass">
          ≈ In time, {time.approximated.join(', ')} {time.approximated.length === 1 ? 'is' : 'are'} taken as
          the series R–L–C that fits the table or the ESR curve best.
        </p>
      )}
      <Step time={time} />
      <Pattern time={time} />
    </div>
  );
}

function Step({ time: { step, load, allowance_V } }: { time: RailInTime }) {
  const [name, setName] = useState<StepWindow['name']>('rise');
  const windows = useMemo(() => (step && load ? stepWindows(step, load) : []), [step, load]);
  const deviation = useMemo(() => step?.voltage_V.map((v) => v - step.settled_V), [step]);
  if (!step || !load || !deviation) return null;
  const shown = windows.find((one) => one.name === name) ?? windows[0];
  const { before_A, step_A, rise_s, hold_s, fall_s } = load;
  return (
    <div>
      <div className="mb-2 flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <p className="text-small text-stone">
          departure from the settled {formatQuantity(step.settled_V, 'V', { digits: 4 })}; from{' '}
          {formatQuantity(before_A, 'A', { trim: true })} by {formatQuantity(step_A, 'A', { trim: true })} up
          in {formatQuantity(rise_s, 's', { trim: true })}, held {formatQuantity(hold_s, 's', { trim: true })}
          , back in {formatQuantity(fall_s, 's', { trim: true })}
        </p>
        <WordChoice
          legend="stretch of time shown"
          options={windows.map((one) => [one.name, one.label] as const)}
          value={shown.name}
          onChoice={setName}
          className="text-small"
        />
      </div>
      <TimeChart
        time_s={step.time_s}
        deviation_V={deviation}
        span_s={shown.span_s}
        origin_s={shown.origin_s}
        allowance_V={allowance_V}
        marks={[
          {
            time_s: step.droop_time_s,
            value_V: -step.droop_V,
            label: `droop ${formatQuantity(step.droop_V, 'V')} at ${formatQuantity(step.droop_time_s, 's')}`,
          },
          ...(step.overshoot_V > 0
            ? [
                {
                  time_s: step.overshoot_time_s,
                  value_V: step.overshoot_V,
                  label: `overshoot ${formatQuantity(step.overshoot_V, 'V')}`,
                },
              ]
            : []),
        ]}
        load={[
          [0, before_A],
          [rise_s, before_A + step_A],
          [rise_s + hold_s, before_A + step_A],
          [rise_s + hold_s + fall_s, before_A],
        ]}
        label={`voltage after the load step: droop ${formatQuantity(step.droop_V, 'V')}, overshoot ${formatQuantity(step.overshoot_V, 'V')}`}
      />
    </div>
  );
}

const WAYS = [
  ['fall', 'furthest down'],
  ['rise', 'furthest up'],
] as const;

function Pattern({ time: { pattern, step, load, allowance_V, limit_Hz } }: { time: RailInTime }) {
  const [way, setWay] = useState<'fall' | 'rise'>('fall');
  if (!pattern || !load) return null;
  const run = pattern[way];
  const sign = way === 'fall' ? -1 : 1;
  const ringsOn =
    step !== null && (step.droop_V > pattern.fall.bound_V || step.overshoot_V > pattern.rise.bound_V);
  return (
    <div>
      <div className="mb-2 flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
        <p className="max-w-4xl text-small text-stone">
          Worst pattern: leaving still what rings above {formatQuantity(limit_Hz, 'Hz', { trim: true })}, no
          load between 0 and {formatQuantity(load.step_A, 'A', { trim: true })} with edges of{' '}
          {formatQuantity(load.rise_s, 's', { trim: true })} takes the rail further down than{' '}
          <strong className="text-ink">{formatQuantity(pattern.fall.bound_V, 'V')}</strong> from its voltage
          without load, or further up than{' '}
          <strong className="text-ink">{formatQuantity(pattern.rise.bound_V, 'V')}</strong>. The pattern drawn
          has {run.edges.length} edges, each timed so that its swing adds to those before, and comes to{' '}
          {formatQuantity(run.simulated_V, 'V')}. Higher up neither the load nor a network of lumped parts
          says anything.
          {ringsOn && ' The load step above goes further, since it rings up there as well.'}
        </p>
        <WordChoice
          legend="direction of the worst pattern"
          options={WAYS}
          value={way}
          onChoice={setWay}
          className="text-small whitespace-nowrap"
        />
      </div>
      {run.edges.length > 0 && (
        <TimeChart
          time_s={run.time_s}
          deviation_V={run.deviation_V}
          span_s={[run.time_s[0], run.time_s[run.time_s.length - 1]]}
          allowance_V={allowance_V}
          levels={[
            {
              value_V: sign * run.bound_V,
              label: `bound ${way === 'fall' ? '−' : '+'}${formatQuantity(run.bound_V, 'V')}`,
            },
          ]}
          load={run.corners}
          label={`voltage under the worst pattern: ${formatQuantity(run.simulated_V, 'V')} ${way === 'fall' ? 'down' : 'up'}`}
        />
      )}
    </div>
  );
}
