import { type Dielectric, readDielectric } from './dielectric';
import type { PartBehaviour } from './part-behaviour';

export type Electrolytic = 'polymer' | 'tantalum' | 'aluminium';

/** What a part is made of, as far as its behaviour goes. */
export type Family =
  | { kind: 'ceramic'; dielectric: Dielectric | null }
  | { kind: Electrolytic | 'film' }
  | { kind: 'bare' };

/** Polymer first: an aluminium or tantalum polymer behaves as a polymer. */
const WORDS: readonly [RegExp, 'ceramic' | Electrolytic | 'film'][] = [
  [/polymer/, 'polymer'],
  [/tantal/, 'tantalum'],
  [/alumini?um|electrolytic/, 'aluminium'],
  [/film/, 'film'],
  [/ceramic|mlcc/, 'ceramic'],
];

/**
 * The family of a part by the words of its technology. Where these say nothing, a readable dielectric code makes it a ceramic;
 * without that it is bare and its numbers are taken as they stand.
 */
export function familyOf(part: Pick<PartBehaviour, 'technology' | 'dielectric'>): Family {
  const words = part.technology?.trim().toLowerCase() ?? '';
  const dielectric = part.dielectric === undefined ? null : readDielectric(part.dielectric);
  const kind = WORDS.find(([pattern]) => pattern.test(words))?.[1] ?? (dielectric ? 'ceramic' : 'bare');
  return kind === 'ceramic' ? { kind, dielectric } : { kind };
}
