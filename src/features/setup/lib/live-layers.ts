import type { StackLayer } from '@shared/engine/inductance/stackup';
import { parseLength, parseQuantity } from '@shared/units/parse';
import type { LayerForm } from './setup-form';

/** A layer as it can be drawn and computed with; its `name` is the form's key, since two layers may be called alike while one types. */
export type LiveLayer = StackLayer & { readonly label: string };

/** The stack-up as it stands in the form; null while a number in it cannot be understood or used. */
export function liveLayers(layers: readonly LayerForm[]): LiveLayer[] | null {
  const live: LiveLayer[] = [];
  for (const { key, name, kind, thickness, permittivity } of layers) {
    const height = parseLength(thickness);
    if (!height.ok || !(height.value > 0)) return null;
    const common = { name: key, label: name.trim(), thickness_m: height.value };
    if (kind !== 'dielectric') {
      live.push({ ...common, kind: 'copper', use: kind });
      continue;
    }
    const relative = parseQuantity(permittivity, '');
    if (!relative.ok || !(relative.value >= 1)) return null;
    live.push({ ...common, kind: 'dielectric', relative_permittivity: relative.value });
  }
  return live;
}

export const totalThickness_m = (layers: readonly LiveLayer[]): number =>
  layers.reduce((sum, layer) => sum + layer.thickness_m, 0);
