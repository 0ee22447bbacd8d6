import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/page';
import type { LayerForm } from '../lib/setup-form';
import { beginWith } from '../lib/starting-points';

/** A board without a stack-up: what one is for, and two places to begin. */
export function NoStackup({
  canEdit,
  onBegin,
}: {
  canEdit: boolean;
  onBegin: (layers: LayerForm[]) => void;
}) {
  return (
    <EmptyState
      title="This board has no stack-up yet"
      action={
        canEdit && (
          <div className="flex flex-wrap gap-3">
            <Button variant="primary" onClick={() => onBegin(beginWith('four'))}>
              Begin with four layers
            </Button>
            <Button onClick={() => onBegin(beginWith('eight'))}>Begin with eight layers</Button>
          </div>
        )
      }
    >
      <p>
        The stack-up says how thick copper and dielectric are, from the top side down. Rails take the spacing
        of their plane pair from it, and mount recipes how deep their vias go.
      </p>
      {canEdit && <p>The two beginnings are typical boards; replace their figures by your fabricator’s.</p>}
    </EmptyState>
  );
}
