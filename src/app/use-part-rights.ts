import { useBoards } from '@/features/boards/api/boards';
import { useSession } from '@/features/session/api/session';

interface PartRights {
  mayAdd: boolean;
  isLibrarian: boolean;
  /** Whether the answer is final: session and boards are there. */
  isKnown: boolean;
}

/** What to offer on the parts pages; the server decides in the end. */
export function usePartRights(): PartRights {
  const { data: session } = useSession();
  const { data: boards } = useBoards();
  const siteRole = session?.person.siteRole;
  const isEngineer = boards?.items.some((board) => board.myRole === 'engineer') ?? false;
  return {
    mayAdd: siteRole === 'librarian' || siteRole === 'admin' || isEngineer,
    isLibrarian: siteRole === 'librarian',
    isKnown: session !== undefined && boards !== undefined,
  };
}
