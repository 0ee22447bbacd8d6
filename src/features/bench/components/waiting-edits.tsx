import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '@/config/paths';
import { ApiError } from '@/lib/problem';
import { saveRail } from '../api/save-rail';
import { forgetEdit, type LeftEdit, leftEdits } from '../lib/edit-store';

const LOOK_MS = 3000;

/**
 * Sends the edits that a bench has left behind: made without a connection, then the page was left or closed. What the server
 * refuses (somebody saved first, say) stays and leads back to its bench, which asks.
 */
export function WaitingEdits({ personId }: { personId: string }) {
  const client = useQueryClient();
  const [left, setLeft] = useState<LeftEdit[]>([]);
  useEffect(() => {
    let busy = false;
    const refused = new Set<string>();
    const look = async () => {
      if (busy) return;
      busy = true;
      for (const edit of leftEdits(personId)) {
        if (refused.has(edit.key + edit.text)) continue;
        try {
          const { version, edit: body } = JSON.parse(edit.text);
          await saveRail(edit.boardId, edit.railId, { ...body, version });
          forgetEdit(edit);
          await client.invalidateQueries({ queryKey: ['boards'] });
        } catch (error) {
          if (error instanceof ApiError && error.status === 404) forgetEdit(edit);
          if (error instanceof ApiError && error.status < 500 && error.status !== 401)
            refused.add(edit.key + edit.text);
        }
      }
      busy = false;
      setLeft(leftEdits(personId));
    };
    void look();
    const timer = setInterval(() => void look(), LOOK_MS);
    return () => clearInterval(timer);
  }, [personId, client]);
  if (left.length === 0) return null;
  const [first] = left;
  return (
    <Link
      to={paths.bench(first.boardId, first.railId)}
      className="text-brass underline-offset-4 hover:underline"
    >
      ! {left.length === 1 ? 'an edit waits' : `${left.length} edits wait`} to be sent
    </Link>
  );
}
