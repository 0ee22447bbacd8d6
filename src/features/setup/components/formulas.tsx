import { inductanceText } from '../lib/inductance-text';
import type { PlacedMount } from '../lib/recipe-mount';

/** Each part of the loop with its formula, its numbers and where the formula is from. */
export function Formulas({ mount }: { mount: PlacedMount }) {
  return (
    <details className="text-small">
      <summary className="w-fit text-deep underline-offset-4 hover:underline">
        formulas and their sources
      </summary>
      <dl className="mt-2 flex flex-col gap-2">
        {mount.segments.map((segment) => (
          <div key={segment.part}>
            <dt className="text-stone">
              {segment.part}: {segment.source}
            </dt>
            <dd>
              {segment.formula} ={' '}
              <span className="font-semibold">{inductanceText(segment.inductance_H)}</span>
            </dd>
          </div>
        ))}
      </dl>
    </details>
  );
}
