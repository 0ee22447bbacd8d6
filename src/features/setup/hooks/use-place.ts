import { useMemo, useState } from 'react';
import { type LiveLayer, liveLayers } from '../lib/live-layers';
import { pairFigures } from '../lib/pair-figures';
import type { Place, Side } from '../lib/recipe-mount';
import type { LayerForm } from '../lib/setup-form';
import { useLastGood } from './use-last-good';

const NONE: LiveLayer[] = [];

/** The stack-up as it can be computed with now, its plane pairs, and the place that recipes are looked at. */
export function usePlace(layers: readonly LayerForm[] | null) {
  const [pairId, setPairId] = useState<string | null>(null);
  const [side, setSide] = useState<Side>('top');
  const read = useMemo(() => (layers ? liveLayers(layers) : NONE), [layers]);
  const { good: live, isOld } = useLastGood(read);
  const pairs = useMemo(() => pairFigures(live ?? NONE), [live]);
  const pair = pairs.find((one) => one.id === pairId) ?? pairs[0];
  const place: Place | null = pair && live ? { layers: live, pair, side } : null;
  return { live, isOld, pairs, place, side, setPairId, setSide };
}
