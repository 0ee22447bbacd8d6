import { Button } from '@/components/ui/button';
import { cx } from '@/lib/class-names';
import { inductanceText } from '../lib/inductance-text';
import type { RecipeView } from '../lib/recipe-view';
import { MountBar } from './mount-bar';

interface Props {
  view: RecipeView;
  /** Names of the rails that use it. */
  rails: readonly string[];
  isOpen: boolean;
  isFaulty: boolean;
  /** What a bar's whole width stands for, and the hairlines behind it. */
  full_H: number;
  ticks: readonly number[];
  onOpen: () => void;
  onPutBack: () => void;
}

/** Name, figure, bar: the axis at the list's foot hangs under the bars. */
export const RECIPE_COLUMNS =
  'grid grid-cols-[minmax(0,1fr)_5rem] gap-x-4 pl-2 pr-3 sm:grid-cols-[minmax(0,1fr)_5rem_minmax(0,1.1fr)]';

export function RecipeRow({ view, rails, isOpen, isFaulty, full_H, ticks, onOpen, onPutBack }: Props) {
  const { form, mount, reason } = view;
  return (
    <li
      className={cx(
        RECIPE_COLUMNS,
        'min-h-11 items-center border-b border-l-[3px] py-1.5',
        isOpen ? 'border-l-deep bg-wash' : 'border-l-transparent',
      )}
    >
      <div className="min-w-0">
        <button
          type="button"
          aria-pressed={isOpen}
          disabled={form.removed}
          className={cx(
            'block max-w-full truncate text-left underline-offset-4',
            form.removed ? 'text-stone line-through' : 'font-semibold hover:underline',
          )}
          title={form.name}
          onClick={onOpen}
        >
          {form.name.trim() || 'a recipe without a name'}
        </button>
        <Remark {...{ rails, isFaulty, isRemoved: form.removed }} />
      </div>
      <span className="text-right whitespace-nowrap">{mount ? inductanceText(mount.total_H) : '—'}</span>
      <div className="col-span-2 sm:col-span-1">
        {form.removed ? (
          <Button variant="plain" className="py-0" onClick={onPutBack}>
            Put back
          </Button>
        ) : mount ? (
          <MountBar segments={mount.segments} full_H={full_H} height={15} ticks={ticks} />
        ) : (
          <span className="text-small text-stone">{reason}</span>
        )}
      </div>
    </li>
  );
}

/** What goes, what is wrong, who uses it. */
function Remark({
  rails,
  isFaulty,
  isRemoved,
}: {
  rails: readonly string[];
  isFaulty: boolean;
  isRemoved: boolean;
}) {
  if (isRemoved) return <span className="block text-small text-stone">goes with the next save</span>;
  if (isFaulty) return <span className="block text-small text-kingfisher">▲ look again</span>;
  if (rails.length === 0) return null;
  return (
    <span className="block truncate text-small text-stone" title={rails.join(', ')}>
      {rails.join(', ')}
    </span>
  );
}
