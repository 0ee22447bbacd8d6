import type { MountRecipe } from '@shared/schemas/board-setup.schema';
import type { ReactNode } from 'react';
import { useWidth } from '@/components/chart/use-width';
import { planGeometry } from '../lib/plan-geometry';
import type { Place, PlacedMount } from '../lib/recipe-mount';
import { sectionGeometry } from '../lib/section-geometry';
import { MountPlan } from './mount-plan';
import { MountSection } from './mount-section';

interface Props {
  recipe: MountRecipe;
  place: Place | null;
  mount: PlacedMount | null;
  /** What is typed cannot be understood now; drawn is what stood there before. */
  isOld: boolean;
  /** What stands beside the plan. */
  children: ReactNode;
}

/** From this width on the fields stand beside the plan. */
const BESIDE = 480;

/** Plan and section of a mount, its fields beside the plan. */
export function RecipeDrawings({ recipe, place, mount, isOld, children }: Props) {
  const [measure, width] = useWidth<HTMLDivElement>();
  const isBeside = width >= BESIDE;
  const planWidth = isBeside ? Math.min(300, Math.round(width * 0.44)) : width;
  const { reaches } = planGeometry(recipe);
  return (
    <div ref={measure} className="flex flex-col gap-5">
      <div className={isBeside ? 'flex gap-6' : 'flex flex-col gap-4'}>
        <div className="min-w-0 flex-1">{children}</div>
        {width > 0 && (
          <figure className="m-0 shrink-0" style={{ width: planWidth }}>
            <MountPlan recipe={recipe} width={planWidth} />
            <figcaption className="text-small text-stone">
              from above, to scale, on a generic 0402 (1.0 × 0.5 mm){isOld && ', as last understood'}
              {!reaches && (
                <span className="block text-brass">
                  ! dashed: at this spacing the{' '}
                  {recipe.trace_length_m === 0 ? 'vias do not lie in' : 'traces do not reach'} the pads of a
                  0402
                </span>
              )}
            </figcaption>
          </figure>
        )}
      </div>
      {width > 0 && place && mount && (
        <figure className="m-0">
          <MountSection geometry={sectionGeometry(recipe, place, mount)} side={place.side} width={width} />
          <figcaption className="text-small text-stone">
            section along pad, via, via, pad, unfolded and to scale{isOld && ', as last understood'}
          </figcaption>
        </figure>
      )}
    </div>
  );
}
