import { formatInput, formatLength, formatQuantity } from '@shared/units/format';
import { type Parsed, parseLength, parseQuantity } from '@shared/units/parse';
import type { UnitSymbol } from '@shared/units/quantity';
import { type InputHTMLAttributes, useState } from 'react';
import { cx } from '@/lib/class-names';
import { Input } from './input';

type Base = Omit<InputHTMLAttributes<HTMLInputElement>, 'value' | 'onChange'>;

/** Reads what stands in a text field for `unit`; `mm` fields take any length and give metres. */
export function readQuantity(text: string, unit: UnitSymbol): Parsed {
  return unit === 'mm' ? parseLength(text) : parseQuantity(text, unit);
}

/** What stands in a text field for a value, so that reading it gives the value back. */
export function writeQuantity(value: number, unit: UnitSymbol): string {
  return unit === 'mm' ? String(Number((value * 1000).toPrecision(12))) : formatInput(value);
}

/** A text field with its unit behind it; the text is the caller's, as typed. */
export function UnitInput({
  unit,
  className,
  ...rest
}: InputHTMLAttributes<HTMLInputElement> & { unit: UnitSymbol }) {
  return (
    <span className={cx('relative block', className)}>
      <Input {...rest} className="pr-10" inputMode="text" />
      <span
        aria-hidden
        className="pointer-events-none absolute inset-y-0 right-2 flex items-center text-stone"
      >
        {unit}
      </span>
    </span>
  );
}

interface QuantityInputProps extends Base {
  unit: UnitSymbol;
  value: number | null;
  /** Called on Enter or when the field is left, with a value that was understood; null when emptied. */
  onCommit: (value: number | null) => void;
  /** Says under the field what was not understood, where there is room for it. */
  showFault?: boolean;
  /** Largest value that may be committed, in base units; none below zero ever may. */
  most?: number;
}

function withinLimits(parsed: Parsed, unit: UnitSymbol, most: number | undefined): Parsed {
  if (!parsed.ok) return parsed;
  if (parsed.value < 0) return { ok: false, reason: 'must not be negative' };
  if (most === undefined || parsed.value <= most) return parsed;
  const limit = unit === 'mm' ? formatLength(most) : formatQuantity(most, unit, { trim: true });
  return { ok: false, reason: `at most ${limit}` };
}

/** A quantity edited in place: commits on Enter or blur, Escape puts the old value back, what is wrong stays and says so. */
export function QuantityInput({
  unit,
  value,
  onCommit,
  showFault = false,
  most,
  ...rest
}: QuantityInputProps) {
  const [draft, setDraft] = useState<string | null>(null);
  const shown = draft ?? (value === null ? '' : writeQuantity(value, unit));
  const parsed: Parsed | null =
    draft === null || draft.trim() === '' ? null : withinLimits(readQuantity(draft, unit), unit, most);
  const commit = () => {
    if (draft === null) return;
    if (draft.trim() === '') onCommit(null);
    else if (parsed?.ok) onCommit(parsed.value);
    else return;
    setDraft(null);
  };
  const fault = parsed && !parsed.ok ? parsed.reason : undefined;
  const input = (
    <UnitInput
      {...rest}
      unit={unit}
      value={shown}
      title={fault}
      aria-invalid={fault ? true : undefined}
      onChange={(event) => setDraft(event.target.value)}
      onBlur={commit}
      onKeyDown={(event) => {
        if (event.key === 'Enter') commit();
        if (event.key === 'Escape') setDraft(null);
        event.stopPropagation();
      }}
    />
  );
  if (!showFault) return input;
  return (
    <>
      {input}
      {fault && (
        <span role="alert" className="text-small text-kingfisher">
          ▲ {fault}
        </span>
      )}
    </>
  );
}
