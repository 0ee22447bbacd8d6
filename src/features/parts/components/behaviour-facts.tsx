import type { Part } from '@shared/schemas/part.schema';
import { Facts } from '@/components/ui/facts';
import {
  ageing,
  eslSpread,
  esrSpread,
  impedanceModel,
  overBias,
  overTemperature,
  temperatureRange,
} from '../lib/part-knowledge';
import { KnowledgeText } from './knowledge-text';

const RESPECTS = [
  ['range', temperatureRange],
  ['bias', overBias],
  ['temperature', overTemperature],
  ['ageing', ageing],
  ['ESR', esrSpread],
  ['ESL', eslSpread],
  ['impedance', impedanceModel],
] as const;

/** What is the maker's of a part's behaviour, and what is estimated. */
export function BehaviourFacts({ part }: { part: Part }) {
  return (
    <Facts
      rows={RESPECTS.map(([label, of]) => [label, <KnowledgeText key={label} of={of(part)} />] as const)}
    />
  );
}
