import type { Parsed } from '@shared/units/parse';
import { useId, useState } from 'react';
import { Input } from '@/components/ui/input';

interface Props {
  label: string;
  unit: string;
  value: number;
  /** The text for a value; reading it gives the value back. */
  write: (value: number) => string;
  read: (text: string) => Parsed;
  onCommit: (value: number) => void;
}

/** A value that can be typed as well as dragged: taken on Enter or when left, put back by Escape. */
export function TypedValue({ label, unit, value, write, read, onCommit }: Props) {
  const note = useId();
  const [draft, setDraft] = useState<string | null>(null);
  const parsed = draft === null ? null : read(draft);
  const fault = parsed && !parsed.ok ? parsed.reason : null;
  const commit = () => {
    if (!parsed?.ok) return;
    onCommit(parsed.value);
    setDraft(null);
  };
  return (
    <span className="flex flex-wrap items-center justify-end gap-x-2">
      {fault && (
        <span id={note} role="alert" className="text-small text-kingfisher">
          ▲ {fault}
        </span>
      )}
      <span className="w-20">
        <Input
          aria-label={label}
          aria-invalid={fault ? true : undefined}
          aria-describedby={fault ? note : undefined}
          inputMode="text"
          className="text-right"
          value={draft ?? write(value)}
          onChange={(event) => setDraft(event.target.value)}
          onBlur={commit}
          onKeyDown={(event) => {
            if (event.key === 'Enter') commit();
            if (event.key === 'Escape') setDraft(null);
          }}
        />
      </span>
      <span aria-hidden className="text-stone">
        {unit}
      </span>
    </span>
  );
}
