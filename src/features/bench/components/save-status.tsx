import type { Part } from '@shared/schemas/part.schema';
import type { BankLine } from '@shared/schemas/rail.schema';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Table, Td, Th } from '@/components/ui/table';
import { clockTime, dayAndTime } from '@/lib/time';
import { bankDifferences } from '../lib/bank-diff';
import type { SaveState } from '../lib/rail-saver';

const TEXT: Record<Exclude<SaveState['kind'], 'saved' | 'refused'>, string> = {
  saving: 'saving …',
  offline: '! no connection: kept here, will be sent',
  'signed-out': '! signed out: kept here',
  conflict: '▲ changed elsewhere meanwhile',
};

/** One line for the header: saved when, or what keeps it from being saved. */
export function SaveStatus({ save }: { save: SaveState }) {
  if (save.kind === 'saved') return <span>saved {clockTime(new Date(save.at))}</span>;
  if (save.kind === 'refused')
    return (
      <span role="alert" className="text-kingfisher">
        ▲ not saved: {save.message}
      </span>
    );
  return <span className={save.kind === 'saving' ? undefined : 'text-brass'}>{TEXT[save.kind]}</span>;
}

interface ConflictDialogProps {
  save: SaveState;
  personId: string;
  lines: readonly BankLine[];
  parts: ReadonlyMap<string, Part>;
  onSettle: (choice: 'mine' | 'theirs') => void;
}

const MOST_SHOWN = 8;

/** A save came first from elsewhere: says whose, when, and where the two banks differ, and lets one choose. */
export function ConflictDialog({ save, personId, lines, parts, onSettle }: ConflictDialogProps) {
  const conflict = save.kind === 'conflict' ? save : null;
  return (
    <Dialog title="This rail has changed meanwhile" open={conflict !== null} onClose={() => {}} firm>
      {conflict && (
        <Conflict {...conflict} personId={personId} lines={lines} parts={parts} onSettle={onSettle} />
      )}
    </Dialog>
  );
}

type ConflictProps = Omit<ConflictDialogProps, 'save'> & Extract<SaveState, { kind: 'conflict' }>;

function Conflict({ current, changedBy, changedAt, personId, lines, parts, onSettle }: ConflictProps) {
  const known = new Map([...parts, ...current.parts.map((part) => [part.id, part] as const)]);
  const differences = bankDifferences(lines, current.rail.bank, known);
  const who =
    changedBy === null ? 'Somebody' : changedBy.id === personId ? 'You, in another window,' : changedBy.name;
  return (
    <>
      <p>
        {who} saved {current.rail.spec.name} on {dayAndTime(changedAt)}, after this page had fetched it. Your
        own edit is still here.
      </p>
      {differences.length === 0 ? (
        <p className="text-stone">The banks are the same; the specification or the search settings differ.</p>
      ) : (
        <Table
          caption="where the banks differ"
          head={
            <>
              <Th>bank line</Th>
              <Th numeric>yours</Th>
              <Th numeric>the newer</Th>
            </>
          }
        >
          {differences.slice(0, MOST_SHOWN).map((one) => (
            <tr key={`${one.part} ${one.mine} ${one.theirs}`}>
              <Td>{one.part}</Td>
              <Td numeric>{one.mine}</Td>
              <Td numeric>{one.theirs}</Td>
            </tr>
          ))}
        </Table>
      )}
      {differences.length > MOST_SHOWN && (
        <p className="text-stone">and {differences.length - MOST_SHOWN} more</p>
      )}
      <div className="flex flex-wrap gap-3">
        <Button onClick={() => onSettle('mine')}>Put my bank over it</Button>
        <Button onClick={() => onSettle('theirs')}>Take the newer bank</Button>
      </div>
    </>
  );
}
