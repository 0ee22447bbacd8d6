import type { RailDocument } from '@shared/schemas/rail-document.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import type { RailInTime, RailVerdicts } from '@workers/checks/checks.interface';
import { memo, type ReactNode } from 'react';
import { InServiceTable } from './in-service-table';
import { LoadStepSection } from './load-step-section';
import { WorstCasesSection } from './worst-cases-section';
import { YieldSection } from './yield-section';

interface BenchSectionsProps {
  spec: RailSpec;
  verdicts: RailVerdicts | null;
  inTime: RailInTime | null;
  nameOf: (part: string) => string;
}

/** Under the bank: everything that the margin at the right sums up, in full. Drawn anew only when an answer comes. */
export const BenchSections = memo(function BenchSections({
  spec,
  verdicts,
  inTime,
  nameOf,
}: BenchSectionsProps) {
  return (
    <>
      {verdicts && verdicts.parts.length > 0 && (
        <BenchSection
          id="in-service"
          title="values in service"
          lead="Catalogue value × what bias, temperature, age and tolerance leave of it; at the right, the least and the most over all corners."
        >
          <InServiceTable spec={spec} parts={verdicts.parts} nameOf={nameOf} />
        </BenchSection>
      )}
      {verdicts && verdicts.parts.length > 0 && (
        <BenchSection id="worst-cases" title="worst cases">
          <WorstCasesSection verdicts={verdicts} nameOf={nameOf} />
        </BenchSection>
      )}
      {inTime && !inTime.reason && (
        <BenchSection id="load-step" title="load step and worst pattern">
          <LoadStepSection time={inTime} />
        </BenchSection>
      )}
    </>
  );
});

/** Monte Carlo over the bank's tolerances, on demand. */
export function YieldOfBank({
  document,
  nameOf,
}: {
  document: RailDocument;
  nameOf: (part: string) => string;
}) {
  return (
    <BenchSection
      id="yield"
      title="yield over tolerance"
      lead="Monte Carlo in service at the usual temperature and full age: every line’s C, ESR and ESL evenly drawn from their tolerances, the parts of one line alike, as from one reel."
    >
      <YieldSection document={document} nameOf={nameOf} />
    </BenchSection>
  );
}

function BenchSection({
  id,
  title,
  lead,
  children,
}: {
  id: string;
  title: string;
  lead?: string;
  children: ReactNode;
}) {
  return (
    <section id={id} aria-labelledby={`${id}-head`} className="scroll-mt-16 border-t pt-3">
      <h2 id={`${id}-head`} className="font-semibold">
        {title}
      </h2>
      {lead && <p className="mb-3 max-w-prose text-small text-stone">{lead}</p>}
      {children}
    </section>
  );
}
