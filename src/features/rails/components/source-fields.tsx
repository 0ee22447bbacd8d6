import { DampedFields } from './damped-fields';
import { SourceSketch } from './source-sketch';
import { SourceTableField } from './source-table-field';
import type { SpecBinding } from './spec-binding';
import { ChoiceField, QuantityField } from './spec-fields';
import { SpecGroup } from './spec-group';

/** What feeds the rail: the regulator's output impedance, with its picture over the band. */
export function SourceFields({ bind, result }: { bind: SpecBinding; result: string }) {
  const { sourceKind } = bind.form;
  return (
    <SpecGroup
      title="source"
      note={sourceKind === 'damped' ? 'Z = R0 + jωL0 + ((RL + jωL) ∥ (R1 + jωL1))' : undefined}
      below={sourceKind !== 'open' && <SourceSketch form={bind.settled} text={result} />}
      result={result}
    >
      <ChoiceField
        bind={bind}
        field="sourceKind"
        label="output impedance"
        options={[
          ['rl', 'R and L in series'],
          ['damped', 'damped R and L'],
          ['table', 'a table'],
          ['open', 'none'],
        ]}
      />
      {sourceKind === 'rl' && (
        <>
          <QuantityField bind={bind} field="resistance" label="resistance" unit="Ω" />
          <QuantityField bind={bind} field="inductance" label="inductance" unit="H" />
        </>
      )}
      {sourceKind === 'damped' && <DampedFields bind={bind} />}
      {sourceKind === 'table' && <SourceTableField bind={bind} />}
    </SpecGroup>
  );
}
