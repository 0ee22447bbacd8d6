import { parseQuantity } from '@shared/units/parse';
import { useState } from 'react';
import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/input';
import { AGES_YEARS, ageOfYears_h, ageText, yearsOfAge } from '../lib/situation';
import { TypedValue } from './typed-value';

const OTHER = 'other';

interface Props {
  age_h: number;
  onChoose: (age_h: number) => void;
}

/** How long the part has been in use: one of the usual ages, or years as typed. */
export function AgeChoice({ age_h, onChoose }: Props) {
  const years = yearsOfAge(age_h);
  const isListed = AGES_YEARS.some((one) => one === years);
  const [isTyping, setTyping] = useState(!isListed);
  return (
    <div className="flex items-end gap-3">
      <Field label="age">
        {(field) => (
          <Select
            {...field}
            value={isTyping ? OTHER : String(years)}
            onChange={(event) => {
              const chosen = event.target.value;
              setTyping(chosen === OTHER);
              if (chosen !== OTHER) onChoose(ageOfYears_h(Number(chosen)));
            }}
          >
            {AGES_YEARS.map((one) => (
              <option key={one} value={String(one)}>
                {ageText(ageOfYears_h(one))}
              </option>
            ))}
            <option value={OTHER}>other …</option>
          </Select>
        )}
      </Field>
      {isTyping && (
        <span>
          <TypedValue
            label="age in years"
            unit="years"
            value={years}
            write={String}
            read={readYears}
            onCommit={(typed) => onChoose(ageOfYears_h(typed))}
          />
        </span>
      )}
    </div>
  );
}

const MOST_YEARS = 100;

function readYears(text: string) {
  const parsed = parseQuantity(text, '');
  if (!parsed.ok || (parsed.value >= 0 && parsed.value <= MOST_YEARS)) return parsed;
  return { ok: false, reason: `0 to ${MOST_YEARS} years` } as const;
}
