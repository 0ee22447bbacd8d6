import type { SpecBinding } from './spec-binding';
import { ChoiceField, DescribedField, QuantityField } from './spec-fields';
import { SpecGroup } from './spec-group';

/** The load's package and die. */
export function PackageFields({ bind, result }: { bind: SpecBinding; result: string }) {
  return (
    <SpecGroup title="package and die" result={result}>
      <DescribedField bind={bind} field="hasPackage" />
      {bind.form.hasPackage && (
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
          <QuantityField bind={bind} field="dieResistance" label="die resistance" unit="Ω" hint="empty: 0" />
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
  );
}
