import type { ReactNode } from 'react';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import type { FieldFaults, RecipeField } from '../lib/field-faults';
import type { RecipeForm } from '../lib/setup-form';

interface Props {
  form: RecipeForm;
  faults: FieldFaults['recipes'][string] | undefined;
  onChange: (patch: Partial<RecipeForm>) => void;
}

/** Letters are those of the drawings. */
const FIELDS: readonly (readonly [RecipeField, string, ReactNode])[] = [
  ['traceLength', 'trace length l', '0: via in pad'],
  ['traceWidth', 'trace width w', null],
  ['spacing', 'via spacing s', 'centre to centre'],
  ['drill', 'via drill d', null],
  ['pairs', 'via pairs n', 'share the current'],
  ['coupling', 'coupling k', 'of pairs, 0 to 1'],
];

/** The geometry of a recipe as it is typed. */
export function RecipeFields({ form, faults, onChange }: Props) {
  return (
    <div className="grid grid-cols-2 content-start gap-x-4 gap-y-3">
      {FIELDS.map(([field, label, hint]) => (
        <Field key={field} label={label} hint={hint} error={faults?.[field]}>
          {(control) => (
            <Input
              {...control}
              name={field}
              value={form[field]}
              onChange={(event) => onChange({ [field]: event.target.value })}
            />
          )}
        </Field>
      ))}
    </div>
  );
}
