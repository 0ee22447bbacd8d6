import type { BoardRole, BoardSummary } from '@shared/schemas/board.schema';

export const ROLES: readonly BoardRole[] = ['engineer', 'reviewer', 'layout'];

/** What each role may do on a board, in the words of the page that gives them. */
export const ROLE_RIGHTS: Readonly<Record<BoardRole, string>> = {
  engineer: 'Makes and edits rails and banks, runs the mix search, cuts revisions.',
  reviewer: 'Sees everything, changes nothing: rails and their results, revisions, placement lists.',
  layout: 'Sees everything, changes nothing; works from the placement list and takes it along as CSV.',
};

/** `engineer, owner`; an administrator who is not on the board has no role there. */
export function myRoleText(board: Pick<BoardSummary, 'myRole' | 'rights'>): string {
  if (board.myRole === null) return 'not on the board';
  return board.rights.manage ? `${board.myRole}, owner` : board.myRole;
}

/** Its owner also names and deletes the board on the page that shows its people. */
export const peoplePageTitle = (mayManage: boolean): string => (mayManage ? 'People and settings' : 'People');
