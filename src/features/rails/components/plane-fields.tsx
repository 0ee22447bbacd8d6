import { PairField } from './pair-field';
import type { SpecBinding } from './spec-binding';
import { ChoiceField, QuantityField } from './spec-fields';
import { SpecGroup } from './spec-group';

/** The plane pair: from the board's stack-up, from its own dimensions, or as values. */
export function PlaneFields({ bind, result }: { bind: SpecBinding; result: string }) {
  const { planeKind } = bind.form;
  const hasGeometry = planeKind === 'dimensions' || planeKind === 'stackup';
  return (
    <SpecGroup title="plane pair" result={result}>
      <ChoiceField
        bind={bind}
        field="planeKind"
        label="given as"
        options={[
          ['stackup', bind.setup.stackup ? 'from the stack-up' : 'stack-up: none'],
          ['dimensions', 'dimensions'],
          ['values', 'C, R and L'],
          ['none', 'no planes'],
        ]}
      />
      {planeKind === 'stackup' && <PairField bind={bind} />}
      {hasGeometry && (
        <>
          <QuantityField bind={bind} field="length" label="length" unit="mm" />
          <QuantityField bind={bind} field="width" label="width" unit="mm" />
        </>
      )}
      {planeKind === 'dimensions' && (
        <>
          <QuantityField bind={bind} field="spacing" label="spacing of the planes" unit="mm" />
          <QuantityField bind={bind} field="permittivity" label="relative permittivity" unit="" />
        </>
      )}
      {hasGeometry && (
        <>
          <QuantityField
            bind={bind}
            field="viaRadius"
            label="radius of a part’s vias"
            unit="mm"
            hint="for the path to the load"
          />
          <QuantityField bind={bind} field="loadRadius" label="radius of the load’s vias" unit="mm" />
        </>
      )}
      {planeKind === 'values' && (
        <QuantityField bind={bind} field="planeCapacitance" label="capacitance" unit="F" />
      )}
      {planeKind !== 'none' && (
        <>
          <QuantityField bind={bind} field="planeResistance" label="series resistance" unit="Ω" />
          <QuantityField bind={bind} field="planeInductance" label="series inductance" unit="H" />
        </>
      )}
    </SpecGroup>
  );
}
