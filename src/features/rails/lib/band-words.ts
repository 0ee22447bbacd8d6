import { kneeFrequency } from '@shared/engine/target';
import { formatQuantity } from '@shared/units/format';
import { parseQuantity } from '@shared/units/parse';
import type { SpecForm } from './spec-form';

/** What the band comes to: `50 kHz – 35 MHz`. */
export function bandSentence(form: SpecForm): string {
  const rise = parseQuantity(form.rise, 's');
  const low = parseQuantity(form.bandwidth, 'Hz');
  if (form.bandKind !== 'derived' || !rise.ok || !low.ok || rise.value <= 0) return '';
  const high = kneeFrequency(rise.value, form.knee === '0.5' ? 0.5 : 0.35);
  return `${form.knee} ÷ ${formatQuantity(rise.value, 's', { trim: true })} → band ${formatQuantity(low.value, 'Hz', { trim: true })} to ${formatQuantity(high, 'Hz')}`;
}
