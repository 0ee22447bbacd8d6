import { useRef, useState } from 'react';
import { useWidth } from '@/components/chart/use-width';
import { useRowCentres } from '../hooks/use-row-centres';
import type { FieldFaults } from '../lib/field-faults';
import { insertLayer, moveLayer, removeLayer, type Where } from '../lib/layer-rows';
import type { LiveLayer } from '../lib/live-layers';
import type { PairFigures } from '../lib/pair-figures';
import type { LayerForm } from '../lib/setup-form';
import { nameFieldId } from './layer-row';
import { LayerTable } from './layer-table';
import { LayerTools } from './layer-tools';
import { StackFigure } from './stack-figure';

interface Props {
  layers: LayerForm[];
  faults: FieldFaults;
  live: readonly LiveLayer[] | null;
  isOld: boolean;
  pairs: readonly PairFigures[];
  canEdit: boolean;
  setLayers: (layers: LayerForm[] | null) => void;
}

/** From this width on the drawing stands beside the table, row by row. */
const BESIDE = 520;

export function LayerEditor({ layers, faults, live, isOld, pairs, canEdit, setLayers }: Props) {
  const [current, setCurrent] = useState<string | null>(null);
  const [measure, width] = useWidth<HTMLDivElement>();
  const table = useRef<HTMLDivElement>(null);
  const rows = useRowCentres(table);
  const isBeside = width >= BESIDE;
  const insert = (key: string, where: Where) => {
    const [next, added] = insertLayer(layers, key, where);
    setLayers(next);
    setCurrent(added);
    requestAnimationFrame(() => document.getElementById(nameFieldId(added))?.focus());
  };
  const remove = (key: string) => {
    const [next, neighbour] = removeLayer(layers, key);
    setLayers(next.length > 0 ? next : null);
    setCurrent(neighbour);
  };
  const move = (key: string, by: -1 | 1) => setLayers(moveLayer(layers, key, by));
  return (
    <div ref={measure}>
      {canEdit && (
        <LayerTools
          layers={layers}
          current={current}
          onMove={(by) => current && move(current, by)}
          onInsert={(where) => current && insert(current, where)}
          onRemove={() => current && remove(current)}
        />
      )}
      <div className={isBeside ? 'flex' : 'flex flex-col gap-4'}>
        <div ref={table} className="min-w-0 flex-1">
          <LayerTable
            layers={layers}
            faults={faults.layers}
            current={current}
            edit={
              canEdit
                ? {
                    onChoose: setCurrent,
                    onChange: (key, patch) =>
                      setLayers(layers.map((layer) => (layer.key === key ? { ...layer, ...patch } : layer))),
                    onMove: move,
                  }
                : null
            }
          />
        </div>
        {live && width > 0 && (
          <StackFigure
            layers={live}
            pairs={pairs}
            current={current}
            isOld={isOld}
            rows={isBeside ? rows : null}
            width={isBeside ? Math.max(164, Math.round(width * 0.29)) : width}
          />
        )}
      </div>
      {faults.stackup.map((fault) => (
        <p key={fault} role="alert" className="mt-2 text-kingfisher">
          ▲ {fault}
        </p>
      ))}
      {canEdit && (
        <p className="mt-2 text-small text-stone">
          Type 35u, 0.1, 0.1 mm or 4 mil; a bare number is in mm. Alt with ↑ or ↓ moves the layer.
        </p>
      )}
    </div>
  );
}
