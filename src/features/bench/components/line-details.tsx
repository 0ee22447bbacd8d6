import { ownMount_H } from '@shared/rail/setup';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { formatQuantity } from '@shared/units/format';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { Checkbox, Select } from '@/components/ui/input';
import { QuantityInput } from '@/components/ui/quantity-input';
import { paths } from '@/config/paths';
import type { DraftLine } from '../lib/bank-history';
import { MOST_DISTANCE_M, MOST_MOUNT_H } from '../lib/limits';
import { LineInductance } from './line-inductance';

function recipeHint(setup: BoardSetup, spec: RailSpec): string {
  if (setup.recipes.length === 0) return 'the board has none yet';
  return setup.stackup && spec.plane?.geometry?.pair
    ? 'from the stack-up'
    : 'needs the planes from the stack-up';
}

interface LineDetailsProps {
  line: DraftLine;
  part: Part;
  spec: RailSpec;
  setup: BoardSetup;
  /** Inductance that the curve was computed with. */
  shown_H: number | null;
  /** Nothing can be changed, all can be read. */
  readOnly: boolean;
  /** Applies a change; answers why not, when it may not be. */
  onChange: (patch: Partial<DraftLine>) => string | null;
  onRemove: () => void;
}

/** How a line is mounted and how far from the load: opened under its row. */
export function LineDetails({
  line,
  part,
  spec,
  setup,
  shown_H,
  readOnly,
  onChange,
  onRemove,
}: LineDetailsProps) {
  const [refusal, setRefusal] = useState<string | null>(null);
  const usual_H = ownMount_H({ ...line, mount_H: null }, spec, setup)?.mount_H ?? part.mount_H;
  const change = (patch: Partial<DraftLine>) => setRefusal(onChange(patch));
  return (
    <div className="relative z-10 mb-3 border-l-2 border-shallow bg-paper py-1 pl-3">
      <p className="mb-2 text-small text-stone">
        <Link to={paths.part(part.id)} className="text-deep underline-offset-4 hover:underline">
          {part.partNumber}
        </Link>{' '}
        · {formatQuantity(part.esr_ohm, 'Ω')} ESR · {formatQuantity(part.esl_H, 'H')} ESL ·{' '}
        {formatQuantity(part.rated_voltage_V, 'V', { trim: true })} rated
      </p>
      {!readOnly && (
        <div className="grid max-w-4xl grid-cols-2 gap-4 sm:grid-cols-6">
          <div className="col-span-2">
            <Field label="mount recipe" hint={recipeHint(setup, spec)}>
              {(control) => (
                <Select
                  {...control}
                  value={line.recipeId ?? ''}
                  disabled={line.mount_H !== null || setup.recipes.length === 0}
                  onChange={(event) => change({ recipeId: event.target.value || null })}
                >
                  <option value="">the part’s usual mount</option>
                  {setup.recipes.map((recipe) => (
                    <option key={recipe.id} value={recipe.id}>
                      {recipe.name}
                    </option>
                  ))}
                </Select>
              )}
            </Field>
          </div>
          <Field label="or its inductance" hint={`empty: ${formatQuantity(usual_H, 'H')}`}>
            {(control) => (
              <QuantityInput
                {...control}
                unit="H"
                showFault
                most={MOST_MOUNT_H}
                value={line.mount_H}
                placeholder={formatQuantity(usual_H, 'H')}
                onCommit={(mount_H) => change({ mount_H })}
              />
            )}
          </Field>
          <Field label="distance to the load" hint="adds the path on the planes">
            {(control) => (
              <QuantityInput
                {...control}
                unit="mm"
                showFault
                most={MOST_DISTANCE_M}
                value={line.distance_m}
                placeholder="not planned"
                onCommit={(distance_m) => change({ distance_m })}
              />
            )}
          </Field>
          <Field label="side">
            {(control) => (
              <Select
                {...control}
                value={line.side}
                onChange={(event) => change({ side: event.target.value === 'bottom' ? 'bottom' : 'top' })}
              >
                <option value="top">top</option>
                <option value="bottom">bottom</option>
              </Select>
            )}
          </Field>
          <div className="flex flex-col justify-center gap-2">
            <Checkbox
              label="locked for the search"
              checked={line.locked}
              onChange={(event) => change({ locked: event.target.checked })}
            />
            <Button variant="plain" className="w-fit text-kingfisher" onClick={onRemove}>
              Remove the line
            </Button>
          </div>
        </div>
      )}
      <LineInductance line={line} part={part} spec={spec} setup={setup} shown_H={shown_H} />
      {refusal && (
        <p role="alert" className="mt-2 text-small text-kingfisher">
          ▲ {refusal}
        </p>
      )}
    </div>
  );
}
