import type { UnitSymbol } from '@shared/units/quantity';
import type { ReactNode } from 'react';
import { Field } from '@/components/ui/field';
import { Select, Textarea } from '@/components/ui/input';
import { UnitInput } from '@/components/ui/quantity-input';
import type { SpecErrors, SpecField, SpecForm } from '../lib/spec-form';

/** What each field of the form needs: the typed text, what is wrong with it, how to change it. */
export interface SpecBinding {
  form: SpecForm;
  errors: SpecErrors;
  set: (patch: Partial<SpecForm>) => void;
}

interface TextProps {
  bind: SpecBinding;
  field: SpecField;
  label: string;
  unit: UnitSymbol;
  hint?: ReactNode;
}

/** A quantity as text with its unit. */
export function QuantityField({ bind, field, label, unit, hint }: TextProps) {
  return (
    <Field label={label} hint={hint} error={bind.errors[field]}>
      {(control) => (
        <UnitInput
          {...control}
          unit={unit}
          name={field}
          value={String(bind.form[field])}
          onChange={(event) => bind.set({ [field]: event.target.value })}
        />
      )}
    </Field>
  );
}

export function PointsField({ bind, field, label, hint }: Omit<TextProps, 'unit'>) {
  return (
    <Field label={label} hint={hint} error={bind.errors[field]}>
      {(control) => (
        <Textarea
          {...control}
          name={field}
          rows={5}
          spellCheck={false}
          value={String(bind.form[field])}
          onChange={(event) => bind.set({ [field]: event.target.value })}
        />
      )}
    </Field>
  );
}

interface ChoiceProps<K extends SpecField> {
  bind: SpecBinding;
  field: K;
  label: string;
  options: readonly (readonly [SpecForm[K] & string, string])[];
}

export function ChoiceField<K extends SpecField>({ bind, field, label, options }: ChoiceProps<K>) {
  return (
    <Field label={label}>
      {(control) => (
        <Select
          {...control}
          name={field}
          value={String(bind.form[field])}
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

/** One subject of the form: its name at the left, its fields in a row, what they come to below. */
export function SpecGroup({
  title,
  result,
  children,
}: {
  title: string;
  result?: string;
  children: ReactNode;
}) {
  return (
    <fieldset className="grid gap-x-8 gap-y-2 border-t py-5 md:grid-cols-[10rem_1fr]">
      <legend className="float-left font-semibold md:w-40">{title}</legend>
      <div className="flex flex-col gap-4">
        <div className="grid grid-cols-1 gap-4 sm:grid-cols-2 xl:grid-cols-4">{children}</div>
        {result && (
          <output className="font-semibold text-deep" aria-live="polite">
            {result}
          </output>
        )}
      </div>
    </fieldset>
  );
}
