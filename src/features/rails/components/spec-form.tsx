import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { type FormEvent, type ReactNode, useDeferredValue, useMemo, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { UnsavedGuard } from '@/components/ui/unsaved-guard';
import { ApiError } from '@/lib/problem';
import { differs } from '../lib/differs';
import { errorsAtFields } from '../lib/field-of-path';
import { readSpec } from '../lib/read-spec';
import { sentencesOf } from '../lib/sentences';
import type { SpecForm } from '../lib/spec-form';
import { BandFields } from './band-fields';
import { ConditionsFields } from './conditions-fields';
import { PackageFields } from './package-fields';
import { PlaneFields } from './plane-fields';
import { SourceFields } from './source-fields';
import type { SpecBinding } from './spec-binding';
import { SpecFaults } from './spec-faults';
import { QuantityField, TextField } from './spec-fields';
import { SpecGroup } from './spec-group';
import { TargetFields } from './target-fields';
import { TimeFields } from './time-fields';

interface SpecFormProps {
  start: SpecForm;
  /** The board that the rail is on, with its stack-up. */
  boardId: string;
  setup: BoardSetup;
  submitText: string;
  pending: boolean;
  /** What is typed is saved or given up: leaving no longer asks. */
  done: boolean;
  /** What the server said to the last try. */
  failure: unknown;
  /** Where to go when the server says that there is no such thing any more. */
  wayOut?: ReactNode;
  onSubmit: (spec: RailSpec) => void;
}

/** Everything that is said about a rail but its bank. Shows what each group comes to while one types. */
export function SpecFormView(props: SpecFormProps) {
  const { setup, failure } = props;
  const [start] = useState(props.start);
  const [form, setForm] = useState(start);
  const [tried, setTried] = useState(false);
  const element = useRef<HTMLFormElement>(null);
  // Long tables take a while to read: what is typed shows at once, what it comes to a moment later.
  const settled = useDeferredValue(form);
  const answer = useMemo(() => readSpec(settled, setup), [settled, setup]);
  const said = useMemo(() => sentencesOf(settled, setup), [settled, setup]);
  const live = 'errors' in answer ? answer.errors : {};
  const own = tried ? live : {};
  const theirs = failure instanceof ApiError ? errorsAtFields(serverFaults(failure)) : {};
  const bind: SpecBinding = {
    form,
    settled,
    errors: { ...theirs, ...own },
    live,
    set: (patch) => setForm((now) => ({ ...now, ...patch })),
    boardId: props.boardId,
    setup,
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    const now = readSpec(form, setup);
    if ('spec' in now) props.onSubmit(now.spec);
    else
      requestAnimationFrame(() =>
        element.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus(),
      );
  };
  return (
    <form ref={element} noValidate onSubmit={submit} className="max-w-5xl">
      <SpecGroup title="rail">
        <TextField bind={bind} field="name" label="name" placeholder="VDD_CORE" />
        <QuantityField bind={bind} field="voltage" label="voltage" unit="V" />
      </SpecGroup>
      <TargetFields bind={bind} result={said.target} budget={said.budget} />
      <BandFields bind={bind} result={said.band} />
      <SourceFields bind={bind} result={said.source} />
      <PlaneFields bind={bind} result={said.planes} />
      <PackageFields bind={bind} result={said.package} />
      <TimeFields bind={bind} startUp={said.startUp} />
      <ConditionsFields bind={bind} result={said.conditions} />
      <div className="flex flex-col gap-4 border-t py-5">
        <SpecFaults own={own} theirs={theirs} failure={failure} wayOut={props.wayOut} />
        <div>
          <Button type="submit" variant="primary" disabled={props.pending}>
            {props.pending ? 'Saving …' : props.submitText}
          </Button>
        </div>
      </div>
      <UnsavedGuard dirty={differs(form, start) && !props.pending && !props.done} />
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
