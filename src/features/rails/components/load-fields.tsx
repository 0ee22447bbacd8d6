import { Checkbox } from '@/components/ui/input';
import { ChoiceField, QuantityField, type SpecBinding, SpecGroup } from './spec-fields';

/** The load: its package and die, and the current step it makes. */
export function LoadFields({ bind }: { bind: SpecBinding }) {
  const { form } = bind;
  return (
    <>
      <SpecGroup title="package and die">
        <div className="flex items-center">
          <Checkbox
            label="described"
            name="hasPackage"
            checked={form.hasPackage}
            onChange={(event) => bind.set({ hasPackage: event.target.checked })}
          />
        </div>
        {form.hasPackage && (
          <>
            <QuantityField
              bind={bind}
              field="packageResistance"
              label="package resistance"
              unit="Ω"
              hint="empty: 0"
            />
            <QuantityField bind={bind} field="packageInductance" label="package inductance" unit="H" />
            <QuantityField
              bind={bind}
              field="dieCapacitance"
              label="die capacitance"
              unit="F"
              hint="empty: none"
            />
            <QuantityField
              bind={bind}
              field="dieResistance"
              label="die resistance"
              unit="Ω"
              hint="empty: 0"
            />
            <ChoiceField
              bind={bind}
              field="observe"
              label="impedance seen at"
              options={[
                ['pins', 'the pins'],
                ['die', 'the die'],
              ]}
            />
          </>
        )}
      </SpecGroup>
      <SpecGroup title="load step">
        <div className="flex items-center">
          <Checkbox
            label="described"
            name="hasStep"
            checked={form.hasStep}
            onChange={(event) => bind.set({ hasStep: event.target.checked })}
          />
        </div>
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
    </>
  );
}
