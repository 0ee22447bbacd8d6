import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { conditionsFields, packageFields, startUpFields, stepFields } from './form-of-load';
import { planeFields, sourceFields } from './form-of-supply';
import { bandFields, budgetFields, targetFields } from './form-of-target';
import type { SpecForm } from './spec-form';
import { EMPTY_SPEC } from './spec-form-values';

/** The form that reads back as `spec`. */
export function formOf(spec: RailSpec): SpecForm {
  return {
    ...EMPTY_SPEC,
    name: spec.name,
    voltage: String(spec.voltage_V),
    ...targetFields(spec),
    ...budgetFields(spec),
    ...bandFields(spec),
    ...sourceFields(spec.source),
    ...planeFields(spec),
    observe: spec.observe,
    ...packageFields(spec),
    ...stepFields(spec),
    ...startUpFields(spec),
    ...conditionsFields(spec),
  };
}
