import { cx } from '@/lib/class-names';
import type { FieldFaults } from '../lib/field-faults';
import type { LayerForm } from '../lib/setup-form';
import { LayerRow } from './layer-row';
import { KIND_WORDS } from './layer-words';

interface Props {
  layers: readonly LayerForm[];
  faults: FieldFaults['layers'];
  current: string | null;
  /** null: to be looked at only. */
  edit: {
    onChoose: (key: string) => void;
    onChange: (key: string, patch: Partial<LayerForm>) => void;
    onMove: (key: string, by: -1 | 1) => void;
  } | null;
}

const HEAD = 'section-head px-1.5 pb-1 whitespace-nowrap';

/** The layers from the top side down. */
export function LayerTable({ layers, faults, current, edit }: Props) {
  return (
    <table className="w-full table-fixed border-collapse">
      <caption className="sr-only">layers from the top side down</caption>
      <thead>
        <tr className="border-b">
          <th scope="col" className={cx(HEAD, 'border-l-[3px] border-l-transparent text-left')}>
            layer
          </th>
          <th scope="col" className={cx(HEAD, 'w-[34%] sm:w-[30%] text-left')}>
            kind
          </th>
          <th scope="col" className={cx(HEAD, 'w-[20%] text-right')}>
            thickness
          </th>
          <th scope="col" className={cx(HEAD, 'w-[12%] text-right')}>
            εr
          </th>
        </tr>
      </thead>
      <tbody>
        {layers.map((layer) =>
          edit ? (
            <LayerRow
              key={layer.key}
              layer={layer}
              faults={faults[layer.key]}
              isCurrent={layer.key === current}
              onChoose={() => edit.onChoose(layer.key)}
              onChange={(patch) => edit.onChange(layer.key, patch)}
              onMove={(by) => edit.onMove(layer.key, by)}
            />
          ) : (
            <ReadRow key={layer.key} layer={layer} />
          ),
        )}
      </tbody>
    </table>
  );
}

function ReadRow({ layer }: { layer: LayerForm }) {
  const cell = 'px-1.5 py-1';
  return (
    <tr data-layer={layer.key} className="border-b">
      <td
        className={cx(
          cell,
          'border-l-[3px] border-l-transparent break-words',
          layer.kind === 'dielectric' ? 'text-stone' : 'font-semibold',
        )}
      >
        {layer.name}
      </td>
      <td className={cell}>{KIND_WORDS[layer.kind]}</td>
      <td className={cx(cell, 'text-right whitespace-nowrap')}>{layer.thickness}</td>
      <td className={cx(cell, 'text-right')}>{layer.kind === 'dielectric' && layer.permittivity}</td>
    </tr>
  );
}
