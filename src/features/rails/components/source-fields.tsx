import { ChoiceField, PointsField, QuantityField, type SpecBinding, SpecGroup } from './spec-fields';

/** What feeds the rail: the regulator's output impedance, and the plane pair. */
export function SourceFields({ bind, planes }: { bind: SpecBinding; planes: string }) {
  const { form } = bind;
  return (
    <>
      <SpecGroup
        title="source"
        result={form.sourceKind === 'damped' ? 'Z = R0 + jωL0 + ((RL + jωL) ∥ (R1 + jωL1))' : undefined}
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
        {form.sourceKind === 'rl' && (
          <>
            <QuantityField bind={bind} field="resistance" label="resistance" unit="Ω" />
            <QuantityField bind={bind} field="inductance" label="inductance" unit="H" />
          </>
        )}
        {form.sourceKind === 'damped' && (
          <>
            <QuantityField
              bind={bind}
              field="seriesResistance"
              label="R0, in series"
              unit="Ω"
              hint="empty: 0"
            />
            <QuantityField
              bind={bind}
              field="seriesInductance"
              label="L0, in series"
              unit="H"
              hint="empty: 0"
            />
            <QuantityField
              bind={bind}
              field="inductorResistance"
              label="RL, of the inductor"
              unit="Ω"
              hint="empty: 0"
            />
            <QuantityField bind={bind} field="inductorInductance" label="L, the inductor" unit="H" />
            <QuantityField bind={bind} field="dampingResistance" label="R1, damping" unit="Ω" />
            <QuantityField
              bind={bind}
              field="dampingInductance"
              label="L1, in the damping"
              unit="H"
              hint="empty: 0"
            />
          </>
        )}
        {form.sourceKind === 'table' && (
          <PointsField
            bind={bind}
            field="sourceTable"
            label="points"
            hint="one a line: frequency, Re Z, Im Z, e.g. 10k 1m 3m"
          />
        )}
      </SpecGroup>
      <SpecGroup title="plane pair" result={planes}>
        <ChoiceField
          bind={bind}
          field="planeKind"
          label="given as"
          options={[
            ['dimensions', 'dimensions'],
            ['values', 'C, R and L'],
            ['none', 'no planes'],
          ]}
        />
        {form.planeKind === 'dimensions' && (
          <>
            <QuantityField bind={bind} field="length" label="length" unit="mm" />
            <QuantityField bind={bind} field="width" label="width" unit="mm" />
            <QuantityField bind={bind} field="spacing" label="spacing of the planes" unit="mm" />
            <QuantityField bind={bind} field="permittivity" label="relative permittivity" unit="" />
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
        {form.planeKind === 'values' && (
          <QuantityField bind={bind} field="planeCapacitance" label="capacitance" unit="F" />
        )}
        {form.planeKind !== 'none' && (
          <>
            <QuantityField bind={bind} field="planeResistance" label="series resistance" unit="Ω" />
            <QuantityField bind={bind} field="planeInductance" label="series inductance" unit="H" />
          </>
        )}
      </SpecGroup>
    </>
  );
}
