import type { Part } from '@shared/schemas/part.schema';
import { formatQuantity } from '@shared/units/format';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Checkbox } from '@/components/ui/input';
import { formatCost } from '@/lib/format-cost';
import { partName } from '../lib/part-name';

interface CandidatesDialogProps {
  open: boolean;
  parts: readonly Part[];
  /** null: all of them. */
  chosen: readonly string[] | null;
  onChoose: (ids: string[] | null) => void;
  onClose: () => void;
}

/** Which parts the mix search may use. */
export function CandidatesDialog({ open, parts, chosen, onChoose, onClose }: CandidatesDialogProps) {
  const [picked, setPicked] = useState<ReadonlySet<string>>(
    () => new Set(chosen ?? parts.map((part) => part.id)),
  );
  const toggle = (id: string) => {
    const next = new Set(picked);
    if (!next.delete(id)) next.add(id);
    setPicked(next);
  };
  return (
    <Dialog title="Parts the search may use" open={open} onClose={onClose} wide>
      <p className="text-stone">Approved parts rated for this rail. Fewer candidates are proven faster.</p>
      <div className="flex gap-4">
        <Button variant="plain" onClick={() => setPicked(new Set(parts.map((part) => part.id)))}>
          All
        </Button>
        <Button variant="plain" onClick={() => setPicked(new Set())}>
          None
        </Button>
      </div>
      <ul className="max-h-[50vh] columns-1 gap-8 overflow-y-auto sm:columns-2">
        {parts.map((part) => (
          <li key={part.id} className="break-inside-avoid border-b py-1">
            <Checkbox
              label={`${partName(part)} · ${formatQuantity(part.esr_ohm, 'Ω')} · ${formatCost(part.unit_cost, 3)}`}
              checked={picked.has(part.id)}
              onChange={() => toggle(part.id)}
            />
          </li>
        ))}
      </ul>
      <div className="flex items-center gap-3">
        <Button
          variant="primary"
          disabled={picked.size === 0}
          onClick={() =>
            onChoose(
              picked.size === parts.length ? null : parts.filter((p) => picked.has(p.id)).map((p) => p.id),
            )
          }
        >
          Use {picked.size} {picked.size === 1 ? 'part' : 'parts'}
        </Button>
        {picked.size === 0 && <span className="text-small text-kingfisher">▲ choose at least one</span>}
      </div>
    </Dialog>
  );
}
