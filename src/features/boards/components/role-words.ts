import type { BoardRole, BoardSummary } from '@shared/schemas/board.schema';

export const ROLES: readonly BoardRole[] = ['engineer', 'reviewer', 'layout'];

/** What each role may do on a board, in the words of the page that gives them. */
export const ROLE_RIGHTS: Readonly<Record<BoardRole, string>> = {
  engineer:
    'Edits rails and banks, runs the mix search, cuts revisions; may comment, place and upload traces.',
  reviewer: 'Sees everything, comments, uploads traces, and signs off or returns revisions of others.',
  layout: 'Sees everything, comments, works from the placement list and reports where parts went.',
};

/** `engineer, owner`; an administrator who is not on the board has no role there. */
export function myRoleText(board: Pick<BoardSummary, 'myRole' | 'rights'>): string {
  if (board.myRole === null) return 'not on the board';
  return board.rights.manage ? `${board.myRole}, owner` : board.myRole;
}
