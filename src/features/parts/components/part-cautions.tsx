import { isLargeCeramic, isPolarised } from '@shared/rail/cautions';
import type { Part } from '@shared/schemas/part.schema';
import { Notice } from '@/components/ui/notice';

/** What to mind with this part, only where it applies. */
export function PartCautions({ part }: { part: Part }) {
  const sized = { technology: part.technology, case: part.caseSize };
  return (
    <>
      {part.state === 'retired' && (
        <Notice tone="caution" title="! retired">
          Not for new banks. Banks that use it keep it until someone changes them.
        </Notice>
      )}
      {isLargeCeramic(sized) && part.termination !== 'soft' && (
        <Notice tone="caution" title="! large ceramic">
          Cracks when the board bends: keep it from edges, score lines, connectors and screws.
        </Notice>
      )}
      {isPolarised(sized) && (
        <Notice tone="caution" title="! polarised">
          Mind the orientation and the voltage derating.
        </Notice>
      )}
    </>
  );
}
