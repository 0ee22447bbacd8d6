import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { type FormEvent, type ReactNode, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Input } from '@/components/ui/input';
import { Notice } from '@/components/ui/notice';
import { ApiError, isGone, messageOf } from '@/lib/problem';
import {
  bandSentence,
  errorsAtFields,
  planeSentence,
  readSpec,
  type SpecForm,
  targetSentence,
} from '../lib/spec-form';
import { LoadFields } from './load-fields';
import { SourceFields } from './source-fields';
import { ChoiceField, PointsField, QuantityField, type SpecBinding, SpecGroup } from './spec-fields';

interface SpecFormProps {
  start: SpecForm;
  submitText: string;
  pending: boolean;
  /** What the server said to the last try. */
  failure: unknown;
  /** Where to go when the server says that there is no such thing any more. */
  wayOut?: ReactNode;
  onSubmit: (spec: RailSpec) => void;
  children?: ReactNode;
}

/** Everything that is said about a rail but its bank. Shows what each group comes to while one types. */
export function SpecFormView({
  start,
  submitText,
  pending,
  failure,
  wayOut,
  onSubmit,
  children,
}: SpecFormProps) {
  const [form, setForm] = useState(start);
  const [tried, setTried] = useState(false);
  const element = useRef<HTMLFormElement>(null);
  const answer = readSpec(form);
  const own = tried && 'errors' in answer ? answer.errors : {};
  const theirs = failure instanceof ApiError ? errorsAtFields(serverFaults(failure)) : {};
  const errors = { ...theirs, ...own };
  const bind: SpecBinding = { form, errors, set: (patch) => setForm((now) => ({ ...now, ...patch })) };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if ('spec' in answer) onSubmit(answer.spec);
    else
      requestAnimationFrame(() =>
        element.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus(),
      );
  };
  const faultCount = Object.keys(own).length;
  return (
    <form ref={element} noValidate onSubmit={submit} className="max-w-5xl">
      <SpecGroup title="rail">
        <Field label="name" error={errors.name}>
          {(control) => (
            <Input
              {...control}
              name="name"
              value={form.name}
              placeholder="VDD_CORE"
              onChange={(event) => bind.set({ name: event.target.value })}
            />
          )}
        </Field>
        <QuantityField bind={bind} field="voltage" label="voltage" unit="V" />
      </SpecGroup>
      <SpecGroup title="target" result={targetSentence(form)}>
        <ChoiceField
          bind={bind}
          field="targetKind"
          label="given as"
          options={[
            ['step', 'ripple and step'],
            ['flat', 'impedance'],
            ['mask', 'a mask'],
          ]}
        />
        {form.targetKind === 'step' && (
          <>
            <QuantityField bind={bind} field="ripple" label="ripple allowed" unit="%" />
            <QuantityField bind={bind} field="step" label="load step" unit="A" />
          </>
        )}
        {form.targetKind === 'flat' && (
          <QuantityField bind={bind} field="impedance" label="target impedance" unit="Ω" />
        )}
        {form.targetKind === 'mask' && (
          <PointsField
            bind={bind}
            field="mask"
            label="points"
            hint="one a line: frequency, impedance, e.g. 10k 3m"
          />
        )}
      </SpecGroup>
      <SpecGroup title="band" result={bandSentence(form)}>
        <ChoiceField
          bind={bind}
          field="bandKind"
          label="given as"
          options={[
            ['direct', 'frequencies'],
            ['derived', 'from rise time'],
          ]}
        />
        {form.bandKind === 'direct' ? (
          <>
            <QuantityField bind={bind} field="bandLow" label="from" unit="Hz" />
            <QuantityField bind={bind} field="bandHigh" label="to" unit="Hz" />
          </>
        ) : (
          <>
            <QuantityField
              bind={bind}
              field="bandwidth"
              label="regulator bandwidth"
              unit="Hz"
              hint="lower end"
            />
            <QuantityField
              bind={bind}
              field="rise"
              label="rise time of the step"
              unit="s"
              hint="gives the upper end"
            />
            <ChoiceField
              bind={bind}
              field="knee"
              label="knee frequency"
              options={[
                ['0.35', '0.35 ÷ rise time'],
                ['0.5', '0.5 ÷ rise time'],
              ]}
            />
          </>
        )}
      </SpecGroup>
      <SourceFields bind={bind} planes={planeSentence(form)} />
      <LoadFields bind={bind} />
      {children}
      <div className="flex flex-col gap-4 border-t py-5">
        {Object.keys(own).length > 0 && (
          <p role="alert" className="text-kingfisher">
            ▲ {own.form ?? `${faultCount} ${faultCount === 1 ? 'field needs' : 'fields need'} another look`}
          </p>
        )}
        {failure !== null &&
          failure !== undefined &&
          Object.keys(theirs).filter((key) => key !== 'form').length === 0 && (
            <Notice tone="error" title="▲ not saved" action={isGone(failure) && wayOut}>
              {messageOf(failure)}
            </Notice>
          )}
        <div>
          <Button type="submit" variant="primary" disabled={pending}>
            {pending ? 'Saving …' : submitText}
          </Button>
        </div>
      </div>
    </form>
  );
}

/** The server names paths from the body's root; the form's begin inside `spec`. */
function serverFaults(error: ApiError): { path: string; message: string }[] {
  return (error.problem.errors ?? []).map((fault) => ({
    ...fault,
    path: fault.path.replace(/^spec\.?/, ''),
  }));
}
