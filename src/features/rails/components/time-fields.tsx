import type { SpecBinding } from './spec-binding';
import { DescribedField, QuantityField } from './spec-fields';
import { SpecGroup } from './spec-group';

/** What happens in time: the load's step, and how the rail starts. */
export function TimeFields({ bind, startUp }: { bind: SpecBinding; startUp: string }) {
  const { form } = bind;
  const without =
    form.targetKind === 'step'
      ? 'without it the target’s own step is tried'
      : 'without it there is no step to try, since this target names none';
  return (
    <>
      <SpecGroup title="load step" note={`For droop and worst pattern on the bench; ${without}.`}>
        <DescribedField bind={bind} field="hasStep" />
        {form.hasStep && (
          <>
            <QuantityField bind={bind} field="stepBefore" label="current before" unit="A" hint="empty: 0" />
            <QuantityField bind={bind} field="stepSize" label="step" unit="A" />
            <QuantityField bind={bind} field="stepRise" label="rise time" unit="s" />
            <QuantityField bind={bind} field="stepHold" label="held for" unit="s" />
            <QuantityField bind={bind} field="stepFall" label="fall time" unit="s" />
          </>
        )}
      </SpecGroup>
      <SpecGroup
        title="start-up"
        note="Inrush into the bank is checked with soft start and current limit; without them only the mean current at an assumed soft start is said."
        result={startUp}
      >
        <DescribedField bind={bind} field="hasStartUp" />
        {form.hasStartUp && (
          <>
            <QuantityField
              bind={bind}
              field="softStart"
              label="soft start"
              unit="s"
              hint="from zero to the rail’s voltage"
            />
            <QuantityField
              bind={bind}
              field="currentLimit"
              label="current limit"
              unit="A"
              hint="of the regulator"
            />
          </>
        )}
      </SpecGroup>
    </>
  );
}
