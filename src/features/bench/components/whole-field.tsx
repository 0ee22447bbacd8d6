import { useState } from 'react';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';

interface WholeFieldProps {
  label: string;
  value: number | null;
  most: number;
  /** What an empty field means; without it the field must be filled. */
  emptyMeans?: string;
  onChange: (value: number | null) => void;
  /** Tells whether what stands there can be used. */
  onFault: (faulty: boolean) => void;
}

/** A whole number from 1 on. What cannot be used stays, says so at the field, and is never replaced unseen. */
export function WholeField({ label, value, most, emptyMeans, onChange, onFault }: WholeFieldProps) {
  const [text, setText] = useState(value === null ? '' : String(value));
  const fault = faultOf(text, most, emptyMeans !== undefined);
  return (
    <Field label={label} error={fault ?? undefined}>
      {(control) => (
        <Input
          {...control}
          inputMode="numeric"
          placeholder={emptyMeans}
          value={text}
          onChange={(event) => {
            const next = event.target.value;
            setText(next);
            const wrong = faultOf(next, most, emptyMeans !== undefined) !== null;
            onFault(wrong);
            if (!wrong) onChange(next.trim() === '' ? null : Number(next));
          }}
        />
      )}
    </Field>
  );
}

function faultOf(text: string, most: number, mayBeEmpty: boolean): string | null {
  const clean = text.trim();
  if (clean === '') return mayBeEmpty ? null : `1 to ${most}`;
  return /^\d{1,6}$/.test(clean) && Number(clean) >= 1 && Number(clean) <= most
    ? null
    : `a whole number, 1 to ${most}`;
}
