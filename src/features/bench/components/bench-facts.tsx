import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { Link } from 'react-router-dom';
import { Checkbox } from '@/components/ui/input';
import { specFacts } from '../lib/spec-facts';

interface BenchFactsProps {
  spec: RailSpec;
  /** Address of the specification form; null: may not be edited. */
  editTo: string | null;
  showLines: boolean;
  onShowLines: (show: boolean) => void;
}

/** The margin of the score: what the rail is, and what the chart shows. */
export function BenchFacts({ spec, editTo, showLines, onShowLines }: BenchFactsProps) {
  return (
    <div className="flex flex-col gap-4">
      <h1 className="text-large font-bold">{spec.name}</h1>
      <dl className="grid grid-cols-[5.2rem_1fr] gap-x-1 text-small">
        {specFacts(spec).map(([name, value]) => (
          <div key={name} className="contents">
            <dt className="text-stone">{name}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </dl>
      {editTo && (
        <Link
          to={editTo}
          className="w-fit text-small font-semibold text-deep underline-offset-4 hover:underline"
        >
          edit specification
        </Link>
      )}
      <Checkbox
        label="lines"
        className="text-small text-stone"
        checked={showLines}
        onChange={(event) => onShowLines(event.target.checked)}
      />
    </div>
  );
}
