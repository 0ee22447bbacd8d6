import type { SpecBinding } from './spec-binding';
import { ChoiceField, QuantityField } from './spec-fields';
import { SpecGroup } from './spec-group';

/** Where the rail must stay under its waterline. */
export function BandFields({ bind, result }: { bind: SpecBinding; result: string }) {
  return (
    <SpecGroup title="band" result={result}>
      <ChoiceField
        bind={bind}
        field="bandKind"
        label="given as"
        options={[
          ['direct', 'frequencies'],
          ['derived', 'from rise time'],
        ]}
      />
      {bind.form.bandKind === 'direct' ? (
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
  );
}
