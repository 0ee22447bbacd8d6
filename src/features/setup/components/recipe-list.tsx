import { linearTicks } from '@/components/chart/linear-axis';
import { cx } from '@/lib/class-names';
import type { RecipeView } from '../lib/recipe-view';
import type { SetupUsage } from '../lib/setup-usage';
import { RECIPE_COLUMNS, RecipeRow } from './recipe-row';

interface Props {
  views: readonly RecipeView[];
  usage: SetupUsage;
  open: string | null;
  /** Recipes with something wrong in them. */
  faulty: ReadonlySet<string>;
  onOpen: (id: string) => void;
  onPutBack: (id: string) => void;
}

const PICO = 1e-12;

/** The recipes with their inductance, compared on one axis. */
export function RecipeList({ views, usage, open, faulty, onOpen, onPutBack }: Props) {
  const most_H = Math.max(0, ...views.map(({ mount }) => mount?.total_H ?? 0));
  const full_H = most_H > 0 ? most_H * 1.06 : 1e-9;
  const ticks = linearTicks(0, full_H / PICO, 4);
  return (
    <div className="min-w-0">
      <ul aria-label="mount recipes" className="border-t">
        {views.map((view) => (
          <RecipeRow
            key={view.form.id}
            view={view}
            rails={usage.recipes.get(view.form.id) ?? []}
            isOpen={view.form.id === open}
            isFaulty={faulty.has(view.form.id)}
            full_H={full_H}
            ticks={ticks.map((tick) => tick * PICO)}
            onOpen={() => onOpen(view.form.id)}
            onPutBack={() => onPutBack(view.form.id)}
          />
        ))}
      </ul>
      {most_H > 0 && (
        <div aria-hidden className={cx(RECIPE_COLUMNS, 'border-l-[3px] border-transparent')}>
          <div className="relative col-span-2 h-5 text-small text-stone sm:col-span-1 sm:col-start-3">
            {ticks.map((tick) => (
              <span
                key={tick}
                className={cx('absolute whitespace-nowrap', shiftOf((tick * PICO) / full_H))}
                style={{ left: `${(100 * tick * PICO) / full_H}%` }}
              >
                {tick === 0 ? '0' : `${tick} pH`}
              </span>
            ))}
          </div>
        </div>
      )}
    </div>
  );
}

/** A figure stands under its hairline, but does not hang over an end of the axis. */
const shiftOf = (place: number): string =>
  place === 0 ? '' : place > 0.9 ? '-translate-x-full' : '-translate-x-1/2';
