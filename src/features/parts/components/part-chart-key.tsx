import type { ServiceValues } from '@shared/engine/service/in-service';
import type { Part } from '@shared/schemas/part.schema';
import { formatQuantity } from '@shared/units/format';
import type { ReactNode } from 'react';
import type { PartCurves } from '../lib/part-curves';

function Key({ line, children }: { line: ReactNode; children: ReactNode }) {
  return (
    <span>
      <svg width="24" height="8" className="mr-2 inline-block" fill="none" aria-hidden="true">
        {line}
      </svg>
      {children}
    </span>
  );
}

interface Props {
  part: Part;
  curves: PartCurves;
  values: ServiceValues | null;
}

/** What each line of the part's chart is. */
export function PartChartKey({ part, curves, values }: Props) {
  const lowest = curves.catalogueLowest;
  return (
    <figcaption className="mt-1 flex flex-wrap gap-x-6 text-small text-stone">
      {values ? (
        <Key line={<path d="M0 4H24" className="stroke-ink" strokeWidth="2" />}>
          as mounted, in service{values.estimated && <span className="text-brass"> ≈ estimated</span>}
        </Key>
      ) : (
        <span>in service: refused, see above</span>
      )}
      <Key line={<path d="M0 4H24" className="stroke-stone" strokeWidth="1.2" />}>
        as mounted, {formatQuantity(part.esl_H + part.mount_H, 'H')}, catalogue
        {lowest && `: lowest at ${formatQuantity(lowest[0], 'Hz')}`}
      </Key>
      <Key line={<path d="M0 4H24" className="stroke-stone" strokeWidth="1.2" strokeDasharray="1 3" />}>
        the part alone, {formatQuantity(part.esl_H, 'H')}, catalogue
      </Key>
      {curves.measured.length > 0 && (
        <Key line={<circle cx="12" cy="4" r="2" className="fill-paper stroke-deep" />}>
          measured points, {curves.measured.length}
        </Key>
      )}
      {part.esr_table && <span>ESR over frequency by its table</span>}
    </figcaption>
  );
}
