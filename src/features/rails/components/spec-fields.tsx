import type { UnitSymbol } from '@shared/units/quantity';
import type { ReactNode } from 'react';
import { Field } from '@/components/ui/field';
import { Checkbox, Input, Select, Textarea } from '@/components/ui/input';
import { UnitInput } from '@/components/ui/quantity-input';
import type { SpecField, SpecForm } from '../lib/spec-form';
import type { SpecBinding } from './spec-binding';

/** Fields of one kind of value. */
type FieldOf<T> = { [K in SpecField]: SpecForm[K] extends T ? K : never }[SpecField];

interface TextProps {
  bind: SpecBinding;
  field: FieldOf<string>;
  label: string;
  hint?: ReactNode;
}

/** A quantity as text with its unit. */
export function QuantityField({ bind, field, label, unit, hint }: TextProps & { unit: UnitSymbol }) {
  return (
    <Field label={label} hint={hint} error={bind.errors[field]}>
      {(control) => (
        <UnitInput
          {...control}
          unit={unit}
          name={field}
          value={bind.form[field]}
          onChange={(event) => bind.set({ [field]: event.target.value })}
        />
      )}
    </Field>
  );
}

/** A text that is no quantity with a prefix: a name, a temperature, an age. */
export function TextField({ bind, field, label, hint, placeholder }: TextProps & { placeholder?: string }) {
  return (
    <Field label={label} hint={hint} error={bind.errors[field]}>
      {(control) => (
        <Input
          {...control}
          name={field}
          value={bind.form[field]}
          placeholder={placeholder}
          onChange={(event) => bind.set({ [field]: event.target.value })}
        />
      )}
    </Field>
  );
}

/** Points, one a line; while one types the hint says what cannot be read yet. */
export function PointsField({ bind, field, label, hint }: TextProps) {
  const unread = bind.form[field].trim() === '' ? undefined : bind.live[field];
  return (
    <Field label={label} hint={unread ? `${hint}; not yet read: ${unread}` : hint} error={bind.errors[field]}>
      {(control) => (
        <Textarea
          {...control}
          name={field}
          rows={5}
          spellCheck={false}
          value={bind.form[field]}
          onChange={(event) => bind.set({ [field]: event.target.value })}
        />
      )}
    </Field>
  );
}

interface ChoiceProps<K extends FieldOf<string>> {
  bind: SpecBinding;
  field: K;
  label: string;
  hint?: ReactNode;
  options: readonly (readonly [SpecForm[K] & string, string])[];
}

export function ChoiceField<K extends FieldOf<string>>({
  bind,
  field,
  label,
  hint,
  options,
}: ChoiceProps<K>) {
  return (
    <Field label={label} hint={hint} error={bind.errors[field]}>
      {(control) => (
        <Select
          {...control}
          name={field}
          value={bind.form[field]}
          onChange={(event) => bind.set({ [field]: event.target.value } as Partial<SpecForm>)}
        >
          {options.map(([value, text]) => (
            <option key={value} value={value}>
              {text}
            </option>
          ))}
        </Select>
      )}
    </Field>
  );
}

/** Whether a subject is described at all; its fields appear with it. */
export function DescribedField({ bind, field }: { bind: SpecBinding; field: FieldOf<boolean> }) {
  return (
    <div className="col-span-full">
      <Checkbox
        label="described"
        name={field}
        checked={bind.form[field]}
        onChange={(event) => bind.set({ [field]: event.target.checked })}
      />
    </div>
  );
}
