import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import { Link } from 'react-router-dom';
import { Checkbox } from '@/components/ui/input';
import { WordChoice } from '@/components/ui/word-choice';
import { specFacts } from '../lib/spec-facts';
import { type ValuesView, VIEW_NAMES } from '../lib/values-view';

const VIEWS = (['catalogue', 'service', 'worst'] as const).map((view) => [view, VIEW_NAMES[view]] as const);

interface BenchFactsProps {
  spec: RailSpec;
  /** Address of the specification form; null: may not be edited. */
  editTo: string | null;
  view: ValuesView;
  onView: (view: ValuesView) => void;
  showLines: boolean;
  onShowLines: (show: boolean) => void;
  showEnvelope: boolean;
  onShowEnvelope: (show: boolean) => void;
  /** How many corners the envelope covers; null: not known yet. */
  corners: number | null;
}

/** The margin of the score: what the rail is, and what the chart shows. */
export function BenchFacts(props: BenchFactsProps) {
  const { spec, editTo, corners } = props;
  return (
    <div className="flex flex-col gap-3">
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
      <WordChoice legend="values shown" options={VIEWS} value={props.view} onChoice={props.onView} />
      <div className="flex flex-wrap gap-x-4 gap-y-1 text-small text-stone">
        <Checkbox
          label="lines"
          checked={props.showLines}
          onChange={(event) => props.onShowLines(event.target.checked)}
        />
        <Checkbox
          label="envelope"
          checked={props.showEnvelope}
          onChange={(event) => props.onShowEnvelope(event.target.checked)}
        />
      </div>
      {spec.observe === 'die' && (
        <p className="text-small text-stone">dash-dot: package and die, the board shorted</p>
      )}
      {props.showEnvelope && (
        <p className="text-small text-stone">
          shaded: {corners === null ? 'all' : corners} corners; dotted: parts unlike each other
        </p>
      )}
    </div>
  );
}
