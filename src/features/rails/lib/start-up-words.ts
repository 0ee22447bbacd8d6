import { formatQuantity, formatVolts } from '@shared/units/format';
import { parseQuantity } from '@shared/units/parse';
import { liveVoltage_V } from './live';
import type { SpecForm } from './spec-form';

/** How large a bank the limit charges in time, I·t/V: what inrush is held against. */
export function startUpSentence(form: SpecForm): string {
  const time = parseQuantity(form.softStart, 's');
  const limit = parseQuantity(form.currentLimit, 'A');
  const voltage_V = liveVoltage_V(form);
  if (!form.hasStartUp || !time.ok || !limit.ok || voltage_V === null) return '';
  if (!(time.value > 0 && limit.value > 0)) return '';
  const most_F = (limit.value * time.value) / voltage_V;
  const trim = { trim: true };
  return `${formatQuantity(limit.value, 'A', trim)} for ${formatQuantity(time.value, 's', trim)} charge at most ${formatQuantity(most_F, 'F')} to ${formatVolts(voltage_V)}`;
}
