import { type Part, type PartState, partSchema } from '@shared/schemas/part.schema';
import { useQueryClient } from '@tanstack/react-query';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { conflictOf } from '@/lib/conflict';
import { messageOf } from '@/lib/problem';
import { takePart } from '../api/part';
import { useSetPartState } from '../api/set-part-state';

const NEXT: Readonly<Record<PartState, readonly (readonly [PartState, string])[]>> = {
  draft: [
    ['approved', 'Approve'],
    ['retired', 'Retire'],
  ],
  approved: [
    ['retired', 'Retire'],
    ['draft', 'Back to draft'],
  ],
  retired: [['approved', 'Approve again']],
};

/** A librarian approves and retires. */
export function StateActions({ part }: { part: Part }) {
  const client = useQueryClient();
  const set = useSetPartState(part.id);
  const conflict = conflictOf(set.error, partSchema);
  return (
    <div className="flex flex-col gap-3">
      <div className="flex flex-wrap gap-3">
        {NEXT[part.state].map(([state, label]) => (
          <Button
            key={state}
            variant={state === 'retired' ? 'danger' : 'secondary'}
            disabled={set.isPending}
            onClick={() => set.mutate({ version: part.version, state })}
          >
            {label}
          </Button>
        ))}
      </div>
      {set.isError && (
        <Notice
          tone="error"
          action={
            conflict && (
              <Button
                onClick={() => {
                  void takePart(client, conflict.current);
                  set.reset();
                }}
              >
                Show the newer state
              </Button>
            )
          }
        >
          {conflict
            ? `${conflict.changedBy ?? 'Someone'} changed this part meanwhile. Look at it before you decide.`
            : messageOf(set.error)}
        </Notice>
      )}
    </div>
  );
}
