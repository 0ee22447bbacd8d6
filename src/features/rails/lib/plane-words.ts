import { cavityResonances } from '@shared/engine/plane';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { planeGeometrySchema } from '@shared/schemas/rail-spec.schema';
import { formatLength, formatQuantity } from '@shared/units/format';
import { readPlanes } from './read-planes';
import type { SpecForm } from './spec-form';
import { specReader } from './spec-reader';

/** What the planes come to: capacitance and first cavity resonances; from a stack-up also what lies between. */
export function planeSentence(form: SpecForm, setup: BoardSetup): string {
  const reader = specReader(form);
  const plane = readPlanes(reader, setup);
  const read = planeGeometrySchema.safeParse(plane?.geometry);
  if (!plane || !read.success || reader.errors.pairUpper) return '';
  const { length_m, width_m, spacing_m, relative_permittivity, pair } = read.data;
  const [fa, fb] = cavityResonances(length_m, width_m, relative_permittivity);
  const between = pair
    ? `${pair[0]} and ${pair[1]} lie ${formatLength(spacing_m)} apart, εr ${permittivityText(relative_permittivity)} → `
    : '';
  return `${between}${formatQuantity(plane.capacitance_F, 'F')}; first cavity resonances ${formatQuantity(fa, 'Hz')} and ${formatQuantity(fb, 'Hz')}`;
}

export const permittivityText = (value: number): string => formatQuantity(value, '', { trim: true });
