import type { MountRecipe } from '@shared/schemas/board-setup.schema';
import { formatLength } from '@shared/units/format';
import { BODY, PAD, type Point, planGeometry } from '../lib/plan-geometry';
import { Across, Along, Letters } from './plan-measures';

interface Props {
  recipe: MountRecipe;
  /** px; the drawing is as large as fits. */
  width: number;
}

const MARGIN = { left: 14, right: 48, top: 14, bottom: 56 };
const MOST_PX_PER_MM = 140;
const MOST_HEIGHT = 330;

/** The mount from above, to scale: pads, traces, vias, the part drawn faint. */
export function MountPlan({ recipe, width }: Props) {
  const plan = planGeometry(recipe);
  const { box } = plan;
  const scale = Math.min(
    (width - MARGIN.left - MARGIN.right) / (box.right - box.left),
    (MOST_HEIGHT - MARGIN.top - MARGIN.bottom) / (box.bottom - box.top),
    MOST_PX_PER_MM,
  );
  const centre = MARGIN.left + (width - MARGIN.left - MARGIN.right) / 2;
  const height = (box.bottom - box.top) * scale + MARGIN.top + MARGIN.bottom;
  const top = MARGIN.top;
  const x = (mm: number) => centre + mm * scale;
  const y = (mm: number) => top + (mm - box.top) * scale;
  const line = (points: readonly Point[], mirror: 1 | -1) =>
    points
      .map(([px, py], i) => `${i === 0 ? 'M' : 'L'}${x(mirror * px).toFixed(1)} ${y(py).toFixed(1)}`)
      .join('');
  const [first] = plan.vias;
  const bottom = y(box.bottom);
  return (
    <svg
      role="img"
      aria-label={planWords(recipe)}
      width={width}
      height={height}
      className="block text-small"
      fill="none"
    >
      {([-1, 1] as const).map((mirror) => (
        <g key={mirror}>
          <rect
            x={x(mirror === 1 ? PAD.inner : -PAD.outer)}
            y={y(-PAD.half)}
            width={(PAD.outer - PAD.inner) * scale}
            height={2 * PAD.half * scale}
            className="fill-shallow stroke-deep"
          />
          {plan.trace && (
            <path
              d={line(plan.trace, mirror)}
              className={plan.reaches ? 'stroke-shallow' : 'stroke-stone'}
              strokeWidth={plan.reaches ? plan.width * scale : 1.2}
              strokeDasharray={plan.reaches ? undefined : '3 3'}
              strokeLinejoin="round"
              strokeLinecap="butt"
            />
          )}
          {plan.vias.map(([vx, vy]) => (
            <g key={vy}>
              <circle cx={x(mirror * vx)} cy={y(vy)} r={(plan.ring / 2) * scale} className="fill-deep" />
              <circle cx={x(mirror * vx)} cy={y(vy)} r={(plan.drill / 2) * scale} className="fill-paper" />
            </g>
          ))}
        </g>
      ))}
      <rect
        x={x(-BODY.length / 2)}
        y={y(-BODY.width / 2)}
        width={BODY.length * scale}
        height={BODY.width * scale}
        className="stroke-stone"
        strokeDasharray="2 3"
      />
      <Letters plan={plan} {...{ x, y, scale }} />
      <Across
        from={x(-first[0])}
        to={x(first[0])}
        y={bottom + 12}
        start={y(plan.vias[plan.vias.length - 1][1] + plan.ring / 2)}
        text={`s ${formatLength(recipe.via_spacing_m)}`}
      />
      {plan.trace && plan.reaches && <Along trace={plan.trace} {...{ x, y }} edge={x(box.right) + 8} />}
      <g className="stroke-ink">
        <path d={`M${MARGIN.left} ${height - 8}h${scale}m0 -3v6m${-scale} -6v6`} />
      </g>
      <text x={MARGIN.left + scale + 6} y={height - 4} className="fill-stone">
        1 mm
      </text>
    </svg>
  );
}

const planWords = (recipe: MountRecipe): string =>
  `plan of the mount: ${recipe.trace_length_m === 0 ? 'vias in the pads' : `traces of ${formatLength(recipe.trace_length_m)}`}, vias ${formatLength(recipe.via_spacing_m)} apart`;
