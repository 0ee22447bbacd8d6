import type { Conditions } from '@shared/schemas/rail-spec.schema';
import { Checkbox } from '@/components/ui/input';
import type { SpecBinding } from './spec-binding';
import { ChoiceField, TextField } from './spec-fields';
import { SpecGroup } from './spec-group';

const TOLERANCES: readonly (readonly [Conditions['vary'][number], string])[] = [
  ['capacitance', 'capacitance'],
  ['esr', 'ESR'],
  ['esl', 'ESL'],
];

/** Under what the rail must hold: in service at the usual temperature and full age, worst cases over all of it. */
export function ConditionsFields({ bind, result }: { bind: SpecBinding; result: string }) {
  const isStated = bind.form.conditionsKind === 'stated';
  return (
    <SpecGroup
      title="conditions"
      note="In service means the usual temperature and full age; worst cases go to every corner."
      below={isStated && <ToleranceChoice bind={bind} />}
      result={result}
    >
      <ChoiceField
        bind={bind}
        field="conditionsKind"
        label="conditions of this rail"
        options={[
          ['stated', 'state them'],
          ['assumed', 'leave them assumed'],
        ]}
      />
      {isStated && (
        <>
          <TextField bind={bind} field="coldest" label="coldest, °C" />
          <TextField bind={bind} field="usual" label="usual, °C" />
          <TextField bind={bind} field="hottest" label="hottest, °C" />
          <TextField bind={bind} field="age" label="age, years" hint="or hours: 87660 h" />
        </>
      )}
    </SpecGroup>
  );
}

function ToleranceChoice({ bind }: { bind: SpecBinding }) {
  const { vary } = bind.form;
  const toggle = (one: Conditions['vary'][number], on: boolean) =>
    bind.set({
      vary: TOLERANCES.map(([name]) => name).filter((name) => (name === one ? on : vary.includes(name))),
    });
  return (
    <fieldset className="flex flex-wrap items-center gap-x-6 gap-y-2">
      <legend className="section-head pb-1">tolerances that go to their ends in the worst cases</legend>
      {TOLERANCES.map(([name, text]) => (
        <Checkbox
          key={name}
          label={text}
          name={`vary-${name}`}
          checked={vary.includes(name)}
          onChange={(event) => toggle(name, event.target.checked)}
        />
      ))}
    </fieldset>
  );
}
