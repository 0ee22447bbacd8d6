import type { End } from '@shared/engine/service/parasitics';
import { useId } from 'react';
import { cx } from '@/lib/class-names';

const ENDS: readonly End[] = ['low', 'nominal', 'high'];

interface Props {
  label: string;
  value: End;
  onChoose: (end: End) => void;
}

/** Which end of a tolerance, as three words of which one is underlined; arrow keys go from one to the next. */
export function EndsChoice({ label, value, onChoose }: Props) {
  const name = useId();
  return (
    <fieldset className="flex flex-col gap-1">
      <legend className="section-head mb-1">{label}</legend>
      <div className="flex gap-4 py-1.5">
        {ENDS.map((end) => (
          <label
            key={end}
            className={cx(
              'cursor-pointer underline-offset-4 has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-deep',
              end === value ? 'font-semibold underline decoration-2' : 'text-deep hover:underline',
            )}
          >
            <input
              type="radio"
              name={name}
              className="sr-only"
              checked={end === value}
              onChange={() => onChoose(end)}
            />
            {end}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
