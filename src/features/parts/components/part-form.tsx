import { zodResolver } from '@hookform/resolvers/zod';
import { partFieldsSchema, technologySchema, terminationSchema } from '@shared/schemas/part.schema';
import type { ReactNode } from 'react';
import { type FieldPath, useForm } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input, Select } from '@/components/ui/input';
import { UnsavedGuard } from '@/components/ui/unsaved-guard';
import { showServerFaults } from '@/lib/server-faults';
import { atCurves } from '../lib/curve-faults';
import { type PartFormInput, type PartFormOutput, partFormSchema } from '../lib/part-form.schema';
import { TOLERANCES } from '../lib/tolerance';
import { BehaviourFields } from './behaviour-fields';
import { QuantityField } from './quantity-field';

const NAMES = Object.keys(partFieldsSchema.shape) as FieldPath<PartFormInput>[];

interface Props {
  initial: PartFormInput;
  label: string;
  busy: boolean;
  save: (fields: PartFormOutput) => Promise<unknown>;
  onCancel: () => void;
  /** Shown above the buttons: conflicts and other refusals. */
  children?: ReactNode;
}

/** Everything that a person says about a part. */
export function PartForm({ initial, label, busy, save, onCancel, children }: Props) {
  const form = useForm<PartFormInput, unknown, PartFormOutput>({
    resolver: zodResolver(partFormSchema),
    defaultValues: initial,
  });
  const { control, register } = form;
  const { errors, isDirty, isSubmitting } = form.formState;
  const submit = form.handleSubmit((fields) =>
    save(fields).catch((error: unknown) => {
      showServerFaults(atCurves(error), NAMES, form.setError);
    }),
  );
  const quantity = { control, register };
  return (
    <form noValidate onSubmit={submit} className="flex max-w-4xl flex-col gap-6">
      <div className="grid gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-3">
        <Field label="part number" hint="Letters, digits and . _ / + -" error={errors.partNumber?.message}>
          {(field) => <Input {...field} {...register('partNumber')} />}
        </Field>
        <div className="lg:col-span-2">
          <Field label="description (may stay empty)" error={errors.description?.message}>
            {(field) => <Input {...field} {...register('description')} />}
          </Field>
        </div>
        <Field label="technology" error={errors.technology?.message}>
          {(field) => (
            <Select {...field} {...register('technology')}>
              {technologySchema.options.map((one) => (
                <option key={one}>{one}</option>
              ))}
            </Select>
          )}
        </Field>
        <Field label="dielectric (ceramics)" hint="e.g. X7R, C0G" error={errors.dielectric?.message}>
          {(field) => <Input {...field} {...register('dielectric')} />}
        </Field>
        <Field label="case" hint="e.g. 0402, 7343" error={errors.caseSize?.message}>
          {(field) => <Input {...field} {...register('caseSize')} />}
        </Field>
      </div>
      <div className="grid gap-x-6 gap-y-4 border-t pt-5 sm:grid-cols-2 lg:grid-cols-3">
        <QuantityField
          {...quantity}
          name="capacitance_F"
          label="capacitance"
          hint="e.g. 4u7 or 100 nF"
          error={errors.capacitance_F?.message}
        />
        <Field label="tolerance" error={errors.tolerance?.message}>
          {(field) => (
            <Select {...field} {...register('tolerance')}>
              {Object.entries(TOLERANCES).map(([letter, text]) => (
                <option key={letter} value={letter}>
                  {letter} {text}
                </option>
              ))}
            </Select>
          )}
        </Field>
        <QuantityField
          {...quantity}
          name="rated_voltage_V"
          label="rated voltage"
          hint="e.g. 6.3"
          error={errors.rated_voltage_V?.message}
        />
        <QuantityField
          {...quantity}
          name="esr_ohm"
          label="ESR, near its self-resonance"
          hint="e.g. 12m or R05"
          error={errors.esr_ohm?.message}
        />
        <QuantityField
          {...quantity}
          name="esl_H"
          label="ESL, of the part alone"
          hint="e.g. 0.3 nH"
          error={errors.esl_H?.message}
        />
        <QuantityField
          {...quantity}
          name="mount_H"
          label="usual mount: pads, traces, vias"
          hint="e.g. 700p"
          error={errors.mount_H?.message}
        />
      </div>
      <div className="grid gap-x-6 gap-y-4 border-t pt-5 sm:grid-cols-2 lg:grid-cols-4">
        <QuantityField
          {...quantity}
          name="height_mm"
          label="height (may stay empty)"
          hint="e.g. 0.55"
          error={errors.height_mm?.message}
        />
        <QuantityField
          {...quantity}
          name="area_mm2"
          label="board area (may stay empty)"
          hint="with its keep-out"
          error={errors.area_mm2?.message}
        />
        <QuantityField
          {...quantity}
          name="unit_cost"
          label="price each (may stay empty)"
          hint="in €"
          error={errors.unit_cost?.message}
        />
        <Field label="termination" error={errors.termination?.message}>
          {(field) => (
            <Select {...field} {...register('termination')}>
              {terminationSchema.options.map((one) => (
                <option key={one}>{one}</option>
              ))}
            </Select>
          )}
        </Field>
      </div>
      <BehaviourFields form={form} />
      {children}
      <div className="flex gap-3">
        <Button type="submit" variant="primary" disabled={busy}>
          {busy ? 'Saving …' : label}
        </Button>
        <Button onClick={onCancel}>Cancel</Button>
      </div>
      <UnsavedGuard dirty={isDirty && !isSubmitting} />
    </form>
  );
}
