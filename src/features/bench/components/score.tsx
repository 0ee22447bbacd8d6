import { targetAt } from '@shared/engine/target';
import { targetMask } from '@shared/rail/target-mask';
import type { Envelope } from '@shared/rail/worst-cases';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatQuantity } from '@shared/units/format';
import type { BenchAnalysis, BenchMember } from '@workers/analysis/analysis.interface';
import { type ReactNode, useEffect, useMemo, useRef, useState } from 'react';
import { decadesAround, frequencyAt, impedanceScale } from '@/components/chart/axis';
import type { PlotCurve } from '@/components/chart/impedance-plot';
import { PlumbLines } from '@/components/chart/plumb-lines';
import { ShareStrip } from '@/components/chart/share-strip';
import { useWidth } from '@/components/chart/use-width';
import type { DraftLine } from '../lib/bank-history';
import { partName } from '../lib/part-name';
import { waterlinePoints } from '../lib/spec-facts';
import { BankRow, CursorShare } from './bank-row';
import { ScoreChart } from './score-chart';

interface ScoreProps {
  spec: RailSpec;
  lines: readonly DraftLine[];
  parts: ReadonlyMap<string, Part>;
  setup: BoardSetup;
  analysis: BenchAnalysis | null;
  /** A second curve: the best mix so far while searching, or the present bank under a preview. */
  other: { name: string; analysis: BenchAnalysis } | null;
  /** Counts before, by part, while a preview is shown. */
  before: ReadonlyMap<string, number> | null;
  /** The range over all corners, where it is to be seen. */
  envelope: (Envelope & { frequency_Hz: Float64Array }) | null;
  /** From here on the package keeps the board from the die. */
  reach_Hz: number | null;
  /** Catalogue capacitance by part number, shown before what is left of it. */
  showCatalogue: boolean;
  span_Hz: readonly [number, number];
  onSpan: (span_Hz: [number, number] | null) => void;
  showLines: boolean;
  readOnly: boolean;
  /** A line to put the focus on once it is shown. */
  focusKey: string | null;
  onFocused: () => void;
  facts: ReactNode;
  footer: ReactNode;
  onCount: (key: string, count: number) => void;
  onChange: (key: string, patch: Partial<DraftLine>) => string | null;
  onRemove: (key: string) => void;
}

const PLOT_HEIGHT = 344;

/** Chart and bank as one score: everything hangs from the chart's frequency axis. */
export function Score(props: ScoreProps) {
  const { spec, lines, parts, analysis, other, before, envelope, span_Hz, onSpan, showLines, readOnly } =
    props;
  const [measure, width] = useWidth<HTMLDivElement>();
  const [cursor_Hz, setCursor] = useState<number | null>(null);
  const rows = useRef<HTMLElement>(null);
  const x = useMemo(() => ({ low_Hz: span_Hz[0], high_Hz: span_Hz[1], width }), [span_Hz, width]);
  const target = useMemo(() => targetMask(spec), [spec]);
  const waterline = useMemo(() => waterlinePoints(spec, (f) => targetAt(target, f)), [spec, target]);
  const [low_ohm, high_ohm] = useMemo(
    () =>
      impedanceScale(
        analysis?.magnitude_ohm ?? [],
        waterline.map(([, z]) => z),
      ),
    [analysis, waterline],
  );
  const y = useMemo(() => ({ low_ohm, high_ohm, height: PLOT_HEIGHT }), [low_ohm, high_ohm]);
  const curves = useMemo(
    () => curvesOf(analysis, other, showLines, envelope),
    [analysis, other, showLines, envelope],
  );
  const breaks = analysis?.breaks ?? NONE;
  const cursorIndex = analysis && cursor_Hz !== null ? nearest(analysis.frequency_Hz, cursor_Hz) : null;
  const strip = (member: BenchMember | undefined) =>
    analysis && member
      ? {
          frequency_Hz: analysis.frequency_Hz,
          share: member.share,
          inductance_H: member.inductance_H,
          left_F: props.showCatalogue ? member.capacitance_F : null,
          estimated: props.showCatalogue && member.estimated,
        }
      : null;
  const shareAt = (member: BenchMember | undefined) =>
    member && cursorIndex !== null ? member.share[cursorIndex] : null;
  const fixed = (analysis?.members ?? []).filter((member) => member.line < 0);
  const { focusKey, onFocused } = props;
  useEffect(() => {
    if (focusKey === null) return;
    const row = rows.current?.querySelector<HTMLElement>(`[data-row="${focusKey}"]`);
    if (!row) return;
    row.focus();
    onFocused();
  }, [focusKey, onFocused]);
  const move = (from: number, by: number) => {
    const all = rows.current?.querySelectorAll<HTMLElement>('[data-row]');
    all?.[Math.min(all.length - 1, Math.max(0, from + by))]?.focus();
  };
  return (
    <div
      className="[--score-left:64px] lg:[--score-left:276px]"
      onPointerMove={(event) => {
        const box = rows.current?.querySelector('[data-axis]')?.getBoundingClientRect();
        if (!box || width <= 0) return;
        const px = event.clientX - box.left;
        setCursor(px >= 0 && px <= width ? frequencyAt(x, px) : null);
      }}
      onPointerLeave={() => setCursor(null)}
    >
      <div className="lg:grid" style={{ gridTemplateColumns: 'var(--score-left) minmax(0, 1fr)' }}>
        <div className="pr-4 max-lg:mb-4 lg:w-[212px]">{props.facts}</div>
        <div className="max-lg:ml-[var(--score-left)]">
          <ScoreChart
            x={x}
            y={y}
            curves={curves}
            target_ohm={analysis?.target_ohm ?? null}
            waterline={waterline}
            breaks={breaks}
            cursor_Hz={cursor_Hz}
            band={envelope}
            reach_Hz={props.reach_Hz}
            onZoom={onSpan}
            summary={summaryOf(spec, analysis)}
          />
        </div>
      </div>
      <section ref={rows} aria-label="bank" className="relative">
        <div className="border-b lg:grid" style={{ gridTemplateColumns: 'var(--score-left) minmax(0, 1fr)' }}>
          <div className="section-head flex justify-between pr-3">
            <span>bank line</span>
            <span className="w-20 text-center">count</span>
          </div>
          <div
            ref={measure}
            data-axis
            className="section-head flex justify-between max-lg:ml-[var(--score-left)]"
          >
            <span className="truncate">share of the load current; a bar on top: above 100 %</span>
            <CursorReading analysis={analysis} index={cursorIndex} />
          </div>
        </div>
        {fixed.map((member) => (
          <FixedRow
            key={member.id}
            member={member}
            analysis={analysis}
            axis={x}
            cursorShare={shareAt(member)}
          />
        ))}
        {lines.map((line, i) => {
          const member = analysis?.members.find((one) => one.line === i);
          return (
            <BankRow
              key={line.key}
              line={line}
              part={parts.get(line.partId)}
              spec={spec}
              setup={props.setup}
              axis={x}
              strip={strip(member)}
              cursorShare={shareAt(member)}
              before={before ? (before.get(line.partId) ?? 0) : null}
              readOnly={readOnly}
              onCount={(count) => props.onCount(line.key, count)}
              onChange={(patch) => props.onChange(line.key, patch)}
              onRemove={() => props.onRemove(line.key)}
              onMove={(by) => move(i, by)}
            />
          );
        })}
        <div className="pointer-events-none absolute inset-y-0 right-0 left-[var(--score-left)]">
          <PlumbLines axis={x} frequencies_Hz={breaks.map((one) => one.frequency_Hz)} cursor_Hz={cursor_Hz} />
        </div>
      </section>
      {props.footer}
    </div>
  );
}

const NONE: BenchAnalysis['breaks'] = [];

function curvesOf(
  analysis: BenchAnalysis | null,
  other: ScoreProps['other'],
  showLines: boolean,
  envelope: ScoreProps['envelope'],
): PlotCurve[] {
  const curves: PlotCurve[] = [];
  if (analysis && showLines)
    for (const member of analysis.members)
      if (member.magnitude_ohm && member.role !== 'load')
        curves.push({
          name: member.id,
          style: 'line',
          frequency_Hz: analysis.frequency_Hz,
          magnitude_ohm: member.magnitude_ohm,
        });
  if (envelope)
    curves.push({
      name: 'parts that differ',
      style: 'bound',
      frequency_Hz: envelope.frequency_Hz,
      magnitude_ohm: envelope.bound_ohm,
    });
  if (analysis?.floor_ohm)
    curves.push({
      name: 'board shorted',
      style: 'floor',
      frequency_Hz: analysis.frequency_Hz,
      magnitude_ohm: analysis.floor_ohm,
    });
  if (other)
    curves.push({
      name: other.name,
      style: 'other',
      frequency_Hz: other.analysis.frequency_Hz,
      magnitude_ohm: other.analysis.magnitude_ohm,
    });
  if (analysis)
    curves.push({
      name: 'rail',
      style: 'total',
      frequency_Hz: analysis.frequency_Hz,
      magnitude_ohm: analysis.magnitude_ohm,
    });
  return curves;
}

const FIXED_NAMES: Record<string, [string, string]> = {
  source: ['source', 'regulator'],
  plane: ['planes', 'plane pair'],
  load: ['package and die', 'takes current at the pins'],
  die: ['die', 'its own capacitance'],
};

function FixedRow({
  member,
  analysis,
  axis,
  cursorShare,
}: {
  member: BenchMember;
  analysis: BenchAnalysis | null;
  axis: { low_Hz: number; high_Hz: number; width: number };
  cursorShare: number | null;
}) {
  const [name, note] = FIXED_NAMES[member.role] ?? [member.id, ''];
  return (
    <div
      className="min-h-[46px] border-b py-1.5 lg:grid"
      style={{ gridTemplateColumns: 'var(--score-left) minmax(0, 1fr)' }}
    >
      <div className="flex items-end justify-between gap-2 pr-3">
        <span className="min-w-0">
          <span className="block font-semibold">{name}</span>
          <span className="block truncate text-small text-stone">{note}</span>
        </span>
        <CursorShare share={cursorShare} />
      </div>
      <div className="relative flex items-end max-lg:ml-[var(--score-left)]">
        {analysis && (
          <ShareStrip
            axis={axis}
            frequency_Hz={analysis.frequency_Hz}
            share={member.share}
            tone="source"
            label={`share of the load current of the ${name} over frequency`}
          />
        )}
      </div>
    </div>
  );
}

function CursorReading({ analysis, index }: { analysis: BenchAnalysis | null; index: number | null }) {
  if (!analysis || index === null) return null;
  return (
    <span className="bg-paper whitespace-nowrap text-ink">
      {formatQuantity(analysis.magnitude_ohm[index], 'Ω')} at{' '}
      {formatQuantity(analysis.frequency_Hz[index], 'Hz')}
    </span>
  );
}

function nearest(frequencies: Float64Array, f: number): number {
  let lo = 0;
  let hi = frequencies.length - 1;
  while (hi - lo > 1) {
    const mid = (lo + hi) >> 1;
    if (frequencies[mid] <= f) lo = mid;
    else hi = mid;
  }
  return f / frequencies[lo] < frequencies[hi] / f ? lo : hi;
}

function summaryOf(spec: RailSpec, analysis: BenchAnalysis | null): string {
  const head = `impedance of ${spec.name} over frequency`;
  if (!analysis) return head;
  const { tightest, breaks } = analysis;
  const verdict =
    breaks.length === 0 ? 'stays under the waterline' : `breaks the waterline at ${breaks.length} places`;
  return `${head}: ${verdict}; tightest at ${formatQuantity(tightest.frequency_Hz, 'Hz')} with ${formatQuantity(tightest.impedance_ohm, 'Ω')}`;
}

/** The span that the chart shows of a rail unless one zooms: whole decades around its band. */
export const chartSpan = (band_Hz: readonly [number, number]): [number, number] =>
  decadesAround(band_Hz[0], band_Hz[1]);

/** How a member of the node is called beside the chart. */
export function memberName(id: string | null, parts: ReadonlyMap<string, Part>): string {
  if (id === null) return '—';
  for (const part of parts.values()) if (part.partNumber === id) return partName(part);
  return id === 'plane' ? 'planes' : id;
}
