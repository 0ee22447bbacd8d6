import type { ServiceValues } from '@shared/engine/service/in-service';
import type { Part } from '@shared/schemas/part.schema';
import type { DocumentPart } from '@shared/schemas/rail-document.schema';
import type { ReactNode } from 'react';
import type { Situation } from '../lib/situation';
import type { Mark } from './capacitance-mark';

/** What the panel of one condition needs of the page. */
export interface ConditionPanelProps {
  part: Part;
  document: DocumentPart;
  at: Situation;
  /** Null while the engine refuses what is chosen. */
  values: ServiceValues | null;
  set: (change: Partial<Situation>) => void;
}

/** One condition: its name, what is known of it, its value to type, and its chart with the float. */
export function ConditionPanel({
  title,
  note,
  typed,
  children,
}: {
  title: string;
  note: ReactNode;
  typed: ReactNode;
  children: ReactNode;
}) {
  return (
    <div className="min-w-0">
      <div className="flex items-center justify-between gap-x-4">
        <h3 className="font-semibold">{title}</h3>
        {typed}
      </div>
      <p className="mb-1 text-small text-stone">{note}</p>
      {children}
    </div>
  );
}

/** What the point in service is on a chart. */
export const markAt = (x: number, values: ServiceValues | null): Mark | null =>
  values && {
    x,
    capacitance_F: values.capacitance_F,
    estimated: values.factors.some((one) => one.estimated),
  };
