import { type Stretch, walk } from './load-current';
import { Modes } from './modes';
import type { PoleForm } from './pole-form';
import { RateModes } from './rate-modes';

/** Shares of each mode's time constant at which is looked. */
const LOOK = [0.3, 1, 3];

/**
 * About how far the voltage gets from where it starts in these stretches, in volts: the largest excursion at a few times for each mode and
 * stretch. Good to a factor; tells what is too small to matter.
 */
export function roughExcursion(form: PoleForm, before_A: number, stretches: readonly Stretch[]): number {
  const modes = new Modes(form);
  const start_V = form.dc_ohm * before_A;
  let most = 0;
  walk(modes, before_A, stretches, (stretch) => {
    const rates = new RateModes(modes, stretch);
    most = Math.max(most, Math.abs(rates.fall_V - start_V));
    for (const size of modes.size)
      for (const share of LOOK) {
        const after_s = Math.min(stretch.length_s, share / size);
        most = Math.max(most, Math.abs(rates.fall_V + rates.fallsBy(after_s) - start_V));
      }
    return false;
  });
  return most;
}
