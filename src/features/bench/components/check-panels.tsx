import { worstSwing_V } from '@shared/rail/time';
import { formatQuantity, formatVolts } from '@shared/units/format';
import type { RailInTime, RailVerdicts } from '@workers/checks/checks.interface';
import type { ReactNode } from 'react';
import { Section } from '@/components/ui/page';
import { cx } from '@/lib/class-names';
import { shareUnit } from '@/lib/shared-unit';
import type { BenchChecks } from '../hooks/use-checks';
import { whyPatternFails } from '../lib/pattern-words';
import { VerdictLine } from './verdict-line';

/** A faint word while an answer belongs to the bank before. */
const Pending = ({ when, children }: { when: boolean; children: ReactNode }) => (
  <div className={cx(when && 'opacity-60')} aria-busy={when || undefined}>
    {children}
  </div>
);

/** Headroom in every circumstance, one line each. */
export function WorstCasesPanel({
  checks: { verdicts },
  nameOf,
}: {
  checks: BenchChecks;
  nameOf: (part: string) => string;
}) {
  return (
    <Section title={<SectionLink to="worst-cases">worst cases</SectionLink>}>
      {verdicts.error && <p className="text-kingfisher">▲ {verdicts.error}</p>}
      {verdicts.value ? (
        <Pending when={!verdicts.current}>
          <VerdictList verdicts={verdicts.value} nameOf={nameOf} />
        </Pending>
      ) : (
        !verdicts.error && <p className="text-stone">working …</p>
      )}
    </Section>
  );
}

function VerdictList({ verdicts, nameOf }: { verdicts: RailVerdicts; nameOf: (part: string) => string }) {
  const { catalogue, service, corners, missing } = verdicts;
  const worst = corners[0];
  const open = missing.at(0);
  return (
    <dl data-testid="worst-cases">
      <VerdictLine name="catalogue" {...catalogue} headroom_dB={catalogue.tightest.headroom_dB} />
      <VerdictLine name="in service" {...service} headroom_dB={service.tightest.headroom_dB} />
      {worst && (
        <VerdictLine
          name={worst.name}
          title={`the worst of ${corners.length} corners: ${worst.name}`}
          holds={worst.holds}
          headroom_dB={worst.tightest.headroom_dB}
        />
      )}
      {open && (
        <VerdictLine
          name="one part open"
          title={`one ${nameOf(open.part)} open, in service`}
          holds={open.holds}
          headroom_dB={open.tightest?.headroom_dB ?? null}
        />
      )}
    </dl>
  );
}

/** Droop and worst pattern against the ripple allowed. */
export function LoadStepPanel({
  checks: { inTime },
  frequencyHolds,
  band_Hz,
}: {
  checks: BenchChecks;
  frequencyHolds: boolean | null;
  band_Hz: readonly [number, number];
}) {
  const time = inTime.value;
  const title = time?.load
    ? `load step ${formatQuantity(time.load.step_A, 'A', { trim: true })} in ${formatQuantity(time.load.rise_s, 's', { trim: true })}${time.assumed ? ' (assumed)' : ''}`
    : 'load step';
  return (
    <Section title={<SectionLink to="load-step">{title}</SectionLink>}>
      {inTime.error && <p className="text-kingfisher">▲ {inTime.error}</p>}
      {!time && !inTime.error && <p className="text-stone">working …</p>}
      {time && (
        <Pending when={!inTime.current}>
          {time.reason ? (
            <p className="text-stone">none: {time.reason}</p>
          ) : (
            <p className="text-small text-stone">in service, whichever values are shown</p>
          )}
          <dl data-testid="load-step">
            {time.step && (
              <AgainstAllowance name="droop" value_V={time.step.droop_V} allowance_V={time.allowance_V} />
            )}
            {time.step && (
              <AgainstAllowance
                name="overshoot"
                value_V={time.step.overshoot_V}
                allowance_V={time.allowance_V}
              />
            )}
            {time.worst_step && (
              <AgainstAllowance
                name="in the worst corner"
                title={`load step, ${time.worst_step.corner}`}
                value_V={Math.max(time.worst_step.droop_V, time.worst_step.overshoot_V)}
                allowance_V={time.allowance_V}
              />
            )}
            {time.pattern && (
              <AgainstAllowance
                name="worst pattern"
                value_V={worstSwing_V(time.pattern)}
                allowance_V={time.allowance_V}
              />
            )}
          </dl>
          <PatternWarning time={time} frequencyHolds={frequencyHolds} band_Hz={band_Hz} />
        </Pending>
      )}
    </Section>
  );
}

function PatternWarning({
  time,
  frequencyHolds,
  band_Hz,
}: {
  time: RailInTime;
  frequencyHolds: boolean | null;
  band_Hz: readonly [number, number];
}) {
  const why = whyPatternFails(time, frequencyHolds, band_Hz);
  return why ? <p className="mt-1 text-small text-kingfisher">▲ {why}</p> : null;
}

function AgainstAllowance({
  name,
  title,
  value_V,
  allowance_V,
}: {
  name: string;
  title?: string;
  value_V: number;
  allowance_V: number | null;
}) {
  const over = allowance_V !== null && value_V > allowance_V;
  return (
    <div className="flex items-baseline justify-between gap-3">
      <dt title={title}>{name}</dt>
      <dd className={cx('whitespace-nowrap', over && 'text-kingfisher')}>
        {over && <span aria-hidden>▲ </span>}
        {ofText(value_V, allowance_V)}
        {over && <span className="sr-only">: more than allowed</span>}
      </dd>
    </div>
  );
}

const ofText = (value_V: number, allowance_V: number | null): string =>
  allowance_V === null
    ? formatQuantity(value_V, 'V')
    : shareUnit(formatQuantity(value_V, 'V'), 'of', formatQuantity(allowance_V, 'V'));

/** What start-up takes, and what the bank stores. */
export function StartUpPanel({ checks: { inTime }, voltage_V }: { checks: BenchChecks; voltage_V: number }) {
  const start = inTime.value?.start_up;
  if (!start) return null;
  return (
    <Section title="inrush and energy">
      <p className="text-small text-stone">at most: upper tolerance, new, unbiased</p>
      <dl data-testid="start-up">
        <Row name={`charge to ${formatVolts(voltage_V)}`}>{formatQuantity(start.charge_C, 'C')}</Row>
        <Row name="stored energy">{formatQuantity(start.energy_J, 'J')}</Row>
        {start.current_A !== null ? (
          <div className="flex items-baseline justify-between gap-3">
            <dt>inrush</dt>
            <dd className={cx('whitespace-nowrap', start.holds ? 'text-reed' : 'text-kingfisher')}>
              <span aria-hidden>{start.holds ? '▽' : '▲'} </span>
              {formatQuantity(start.current_A, 'A')} of {formatQuantity(start.limit_A, 'A', { trim: true })}
            </dd>
          </div>
        ) : (
          <p className="text-small text-stone">
            State soft start and current limit in the specification to check the inrush.
          </p>
        )}
        {start.needed_s !== null && start.holds === false && (
          <Row name="soft start needed">{formatQuantity(start.needed_s, 's')}</Row>
        )}
      </dl>
    </Section>
  );
}

const Row = ({ name, children }: { name: string; children: ReactNode }) => (
  <div className="flex items-baseline justify-between gap-3">
    <dt>{name}</dt>
    <dd className="whitespace-nowrap">{children}</dd>
  </div>
);

function SectionLink({ to, children }: { to: string; children: ReactNode }) {
  return (
    <a href={`#${to}`} className="underline-offset-4 hover:underline">
      {children} <span aria-hidden>↓</span>
    </a>
  );
}
