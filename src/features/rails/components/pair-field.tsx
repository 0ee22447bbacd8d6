import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/input';
import { TextLink } from '@/components/ui/text-link';
import { paths } from '@/config/paths';
import { pairChoices } from '../lib/plane-pairs';
import type { SpecBinding } from './spec-binding';

/** Which two planes of the stack-up the rail lies on. A pair that is no longer there stays in the list and is said at once. */
export function PairField({ bind }: { bind: SpecBinding }) {
  const { pairUpper, pairLower } = bind.form;
  const choices = pairChoices(bind.setup);
  const index = choices.findIndex(({ upper, lower }) => upper === pairUpper && lower === pairLower);
  const isGone = index < 0 && pairUpper !== '';
  const page = (
    <TextLink to={paths.stackup(bind.boardId)} target="_blank">
      {bind.setup.stackup ? 'its page, in a new tab' : 'describe it, in a new tab'}
    </TextLink>
  );
  const hint = !bind.setup.stackup ? (
    <>this board has no stack-up yet: {page}</>
  ) : choices.length === 0 ? (
    <>no two planes of the stack-up have only dielectric between them: {page}</>
  ) : (
    'spacing and εr follow the board’s stack-up'
  );
  return (
    <div className="flex min-w-0 flex-col gap-1 xl:col-span-2">
      <Field
        label="planes of the stack-up"
        hint={hint}
        error={bind.errors.pairUpper ?? (isGone ? bind.live.pairUpper : undefined)}
      >
        {(control) => (
          <Select
            {...control}
            name="pair"
            value={index < 0 ? (isGone ? 'gone' : '') : String(index)}
            onChange={(event) => {
              const chosen = choices[Number(event.target.value)];
              if (chosen) bind.set({ pairUpper: chosen.upper, pairLower: chosen.lower });
            }}
          >
            {index < 0 && (
              <option value={isGone ? 'gone' : ''} disabled={!isGone}>
                {isGone ? `${pairUpper} – ${pairLower}: not there now` : 'choose two planes'}
              </option>
            )}
            {choices.map(({ upper, lower, text }, i) => (
              <option key={`${upper} ${lower}`} value={String(i)}>
                {text}
              </option>
            ))}
          </Select>
        )}
      </Field>
      {bind.errors.pairUpper !== undefined && choices.length === 0 && (
        <p className="text-small text-stone">{page}</p>
      )}
    </div>
  );
}
