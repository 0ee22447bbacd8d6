import { formatDecibel, formatQuantity } from '@shared/units/format';
import type { BenchAnalysis } from '@workers/analysis/analysis.interface';
import type { ReactNode } from 'react';
import { Section } from '@/components/ui/page';
import { cx } from '@/lib/class-names';
import { formatCost } from '@/lib/format-cost';

interface SidePanelProps {
  analysis: BenchAnalysis | null;
  /** The values it was computed with, in words. */
  values: string;
  /** What does not hold besides. */
  failing: readonly string[];
  error: { message: string; field: string | null } | null;
  nameOf: (member: string | null) => string;
  /** What is said right after the breaks. */
  checks: ReactNode;
  children: ReactNode;
}

const SHOWN_BREAKS = 6;

/** What matters at the right: headroom, what breaks the surface and why, what the bank comes to. */
export function SidePanel({ analysis, values, failing, error, nameOf, checks, children }: SidePanelProps) {
  return (
    <div className="flex flex-col gap-7">
      {error && (
        <p role="alert" className="text-kingfisher">
          ▲ no result: {error.message}
        </p>
      )}
      {analysis && (
        <>
          <Section title={`headroom, ${values}`}>
            <p
              data-testid="headroom"
              aria-live="polite"
              className={cx('text-figure font-bold', analysis.holds ? 'text-reed' : 'text-kingfisher')}
            >
              {formatDecibel(
                analysis.tightest.headroom_dB,
                Math.abs(analysis.tightest.headroom_dB) < 0.095 ? 2 : 1,
              )}
            </p>
            <p className="text-stone">
              {analysis.holds ? 'holds' : 'short'}: {formatQuantity(analysis.tightest.impedance_ohm, 'Ω')} at{' '}
              {formatQuantity(analysis.tightest.frequency_Hz, 'Hz')}
            </p>
            {analysis.holds && failing.length > 0 && (
              <p className="text-small text-kingfisher">▲ not: {failing.join(', ')}</p>
            )}
          </Section>
          <Breaks analysis={analysis} nameOf={nameOf} />
        </>
      )}
      {checks}
      {analysis && (
        <Section title="bank">
          <dl className="grid grid-cols-[1fr_auto] gap-x-3">
            <dt>parts · kinds</dt>
            <dd className="text-right" data-testid="parts-kinds">
              {analysis.figures.parts} · {analysis.figures.kinds}
            </dd>
            <dt>cost</dt>
            <dd className="text-right">{formatCost(analysis.figures.cost)}</dd>
            <dt>area</dt>
            <dd className="text-right">{formatQuantity(analysis.figures.area_mm2, 'mm²')}</dd>
          </dl>
        </Section>
      )}
      {children}
    </div>
  );
}

function Breaks({
  analysis,
  nameOf,
}: {
  analysis: BenchAnalysis;
  nameOf: (member: string | null) => string;
}) {
  const { breaks } = analysis;
  if (breaks.length === 0)
    return (
      <Section title="breaks the surface">
        <p className="text-reed">▽ nothing in the band</p>
      </Section>
    );
  return (
    <Section title="breaks the surface">
      <ol className="flex flex-col gap-1">
        {breaks.slice(0, SHOWN_BREAKS).map((one, i) => (
          <li key={one.frequency_Hz}>
            <p className="flex justify-between gap-3">
              <span>
                {i + 1} {formatQuantity(one.frequency_Hz, 'Hz')}
              </span>
              <span className="text-kingfisher">{formatQuantity(one.impedance_ohm, 'Ω')}</span>
            </p>
            <p className="text-small text-stone">
              {one.inductive && one.capacitive
                ? `${nameOf(one.inductive)} against ${nameOf(one.capacitive)}`
                : one.inductive || one.capacitive
                  ? `${nameOf(one.inductive ?? one.capacitive)} alone`
                  : 'resistance'}
            </p>
          </li>
        ))}
      </ol>
      {breaks.length > SHOWN_BREAKS && (
        <p className="text-small text-stone">and {breaks.length - SHOWN_BREAKS} more</p>
      )}
    </Section>
  );
}
