import { Button } from '@/components/ui/button';
import type { Where } from '../lib/layer-rows';
import type { LayerForm } from '../lib/setup-form';

interface Props {
  layers: readonly LayerForm[];
  current: string | null;
  onMove: (by: -1 | 1) => void;
  onInsert: (where: Where) => void;
  onRemove: () => void;
}

/** What can be done with the layer that one works on; its name says which. */
export function LayerTools({ layers, current, onMove, onInsert, onRemove }: Props) {
  const at = layers.findIndex((layer) => layer.key === current);
  const layer = layers[at];
  if (!layer)
    return <p className="mb-2 py-0.5 text-stone">Choose a layer to move it or to add one beside it.</p>;
  const name = layer.name.trim() || 'a layer without a name';
  return (
    <div role="toolbar" aria-label={`layer ${name}`} className="mb-2 flex flex-wrap items-baseline gap-x-4">
      <span className="max-w-[18ch] truncate font-semibold">{name}</span>
      <Button variant="plain" className="py-0.5" disabled={at === 0} onClick={() => onMove(-1)}>
        Move up
      </Button>
      <Button
        variant="plain"
        className="py-0.5"
        disabled={at === layers.length - 1}
        onClick={() => onMove(1)}
      >
        Move down
      </Button>
      <Button variant="plain" className="py-0.5" onClick={() => onInsert('above')}>
        Add above
      </Button>
      <Button variant="plain" className="py-0.5" onClick={() => onInsert('below')}>
        Add below
      </Button>
      <Button variant="plain" className="py-0.5 text-kingfisher" onClick={onRemove}>
        Remove
      </Button>
    </div>
  );
}
