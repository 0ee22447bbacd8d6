import type { Objective } from '@shared/search/problem';
import { boundText, weightText } from '../lib/mix';

interface ProofMeterProps {
  objective: Objective;
  weight: number | null;
  lowerBound: number;
  proven: boolean;
}

/** The proof closing from both sides: filled up to what is proven, hatched up to the best mix found. */
export function ProofMeter({ objective, weight, lowerBound, proven }: ProofMeterProps) {
  const full = weight === null || weight <= 0 ? 1 : weight;
  const part = weight === null ? 0 : Math.max(0, Math.min(1, lowerBound / full));
  return (
    <div>
      <dl className="grid grid-cols-[1fr_auto] gap-x-3">
        <dt>{proven ? 'smallest mix' : 'best so far'}</dt>
        <dd className="text-right font-semibold">{weightText(objective, weight)}</dd>
        <dt>proven at least</dt>
        <dd className="text-right">
          {proven ? weightText(objective, weight) : boundText(objective, lowerBound)}
        </dd>
      </dl>
      <div
        role="meter"
        aria-label="how much of the best mix is proven to be needed"
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={Math.round(part * 100)}
        className="hatch mt-2 h-2.5 border border-ink text-stone"
      >
        <div className="h-full bg-deep transition-[width] duration-150" style={{ width: `${part * 100}%` }} />
      </div>
    </div>
  );
}
