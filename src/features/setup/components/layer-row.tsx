import { type KeyboardEvent, useId } from 'react';
import { cx } from '@/lib/class-names';
import type { FieldFaults } from '../lib/field-faults';
import type { LayerForm } from '../lib/setup-form';
import { CELL, CellInput, faultProps } from './cell-input';
import { FAULT_WORDS, KIND_WORDS, kindOf } from './layer-words';

interface Props {
  layer: LayerForm;
  faults: FieldFaults['layers'][string] | undefined;
  isCurrent: boolean;
  onChoose: () => void;
  onChange: (patch: Partial<LayerForm>) => void;
  onMove: (by: -1 | 1) => void;
}

export const nameFieldId = (key: string): string => `layer-${key}-name`;

/** One layer to be edited; what is wrong with it stands under it. Alt and an arrow move it, wherever in the row one is. */
export function LayerRow({ layer, faults = {}, isCurrent, onChoose, onChange, onMove }: Props) {
  const note = useId();
  const called = layer.name.trim() || 'a layer without a name';
  const wrong = FAULT_WORDS.filter(([field]) => faults[field]);
  const edge = cx('border-l-[3px]', isCurrent ? 'border-l-deep' : 'border-l-transparent');
  const tint = cx(isCurrent && 'bg-wash');
  const move = (event: KeyboardEvent<HTMLElement>) => {
    if (!event.altKey || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
    event.preventDefault();
    const field = event.target;
    onMove(event.key === 'ArrowUp' ? -1 : 1);
    // The row is put elsewhere in the document, which takes the focus away.
    requestAnimationFrame(() => field instanceof HTMLElement && field.focus());
  };
  return (
    <>
      <tr
        data-layer={layer.key}
        onFocus={onChoose}
        onKeyDown={move}
        className={cx(wrong.length === 0 && 'border-b', tint)}
      >
        <td className={edge}>
          <CellInput
            {...faultProps(faults.name, note)}
            id={nameFieldId(layer.key)}
            label={`name of ${called}`}
            className={layer.kind === 'dielectric' ? 'text-stone' : 'font-semibold'}
            value={layer.name}
            onChange={(event) => onChange({ name: event.target.value })}
          />
        </td>
        <td>
          <select
            {...faultProps(faults.kind, note)}
            aria-label={`kind of ${called}`}
            className={cx(CELL, 'px-0.5', isCurrent ? 'bg-wash' : 'bg-paper')}
            value={layer.kind}
            onChange={(event) => onChange({ kind: kindOf(event.target.value) })}
          >
            <optgroup label="copper">
              <option value="plane">{KIND_WORDS.plane}</option>
              <option value="signal">{KIND_WORDS.signal}</option>
            </optgroup>
            <option value="dielectric">{KIND_WORDS.dielectric}</option>
          </select>
        </td>
        <td>
          <CellInput
            {...faultProps(faults.thickness, note)}
            label={`thickness of ${called}`}
            className="text-right"
            value={layer.thickness}
            onChange={(event) => onChange({ thickness: event.target.value })}
          />
        </td>
        <td>
          {layer.kind === 'dielectric' && (
            <CellInput
              {...faultProps(faults.permittivity, note)}
              label={`relative permittivity of ${called}`}
              className="text-right"
              value={layer.permittivity}
              onChange={(event) => onChange({ permittivity: event.target.value })}
            />
          )}
        </td>
      </tr>
      {wrong.length > 0 && (
        <tr className={cx('border-b', tint)}>
          <td colSpan={4} id={note} className={cx('px-1.5 pb-1 text-small text-kingfisher', edge)}>
            {wrong.map(([field, words]) => (
              <p key={field}>
                ▲ {words}: {faults[field]}
              </p>
            ))}
          </td>
        </tr>
      )}
    </>
  );
}
