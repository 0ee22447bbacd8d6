import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/page';
import type { benchCautions } from '../lib/cautions';

/** What to know before trusting or touching this rail. */
export function CautionsPanel({ cautions }: { cautions: ReturnType<typeof benchCautions> }) {
  return (
    <Section title="cautions">
      <div className="flex flex-col gap-3">
        {cautions.map((one) => (
          <Notice key={one.title} tone="caution" title={`! ${one.title}`} className="text-small">
            {one.text}
          </Notice>
        ))}
        <p className="text-small text-stone">
          Estimates from models: measure the rail before release. Local codes, the applicable safety standard
          and a qualified engineer’s judgement come first.
        </p>
      </div>
    </Section>
  );
}
