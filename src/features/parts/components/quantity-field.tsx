import { formatQuantity } from '@shared/units/format';
import { type Control, type UseFormRegister, useWatch } from 'react-hook-form';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { UnitInput } from '@/components/ui/quantity-input';
import {
  type PartFormInput,
  type PartFormOutput,
  QUANTITIES,
  type QuantityName,
  readField,
} from '../lib/part-form.schema';

interface Props {
  name: QuantityName;
  label: string;
  hint: string;
  control: Control<PartFormInput, unknown, PartFormOutput>;
  register: UseFormRegister<PartFormInput>;
  error?: string;
}

/** A quantity as an engineer types it; under it stands how it was understood. */
export function QuantityField({ name, label, hint, control, register, error }: Props) {
  const unit = QUANTITIES[name];
  const text = useWatch({ control, name });
  const parsed = text.trim() === '' ? null : readField(text, unit);
  const understood = parsed?.ok ? `= ${formatQuantity(parsed.value, unit, { digits: 4, trim: true })}` : hint;
  return (
    <Field label={label} hint={understood} error={error}>
      {(field) =>
        unit === '' ? (
          <Input {...field} inputMode="text" {...register(name)} />
        ) : (
          <UnitInput {...field} unit={unit} {...register(name)} />
        )
      }
    </Field>
  );
}
