import { useId } from 'react';
import { cx } from '@/lib/class-names';

interface WordChoiceProps<T extends string> {
  legend: string;
  /** The legend stands above the words; else it is there for who cannot see them. */
  titled?: boolean;
  options: readonly (readonly [value: T, text: string])[];
  value: T;
  onChoice: (value: T) => void;
  className?: string;
}

/** One of a few words, the chosen one bold and underlined; a group of radio buttons to keyboard and screen reader. */
export function WordChoice<T extends string>({
  legend,
  titled = false,
  options,
  value,
  onChoice,
  className,
}: WordChoiceProps<T>) {
  const name = useId();
  return (
    <fieldset className={cx('flex flex-wrap gap-x-4 gap-y-1', className)}>
      <legend className={titled ? 'section-head mb-1' : 'sr-only'}>{legend}</legend>
      {options.map(([one, text]) => (
        <label
          key={one}
          className={cx(
            'cursor-pointer underline-offset-4 has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-deep',
            one === value ? 'font-bold text-ink underline' : 'text-deep hover:underline',
          )}
        >
          <input
            type="radio"
            name={name}
            className="sr-only"
            checked={one === value}
            onChange={() => onChoice(one)}
          />
          {text}
        </label>
      ))}
    </fieldset>
  );
}
