import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatLength, formatQuantity } from '@shared/units/format';
import { type KeyboardEvent, useState } from 'react';
import type { FrequencyAxis } from '@/components/chart/axis';
import { ShareStrip } from '@/components/chart/share-strip';
import { cx } from '@/lib/class-names';
import { shareUnit } from '@/lib/shared-unit';
import type { DraftLine } from '../lib/bank-history';
import { partName } from '../lib/part-name';
import { LineDetails } from './line-details';

export interface RowStrip {
  frequency_Hz: Float64Array;
  share: Float64Array;
  /** ESL + mount + path of one capacitor. */
  inductance_H: number | null;
  /** What is left of the catalogue capacitance; null where catalogue values are shown. */
  left_F: number | null;
  estimated: boolean;
}

interface BankRowProps {
  line: DraftLine;
  part: Part | undefined;
  spec: RailSpec;
  setup: BoardSetup;
  axis: FrequencyAxis;
  strip: RowStrip | null;
  /** Share at the pointer's frequency, 1 = all. */
  cursorShare: number | null;
  /** What stands in the preview instead of the count, e.g. the count before. */
  before: number | null;
  readOnly: boolean;
  onCount: (count: number) => void;
  onChange: (patch: Partial<DraftLine>) => string | null;
  onRemove: () => void;
  onMove: (by: number) => void;
}

/** One line of the bank: its name, its count, and its share of the current on the chart's axis. */
export function BankRow(props: BankRowProps) {
  const { line, part, axis, strip, cursorShare, before, readOnly, onCount, onMove } = props;
  const [open, setOpen] = useState(false);
  const name = part ? partName(part) : 'unknown part';
  /** Does what a key asks for; false when the row does not know it. */
  const pressed = (key: string): boolean => {
    if (key === 'ArrowUp') onMove(-1);
    else if (key === 'ArrowDown') onMove(1);
    else if (key === 'Enter') setOpen(!open);
    else if (readOnly) return false;
    else if (key === 'ArrowLeft' || key === '-') onCount(line.count - 1);
    else if (key === 'ArrowRight' || key === '+') onCount(line.count + 1);
    else if (key === 'Delete') props.onRemove();
    else return false;
    return true;
  };
  const onKeyDown = (event: KeyboardEvent<HTMLButtonElement>) => {
    if (!pressed(event.key)) return;
    event.preventDefault();
  };
  return (
    <div className="border-b">
      <div
        className={cx(
          'relative min-h-[46px] py-1.5 focus-within:bg-wash/40 lg:grid',
          line.count === 0 && 'opacity-60',
        )}
        style={{ gridTemplateColumns: 'var(--score-left) minmax(0, 1fr)' }}
      >
        <div className="flex items-start justify-between gap-2 pr-3">
          <button
            type="button"
            data-row={line.key}
            aria-label={`${name}, ${line.count}`}
            aria-expanded={open}
            onKeyDown={onKeyDown}
            onClick={() => setOpen(!open)}
            className="min-w-0 text-left"
            title={part?.partNumber}
          >
            <span className="block truncate font-semibold">{name}</span>
            <span className="block text-small text-stone">
              <RowFacts line={line} part={part} strip={strip} />
            </span>
          </button>
          <div className="flex shrink-0 flex-col items-end">
            <CountStepper
              count={line.count}
              before={before}
              readOnly={readOnly}
              name={name}
              onCount={onCount}
            />
            <CursorShare share={cursorShare} />
          </div>
        </div>
        <div className="relative flex items-end max-lg:ml-[var(--score-left)]">
          {strip && (
            <ShareStrip
              axis={axis}
              frequency_Hz={strip.frequency_Hz}
              share={strip.share}
              tone="line"
              label={`share of the load current of ${name} over frequency`}
            />
          )}
        </div>
      </div>
      {open && part && (
        <LineDetails
          line={line}
          part={part}
          spec={props.spec}
          setup={props.setup}
          shown_H={strip?.inductance_H ?? null}
          readOnly={readOnly}
          onChange={props.onChange}
          onRemove={props.onRemove}
        />
      )}
    </div>
  );
}

/** What stands under a line's name: what is left of its capacitance, its inductance, its place. */
function RowFacts({
  line,
  part,
  strip,
}: {
  line: DraftLine;
  part: Part | undefined;
  strip: RowStrip | null;
}) {
  const place = [
    formatQuantity(strip?.inductance_H, 'H'),
    line.distance_m !== null && formatLength(line.distance_m),
    line.side === 'bottom' && 'bottom',
    line.locked && 'locked',
  ].filter(Boolean);
  return (
    <>
      {part && strip?.left_F != null && (
        <span className="whitespace-nowrap">
          {leftText(part.capacitance_F, strip.left_F, strip.estimated)}
          {strip.estimated && <span className="text-brass"> ≈ estimated</span>}
          {' · '}
        </span>
      )}
      {place.join(' · ')}
    </>
  );
}

/** `22 → 9.41 µF`; an estimate is not worth three digits. */
const leftText = (catalogue_F: number, left_F: number, estimated: boolean): string =>
  shareUnit(
    formatQuantity(catalogue_F, 'F', { trim: true }),
    '→',
    formatQuantity(left_F, 'F', { digits: estimated ? 2 : 3 }),
  );

/** The share under the pointer, in per cent; its line is kept when there is none, so that rows do not jump. */
export function CursorShare({ share }: { share: number | null }) {
  return (
    <span className="text-small whitespace-nowrap text-stone">
      {share === null ? '\u00a0' : percentText(share)}
    </span>
  );
}

const percentText = (share: number): string =>
  share < 0.0005 ? '0\u00a0%' : formatQuantity(share * 100, '%', { digits: share < 0.1 ? 2 : 3 });

interface StepperProps {
  count: number;
  before: number | null;
  readOnly: boolean;
  name: string;
  onCount: (count: number) => void;
}

function CountStepper({ count, before, readOnly, name, onCount }: StepperProps) {
  const [typed, setTyped] = useState<string | null>(null);
  if (readOnly)
    return (
      <span className="shrink-0 font-bold">
        {before !== null && before !== count ? (
          <span className="font-normal text-stone">{before} → </span>
        ) : null}
        {count}
      </span>
    );
  const faulty = typed !== null && !/^\d{1,4}$/.test(typed.trim());
  const commit = () => {
    if (faulty) return;
    if (typed !== null) onCount(Number(typed));
    setTyped(null);
  };
  const step =
    'flex h-5 w-6 items-center justify-center text-base text-deep hover:bg-wash disabled:opacity-40';
  return (
    <span className="flex shrink-0 flex-wrap items-center justify-end">
      {faulty && (
        <span role="alert" className="w-full text-right text-small text-kingfisher">
          ▲ 0 to 9999
        </span>
      )}
      <button
        type="button"
        tabIndex={-1}
        className={step}
        disabled={count === 0}
        aria-label={`one ${name} fewer`}
        onClick={() => onCount(count - 1)}
      >
        −
      </button>
      <input
        aria-label={`count of ${name}`}
        tabIndex={-1}
        inputMode="numeric"
        aria-invalid={faulty || undefined}
        title={faulty ? 'a whole number, 0 to 9999' : undefined}
        value={typed ?? count}
        onChange={(event) => setTyped(event.target.value)}
        onBlur={commit}
        onKeyDown={(event) => {
          event.stopPropagation();
          if (event.key === 'Enter') commit();
          if (event.key === 'Escape') setTyped(null);
        }}
        className="h-5 w-8 border-0 bg-transparent text-center font-bold aria-invalid:text-kingfisher"
      />
      <button
        type="button"
        tabIndex={-1}
        className={step}
        aria-label={`one ${name} more`}
        onClick={() => onCount(count + 1)}
      >
        +
      </button>
    </span>
  );
}
