import { USUAL_ESL_PERCENT, USUAL_ESR_PERCENT } from '@shared/engine/service/parasitics';
import type { UseFormReturn } from 'react-hook-form';
import { Section } from '@/components/ui/page';
import { CURVES, type CurveName } from '../lib/curve-fields';
import type { PartFormInput, PartFormOutput } from '../lib/part-form.schema';
import { PointsField } from './points-field';
import { QuantityField } from './quantity-field';

const NAMES = Object.keys(CURVES) as CurveName[];

interface Props {
  form: UseFormReturn<PartFormInput, unknown, PartFormOutput>;
}

/** How the part behaves away from its catalogue conditions; what stays empty is estimated, and said so wherever it counts. */
export function BehaviourFields({ form }: Props) {
  const { control, register } = form;
  const { errors } = form.formState;
  const quantity = { control, register };
  return (
    <Section title="behaviour" className="border-t pt-5">
      <p className="mb-4 text-stone">
        What the maker says of the part under bias, warm, cold and aged. Leave empty what is not known: an
        estimate stands in, marked as one.
      </p>
      <div className="grid gap-x-6 gap-y-6 lg:grid-cols-2">
        {NAMES.map((name) => (
          <PointsField key={name} name={name} form={form} />
        ))}
        <div className="grid gap-x-6 gap-y-4 sm:grid-cols-2 lg:col-span-2 lg:grid-cols-3">
          <QuantityField
            {...quantity}
            name="ageing_percent_per_decade"
            label="ageing, loss a decade of hours"
            hint="empty: usual for its dielectric"
            error={errors.ageing_percent_per_decade?.message}
          />
          <QuantityField
            {...quantity}
            name="esr_tolerance_percent"
            label="ESR tolerance, ±"
            hint={`empty: the usual ±${USUAL_ESR_PERCENT} %`}
            error={errors.esr_tolerance_percent?.message}
          />
          <QuantityField
            {...quantity}
            name="esl_tolerance_percent"
            label="ESL tolerance, ±"
            hint={`empty: the usual ±${USUAL_ESL_PERCENT} %`}
            error={errors.esl_tolerance_percent?.message}
          />
        </div>
      </div>
    </Section>
  );
}
