import { Field } from '@/components/ui/field';
import { Select } from '@/components/ui/input';
import { thicknessText } from '../lib/length-text';
import type { PairFigures } from '../lib/pair-figures';
import type { Side } from '../lib/recipe-mount';

interface Props {
  pairs: readonly PairFigures[];
  pair: PairFigures | null;
  side: Side;
  onPair: (id: string) => void;
  onSide: (side: Side) => void;
}

/** Where the recipes are looked at: how deep the vias go depends on it. */
export function PlaceChoice({ pairs, pair, side, onPair, onSide }: Props) {
  const deep = pair && (side === 'top' ? pair.depthFromTop_m : pair.depthFromBottom_m);
  return (
    <div className="grid max-w-xl grid-cols-[minmax(0,1fr)_8rem] gap-4">
      <Field
        label="at the plane pair"
        hint={
          deep === null ? 'the stack-up has none' : `vias ${thicknessText(Number(deep.toPrecision(9)))} deep`
        }
      >
        {(control) => (
          <Select
            {...control}
            value={pair?.id ?? ''}
            disabled={pairs.length === 0}
            onChange={(event) => onPair(event.target.value)}
          >
            {pairs.map((one) => (
              <option key={one.id} value={one.id}>
                {one.upperLabel} – {one.lowerLabel}, {thicknessText(Number(one.spacing_m.toPrecision(9)))}
              </option>
            ))}
          </Select>
        )}
      </Field>
      <Field label="from the side">
        {(control) => (
          <Select
            {...control}
            value={side}
            onChange={(event) => onSide(event.target.value === 'bottom' ? 'bottom' : 'top')}
          >
            <option value="top">top</option>
            <option value="bottom">bottom</option>
          </Select>
        )}
      </Field>
    </div>
  );
}
