import { type Corner, IN_SERVICE } from '@shared/rail/corner';

/** Which values the bench is looked at with. */
export type ValuesView = 'catalogue' | 'service' | 'worst';

export const VIEW_NAMES: Record<ValuesView, string> = {
  catalogue: 'catalogue',
  service: 'in service',
  worst: 'worst case',
};

export const NEXT_VIEW: Record<ValuesView, ValuesView> = {
  catalogue: 'service',
  service: 'worst',
  worst: 'catalogue',
};

/** Where the parts are looked at in a view; until the worst corner is known, in service stands for it. */
export function cornerOfView(view: ValuesView, worst: Corner | null): Corner | null {
  if (view === 'catalogue') return null;
  return view === 'service' ? IN_SERVICE : (worst ?? IN_SERVICE);
}
