import type { BoardDetail } from '@shared/schemas/board.schema';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { ConflictNotice } from '@/components/ui/conflict-notice';
import { Notice } from '@/components/ui/notice';
import type { Conflict } from '@/lib/conflict';
import { messageOf } from '@/lib/problem';
import { differences } from '../lib/setup-diff';

interface Props {
  failure: unknown;
  conflict: Conflict<BoardDetail> | null;
  base: BoardSetup;
  mine: BoardSetup | null;
  onLoadNewer: (newer: BoardDetail) => void;
  onSaveOver: (newer: BoardDetail) => void;
}

/** Why the last save was not done: somebody else was faster, or something that no field can say. */
export function SaveTrouble({ failure, conflict, base, mine, onLoadNewer, onSaveOver }: Props) {
  if (conflict) {
    const changed = differences(base, conflict.current.setup);
    return (
      <div className="flex flex-col gap-2">
        <ConflictNotice
          what="stack-up and recipes"
          changedBy={conflict.changedBy}
          changedAt={null}
          differing={mine ? differences(conflict.current.setup, mine) : []}
          onLoadNewer={() => onLoadNewer(conflict.current)}
          onSaveOver={() => onSaveOver(conflict.current)}
        />
        {changed.length > 0 && <p className="pl-3.5 text-stone">Changed meanwhile: {changed.join(', ')}.</p>}
      </div>
    );
  }
  if (!failure) return null;
  return (
    <Notice tone="error" title="▲ not saved">
      {messageOf(failure)}
    </Notice>
  );
}
