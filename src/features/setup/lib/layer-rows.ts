import { newId } from './new-id';
import { type LayerForm, type LayerKind, USUAL_PERMITTIVITY } from './setup-form';

export type Where = 'above' | 'below';

const indexOf = (layers: readonly LayerForm[], key: string) => layers.findIndex((layer) => layer.key === key);

/** Moves a layer by one place; the same list when it stands at that end already. */
export function moveLayer(layers: LayerForm[], key: string, by: -1 | 1): LayerForm[] {
  const from = indexOf(layers, key);
  const to = from + by;
  if (from < 0 || to < 0 || to >= layers.length) return layers;
  const moved = [...layers];
  [moved[from], moved[to]] = [moved[to], moved[from]];
  return moved;
}

/** A new layer beside `key`: dielectric next to copper, copper next to dielectric, as a board is built. */
export function insertLayer(layers: LayerForm[], key: string, where: Where): [LayerForm[], string] {
  const at = indexOf(layers, key);
  const beside = layers[at]?.kind ?? 'plane';
  const layer = emptyLayer(beside === 'dielectric' ? 'signal' : 'dielectric', layers);
  const place = where === 'above' ? at : at + 1;
  return [layers.toSpliced(place, 0, layer), layer.key];
}

function emptyLayer(kind: LayerKind, layers: readonly LayerForm[]): LayerForm {
  return {
    key: newId(),
    name: freeName(
      kind === 'dielectric' ? 'new dielectric' : 'new copper',
      layers.map((layer) => layer.name),
    ),
    kind,
    thickness: kind === 'dielectric' ? '100 µm' : '18 µm',
    permittivity: USUAL_PERMITTIVITY,
  };
}

/** `name`, or the first of `name 2`, `name 3` … that nobody has. */
export function freeName(name: string, taken: readonly string[]): string {
  const names = new Set(taken.map((one) => one.trim().toLowerCase()));
  if (!names.has(name.toLowerCase())) return name;
  let n = 2;
  while (names.has(`${name} ${n}`.toLowerCase())) n++;
  return `${name} ${n}`;
}

/** Without a layer, and the one that stands in its place then; null when none is left. */
export function removeLayer(layers: LayerForm[], key: string): [LayerForm[], string | null] {
  const at = indexOf(layers, key);
  const rest = layers.filter((layer) => layer.key !== key);
  return [rest, rest[Math.min(at, rest.length - 1)]?.key ?? null];
}
