import { railCautions } from '@shared/rail/cautions';
import type { RevisionRail } from '@shared/schemas/revision.schema';
import { Facts } from '@/components/ui/facts';
import { HeadroomSign } from '@/components/ui/headroom-sign';
import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/page';
import { BankTable } from './bank-table';
import { ChecksList } from './checks-list';
import { PeaksTable } from './peaks-table';
import { railAnchor } from './rail-results-table';
import { specFacts } from './spec-facts';

/** All that a revision keeps of one rail. */
export function RailSection({ rail: { railId, document, summary, peaks, checks } }: { rail: RevisionRail }) {
  const { rail } = document;
  return (
    <article
      id={railAnchor(railId)}
      aria-label={rail.name}
      className="grid scroll-mt-4 gap-x-10 gap-y-5 border-t pt-5 min-[87.5rem]:grid-cols-[19rem_minmax(0,1fr)]"
    >
      <div className="flex min-w-0 flex-col gap-5">
        <div>
          <h2 className="text-large font-semibold wrap-anywhere">{rail.name}</h2>
          <HeadroomSign holds={summary.holds} headroom_dB={summary.tightest?.headroom_dB ?? null} words />
        </div>
        <Facts rows={specFacts(rail)} />
      </div>
      <div className="flex min-w-0 flex-col gap-5">
        {summary.error && (
          <Notice tone="error" title="▲ no result">
            {summary.error}
          </Notice>
        )}
        {checks ? (
          <Section title="checks">
            <ChecksList rail={rail.name} checks={checks} />
          </Section>
        ) : (
          !summary.error && (
            <p className="text-stone">
              Cut before in-service values and worst cases were computed: its figures are at catalogue values.
            </p>
          )
        )}
        <Section title="bank">
          <BankTable document={document} inService={checks?.parts ?? []} />
        </Section>
        <Section title={checks ? 'peaks, in service' : 'peaks, catalogue values'}>
          <PeaksTable rail={rail.name} peaks={peaks} />
        </Section>
        <Section title="cautions">
          <ul className="flex flex-col gap-1">
            {railCautions(document).map(({ kind, title, text }) => (
              <li key={kind}>
                <span className="font-semibold text-brass">! {title}:</span> {text}
              </li>
            ))}
          </ul>
        </Section>
      </div>
    </article>
  );
}
