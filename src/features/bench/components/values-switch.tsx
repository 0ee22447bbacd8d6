import { cx } from '@/lib/class-names';
import { type ValuesView, VIEW_NAMES } from '../lib/values-view';

const VIEWS: readonly ValuesView[] = ['catalogue', 'service', 'worst'];

/** Chooses the values that curve, strips and headroom are shown with. */
export function ValuesSwitch({ view, onView }: { view: ValuesView; onView: (view: ValuesView) => void }) {
  return (
    <fieldset className="flex flex-wrap gap-x-4 gap-y-1">
      <legend className="sr-only">values shown</legend>
      {VIEWS.map((one) => (
        <label
          key={one}
          className={cx(
            'cursor-pointer underline-offset-4 has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-deep',
            one === view ? 'font-bold text-ink underline' : 'text-deep hover:underline',
          )}
        >
          <input
            type="radio"
            name="values shown"
            className="sr-only"
            checked={one === view}
            onChange={() => onView(one)}
          />
          {VIEW_NAMES[one]}
        </label>
      ))}
    </fieldset>
  );
}
