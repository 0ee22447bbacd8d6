import type { BoardRights, BoardRole } from '@shared/schemas/board.schema';
import type { PartState } from '@shared/schemas/part.schema';
import type { SiteRole } from '@shared/schemas/person.schema';
import { forbidden, notFound } from '../errors/problems';

/** All that rights are decided from; nothing outside this file decides them. */
export interface Who {
  id: string;
  siteRole: SiteRole;
}

export interface BoardStanding {
  ownerId: string;
  /** null: not on the board. */
  myRole: BoardRole | null;
}

/** null: for this person the board does not exist. */
export function boardRights(who: Who, board: BoardStanding): BoardRights | null {
  const role = board.myRole;
  if (role === null && who.siteRole !== 'admin') return null;
  return {
    edit: role === 'engineer',
    comment: role !== null,
    placement: role === 'engineer' || role === 'layout',
    trace: role !== null,
    signOff: role === 'reviewer',
    manage: role !== null && board.ownerId === who.id,
  };
}

/** Lists hold every board for them, else those that one is on. */
export const seesAllBoards = (who: Who): boolean => who.siteRole === 'admin';

export type BoardAction = 'see' | keyof BoardRights;

const boardRefusals: Record<keyof BoardRights, string> = {
  edit: 'Only engineers of this board may change its rails and cut revisions.',
  comment: 'Only people on this board may comment.',
  placement: 'Only engineers and layout designers of this board may change the placement.',
  trace: 'Only people on this board may upload traces.',
  signOff: 'Only reviewers of this board may sign off or return a revision.',
  manage: 'Only the board’s owner may change its name and people or delete it.',
};

/** Throws unless the person may do it; answers with all of their rights on the board. */
export function requireOnBoard(who: Who, board: BoardStanding, action: BoardAction): BoardRights {
  const rights = boardRights(who, board);
  if (rights === null) throw notFound('board');
  if (action !== 'see' && !rights[action]) throw forbidden(boardRefusals[action]);
  return rights;
}

export type SiteAction = 'manage people' | 'read mail';

export function requireOnSite(who: Who, action: SiteAction): void {
  if (who.siteRole === 'admin') return;
  throw forbidden(
    action === 'read mail'
      ? 'Only administrators may read the outbox.'
      : 'Only administrators may invite, disable or change people.',
  );
}

export function mayAddParts(who: Who, engineerSomewhere: boolean): boolean {
  return who.siteRole === 'librarian' || who.siteRole === 'admin' || engineerSomewhere;
}

export function requireAddPart(who: Who, engineerSomewhere: boolean): void {
  if (!mayAddParts(who, engineerSomewhere))
    throw forbidden('Only librarians, administrators and engineers of a board may add parts.');
}

export function requireEditPart(who: Who, engineerSomewhere: boolean, state: PartState): void {
  if (state !== 'draft' && who.siteRole !== 'librarian')
    throw forbidden(`This part is ${state}; only a librarian may change it.`);
  if (!mayAddParts(who, engineerSomewhere))
    throw forbidden('Only librarians, administrators and engineers of a board may change draft parts.');
}

export function requireSetPartState(who: Who): void {
  if (who.siteRole !== 'librarian') throw forbidden('Only a librarian may approve or retire a part.');
}
