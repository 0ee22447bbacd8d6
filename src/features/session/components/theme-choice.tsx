import { setTheme, type Theme, useTheme } from '@/lib/theme';

const CHOICES: readonly (readonly [Theme, string])[] = [
  ['light', 'day'],
  ['dark', 'night'],
];

/** The pond by day or by night, on this device. */
export function ThemeChoice() {
  const theme = useTheme();
  return (
    <fieldset className="flex gap-6">
      <legend className="mb-1 text-small text-stone">kept on this device</legend>
      {CHOICES.map(([value, label]) => (
        <label key={value} className="inline-flex cursor-pointer items-center gap-2">
          <input
            type="radio"
            name="theme"
            className="size-3.5 accent-deep"
            checked={theme === value}
            onChange={() => setTheme(value)}
          />
          {label}
        </label>
      ))}
    </fieldset>
  );
}
