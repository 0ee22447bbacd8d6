import { BudgetFields } from './budget-fields';
import type { SpecBinding } from './spec-binding';
import { ChoiceField, PointsField, QuantityField } from './spec-fields';
import { SpecGroup } from './spec-group';

/** The waterline: how high it lies, where it rises, and what the ripple behind it is left by. */
export function TargetFields({
  bind,
  result,
  budget,
}: {
  bind: SpecBinding;
  result: string;
  /** What the budget of a target that names no ripple comes to. */
  budget: string;
}) {
  const { targetKind, budgetKind } = bind.form;
  const isStep = targetKind === 'step';
  return (
    <>
      <SpecGroup
        title="target"
        result={result}
        below={isStep && budgetKind === 'budget' && <BudgetFields bind={bind} />}
      >
        <ChoiceField
          bind={bind}
          field="targetKind"
          label="given as"
          options={[
            ['step', 'ripple and step'],
            ['flat', 'impedance'],
            ['mask', 'a mask'],
          ]}
        />
        {isStep && (
          <>
            <ChoiceField
              bind={bind}
              field="budgetKind"
              label="ripple"
              options={[
                ['none', 'given in %'],
                ['budget', 'left by a budget'],
              ]}
            />
            {budgetKind === 'none' && (
              <QuantityField bind={bind} field="ripple" label="ripple allowed" unit="%" />
            )}
            <QuantityField bind={bind} field="step" label="load step" unit="A" />
          </>
        )}
        {targetKind === 'flat' && (
          <QuantityField bind={bind} field="impedance" label="target impedance" unit="Ω" />
        )}
        {targetKind === 'mask' ? (
          <div className="sm:col-span-2">
            <PointsField
              bind={bind}
              field="mask"
              label="points"
              hint="one a line: frequency, impedance, e.g. 10k 3m"
            />
          </div>
        ) : (
          <RiseFields bind={bind} />
        )}
      </SpecGroup>
      {!isStep && (
        <SpecGroup
          title="noise budget"
          note="What the rail’s tolerance leaves as ripple: load step and worst pattern are held against it."
          below={budgetKind === 'budget' && <BudgetFields bind={bind} />}
          result={budget}
        >
          <ChoiceField
            bind={bind}
            field="budgetKind"
            label="ripple in time"
            options={[
              ['none', 'not limited'],
              ['budget', 'left by a budget'],
            ]}
          />
        </SpecGroup>
      )}
    </>
  );
}

function RiseFields({ bind }: { bind: SpecBinding }) {
  const { riseKind } = bind.form;
  return (
    <>
      <div className="sm:col-span-2">
        <ChoiceField
          bind={bind}
          field="riseKind"
          label="towards high frequencies"
          options={[
            ['level', 'level'],
            ['time', 'rises after 1 ÷ (π · rise time)'],
            ['inductance', 'rises with an inductance'],
          ]}
        />
      </div>
      {riseKind === 'time' && (
        <QuantityField
          bind={bind}
          field="targetRise"
          label="rise time of the load"
          unit="s"
          hint="beyond 1 ÷ (π · rise time) its spectrum falls faster"
        />
      )}
      {riseKind === 'inductance' && (
        <QuantityField
          bind={bind}
          field="targetInductance"
          label="inductance"
          unit="H"
          hint="its 2πf·L may be seen beyond the level"
        />
      )}
    </>
  );
}
