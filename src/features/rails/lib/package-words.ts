import { packageReach_Hz } from '@shared/engine/package-reach';
import { targetMask } from '@shared/rail/target-mask';
import { formatQuantity } from '@shared/units/format';
import { parseQuantity } from '@shared/units/parse';
import { liveBand, liveTarget } from './live';
import type { SpecForm } from './spec-form';

/** Up to where a bank on the board can do anything for the die. Empty until it can be said. */
export function packageSentence(form: SpecForm): string {
  const inductance = parseQuantity(form.packageInductance, 'H');
  const target = liveTarget(form);
  const band = liveBand(form);
  if (!form.hasPackage || !inductance.ok || inductance.value < 0 || !target || !band) return '';
  const reach = packageReach_Hz({ inductance_H: inductance.value }, band, targetMask(target));
  const name = `package ${formatQuantity(inductance.value, 'H', { trim: true })}`;
  if (reach === null) return `${name}: its own 2πf·L stays below the target over the whole band`;
  if (reach <= band[0])
    return `${name}: its own 2πf·L exceeds the target over the whole band; no bank on the board reaches the die`;
  return `${name}: above ${formatQuantity(reach, 'Hz')} its own 2πf·L exceeds the target; no bank on the board reaches the die beyond`;
}
