import { growth, growthScratch } from './growth';
import { Modes } from './modes';
import type { PoleForm } from './pole-form';

/** A resonance of |Z|, and its share of what all modes would do one by one. */
export interface DominantResonance {
  /** Natural frequency |p|/2π: where |Z| peaks, or nearly so when Q is low. */
  frequency_Hz: number;
  /** |p|/(2·|Re p|) */
  q: number;
  share: number;
}

/**
 * The resonance whose ringing adds most to the total variation of the response to an edge of 1 A that takes `rise_s`; null when
 * nothing rings. Alone, a mode of height x varies by x·(1 + q)/(1 − q), where q is the ratio of one swing to the one before.
 */
export function dominantResonance(form: PoleForm, rise_s: number): DominantResonance | null {
  const modes = new Modes(form);
  const g = growthScratch();
  let all = 0;
  let most = 0;
  let which = -1;
  for (let i = 0; i < modes.count; i++) {
    const decay = -form.poleRe[i];
    growth(form.poleRe[i], form.poleIm[i], rise_s, g);
    // Averaged over the edge a mode keeps (e^{pw} − 1)/(pw) of its height.
    const kept = rise_s > 0 ? Math.hypot(g[2], g[1]) / (modes.size[i] * rise_s) : 1;
    const height = kept * Math.hypot(modes.cRe[i], modes.cIm[i]);
    const q = form.poleIm[i] > 0 ? Math.exp((-Math.PI * decay) / form.poleIm[i]) : 0;
    const varies = (height * (1 + q)) / (1 - q);
    all += varies;
    if (form.poleIm[i] > 0 && varies > most) {
      most = varies;
      which = i;
    }
  }
  if (which < 0) return null;
  const size = modes.size[which];
  return { frequency_Hz: size / (2 * Math.PI), q: size / (-2 * form.poleRe[which]), share: most / all };
}
