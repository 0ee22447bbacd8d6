import { Notice } from '@/components/ui/notice';
import type { LayoutCautions } from './instance-groups';

/** What to mind while placing, only where it applies. */
export function LayoutNotes({ cautions: { cracks, bends, polarised } }: { cautions: LayoutCautions }) {
  const large = [...cracks, ...bends];
  if (large.length === 0 && polarised.length === 0) return null;
  return (
    <div className="grid max-w-5xl gap-x-10 gap-y-3 md:grid-cols-2">
      {large.length > 0 && (
        <Notice tone="caution" title="! large ceramics crack when the board bends">
          Keep {large.join(', ')} from board edges, score lines, connectors and screws; lay them along the
          bend, not across it.
          {cracks.length > 0 &&
            bends.length > 0 &&
            ` Of these, ${bends.join(', ')} ${bends.length > 1 ? 'have' : 'has'} soft terminations and ${bends.length > 1 ? 'bear' : 'bears'} more bending.`}
          {cracks.length === 0 && ' Their soft terminations bear more bending, not any amount.'}
        </Notice>
      )}
      {polarised.length > 0 && (
        <Notice tone="caution" title="! polarised: mind the orientation">
          {polarised.join(', ')}: mark the anode on the silk screen and check it after placement.
        </Notice>
      )}
    </div>
  );
}
