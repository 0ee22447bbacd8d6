import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { clockTime, dayAndTime } from '@/lib/time';
import type { SaveState } from '../lib/rail-saver';

const TEXT: Record<Exclude<SaveState['kind'], 'saved' | 'refused'>, string> = {
  saving: 'saving …',
  offline: '! no connection: kept here, will be sent',
  'signed-out': '! signed out: kept here',
  conflict: '▲ changed by somebody else',
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

/** Somebody else saved first: says who and when, and lets one choose. */
export function ConflictDialog({
  save,
  onSettle,
}: {
  save: SaveState;
  onSettle: (choice: 'mine' | 'theirs') => void;
}) {
  const conflict = save.kind === 'conflict' ? save : null;
  return (
    <Dialog title="This rail has changed meanwhile" open={conflict !== null} onClose={() => {}} firm>
      {conflict && (
        <>
          <p>
            {conflict.changedBy} saved {conflict.current.rail.spec.name} on {dayAndTime(conflict.changedAt)},
            after you had opened it. Your own edit is still here.
          </p>
          <div className="flex flex-wrap gap-3">
            <Button variant="primary" onClick={() => onSettle('mine')}>
              Put my bank over it
            </Button>
            <Button onClick={() => onSettle('theirs')}>Take the newer bank</Button>
          </div>
        </>
      )}
    </Dialog>
  );
}
