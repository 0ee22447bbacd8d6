import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { formatPath } from '@shared/schemas/common.schema';
import { type RailSpec, type RailSpecInput, railSpecSchema } from '@shared/schemas/rail-spec.schema';
import { errorsAtFields, onShownFields } from './field-of-path';
import { readConditions } from './read-conditions';
import { readLoadStep, readPackage, readStartUp } from './read-load';
import { readPlanes } from './read-planes';
import { readSource } from './read-source';
import { readBand, readTarget } from './read-target';
import type { SpecErrors, SpecForm } from './spec-form';
import { type SpecReader, specReader } from './spec-reader';

export type SpecAnswer = { spec: RailSpec } | { errors: SpecErrors };

/** Reads the form on a board of this setup: a valid specification, or what is wrong and where. */
export function readSpec(form: SpecForm, setup: BoardSetup): SpecAnswer {
  const reader = specReader(form);
  const checked = railSpecSchema.safeParse(typed(reader, setup));
  if (checked.success && Object.keys(reader.errors).length === 0) return { spec: checked.data };
  // What could not be read is NaN and has its own sentence already.
  const faults = (checked.error?.issues ?? [])
    .filter((issue) => issue.code !== 'invalid_type')
    .map(({ path, message }) => ({ path: formatPath(path), message: onItsLine(reader, path, message) }));
  const all = onShownFields({ ...errorsAtFields(faults), ...reader.errors }, form);
  return { errors: Object.keys(all).length > 0 ? all : { form: 'something in this form is not right' } };
}

function typed(reader: SpecReader, setup: BoardSetup): RailSpecInput {
  const { form } = reader;
  const voltage_V = reader.quantity('voltage', 'V');
  const plane = readPlanes(reader, setup);
  const pack = readPackage(reader);
  const load_step = readLoadStep(reader);
  const start_up = readStartUp(reader);
  const conditions = readConditions(reader);
  return {
    name: form.name,
    voltage_V,
    ...readTarget(reader, voltage_V),
    ...readBand(reader),
    source: readSource(reader),
    observe: form.hasPackage ? form.observe : 'pins',
    ...(plane && { plane }),
    ...(pack && { package: pack }),
    ...(load_step && { load_step }),
    ...(start_up && { start_up }),
    ...(conditions && { conditions }),
  };
}

/** A fault of one point of a list names the line that the point stands on. */
function onItsLine({ lines }: SpecReader, path: readonly PropertyKey[], message: string): string {
  const [subject, list, index] = path;
  if (list !== 'points' || typeof index !== 'number') return message;
  const line = lines[subject === 'target' ? 'mask' : 'sourceTable']?.[index];
  return line === undefined ? message : `line ${line}: ${message}`;
}
