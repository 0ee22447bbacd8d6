import { hasSoftTermination, isLargeCeramic, isPolarised } from '@shared/rail/cautions';
import type { Part } from '@shared/schemas/part.schema';
import { Notice } from '@/components/ui/notice';
import { estimatedRespects, isLossy } from '../lib/part-knowledge';

const list = new Intl.ListFormat('en-GB', { type: 'conjunction' });

/** What to mind with this part, only where it applies. */
export function PartCautions({ part }: { part: Part }) {
  const sized = { technology: part.technology, case: part.caseSize };
  const estimated = estimatedRespects(part);
  return (
    <>
      {part.state === 'retired' && (
        <Notice tone="caution" title="! retired">
          Not for new banks. Banks that use it keep it until someone changes them.
        </Notice>
      )}
      {isLossy(part) && (
        <Notice tone="caution" title="! loses capacitance">
          {part.dielectric || 'A ceramic without a code'} loses capacitance with bias, temperature and age:
          the catalogue value is not what the rail gets.
        </Notice>
      )}
      {estimated.length > 0 && (
        <Notice tone="caution" title="≈ estimated">
          Nothing of the maker’s is known about {list.format(estimated)}: estimates stand in, and real parts
          may be far from them. Enter the maker’s figures before relying on them.
        </Notice>
      )}
      {isLargeCeramic(sized) && !hasSoftTermination(part) && (
        <Notice tone="caution" title="! large ceramic, not softly terminated">
          Cracks when the board bends: keep it from edges, score lines, connectors and screws, or choose a
          soft termination.
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
