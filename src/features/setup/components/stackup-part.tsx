import { useRef, useState } from 'react';
import { Notice } from '@/components/ui/notice';
import { Section } from '@/components/ui/page';
import type { ChangeForm } from '../hooks/use-setup-form';
import type { FieldFaults } from '../lib/field-faults';
import type { LiveLayer } from '../lib/live-layers';
import type { PairFigures } from '../lib/pair-figures';
import type { LayerForm } from '../lib/setup-form';
import type { SetupUsage } from '../lib/setup-usage';
import { LayerEditor } from './layer-editor';
import { NoStackup } from './no-stackup';
import { PairsTable } from './pairs-table';

interface Props {
  layers: LayerForm[] | null;
  faults: FieldFaults;
  /** As it is drawn and computed with: the last that could be understood. */
  live: readonly LiveLayer[] | null;
  isOld: boolean;
  pairs: readonly PairFigures[];
  usage: SetupUsage;
  canEdit: boolean;
  change: ChangeForm;
}

/** The board's layers in a table, cut through beside it, and what their plane pairs give. */
export function StackupPart({ layers, faults, live, isOld, pairs, usage, canEdit, change }: Props) {
  const [begun, setBegun] = useState(false);
  const section = useRef<HTMLDivElement>(null);
  const setLayers = (next: LayerForm[] | null) => change((form) => ({ ...form, layers: next }));
  if (!layers)
    return (
      <Section title="stack-up">
        <NoStackup
          canEdit={canEdit}
          onBegin={(next) => {
            setBegun(true);
            setLayers(next);
            // The button is gone then.
            requestAnimationFrame(() => section.current?.querySelector('input')?.focus());
          }}
        />
      </Section>
    );
  return (
    <div ref={section} className="flex min-w-0 flex-col gap-6">
      <Section title="stack-up, from the top side down">
        {begun && (
          <Notice tone="caution" title="! a starting point" className="mb-4">
            Typical thicknesses and permittivities, not those of your board. Replace each by the fabricator’s.
          </Notice>
        )}
        <LayerEditor {...{ layers, faults, live, isOld, pairs, canEdit, setLayers }} />
      </Section>
      <Section title="plane pairs">
        <PairsTable pairs={pairs} usage={usage} />
      </Section>
    </div>
  );
}
