import { useDeferredValue, useMemo, useRef } from 'react';
import { type UseFormReturn, useWatch } from 'react-hook-form';
import { Field } from '@/components/ui/field';
import { Textarea } from '@/components/ui/input';
import { readPoints } from '@/lib/points-text';
import { CURVES, type CurveName } from '../lib/curve-fields';
import type { PartFormInput, PartFormOutput } from '../lib/part-form.schema';
import { readPointsFile } from '../lib/points-file';
import { CurveSketch } from './curve-sketch';

interface Props {
  name: CurveName;
  form: UseFormReturn<PartFormInput, unknown, PartFormOutput>;
}

/** A curve, one point a line, typed or taken from a text file, with its picture beside it. */
export function PointsField({ name, form }: Props) {
  const { label, units, columns, examples, empty } = CURVES[name];
  const file = useRef<HTMLInputElement>(null);
  const text = useDeferredValue(useWatch({ control: form.control, name }));
  const read = useMemo(() => readPoints(text, units, examples), [text, units, examples]);
  const rows = read.ok ? read.rows : [];
  const take = async (chosen: File | undefined) => {
    if (!chosen) return;
    const answer = await readPointsFile(chosen);
    if (answer.ok) form.setValue(name, answer.text, { shouldDirty: true, shouldValidate: true });
    else form.setError(name, { type: 'file', message: answer.reason });
  };
  const hint = read.ok ? `= ${rows.length} points` : `not yet read: ${read.reason}`;
  return (
    <div className="flex min-w-0 flex-col gap-1">
      <Field
        label={label}
        hint={text.trim() === '' ? empty : hint}
        error={form.formState.errors[name]?.message}
      >
        {(control) => (
          <div className="grid grid-cols-2 gap-3">
            <Textarea {...control} rows={7} wrap="off" spellCheck={false} {...form.register(name)} />
            <CurveSketch name={name} rows={rows} />
          </div>
        )}
      </Field>
      <p className="text-small text-stone">One point a line: {columns}.</p>
      <p>
        <button
          type="button"
          className="text-deep underline-offset-4 hover:underline"
          onClick={() => file.current?.click()}
        >
          read a CSV or text file
        </button>
        <input
          ref={file}
          type="file"
          accept=".csv,.txt,text/csv,text/plain"
          aria-label={`file with ${label}`}
          tabIndex={-1}
          className="sr-only"
          onChange={(event) => {
            void take(event.target.files?.[0]);
            // The same file may be chosen again after it has been mended.
            event.target.value = '';
          }}
        />
      </p>
    </div>
  );
}
