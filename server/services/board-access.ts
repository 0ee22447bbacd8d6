import type { BoardRights, BoardRole } from '@shared/schemas/board.schema';
import type { EntityManager } from 'typeorm';
import { notFound } from '../errors/problems';
import type { Actor } from './actor';
import { type BoardAction, requireOnBoard } from './rights';

export interface BoardAccess {
  id: string;
  name: string;
  ownerId: string;
  myRole: BoardRole | null;
  rights: BoardRights;
}

/** The board, if this person may do `action` on it; the answer of everyone who may not even see it is 404. */
export async function openBoard(
  manager: EntityManager,
  actor: Actor,
  boardId: string,
  action: BoardAction,
): Promise<BoardAccess> {
  const [row] = await manager.query<Omit<BoardAccess, 'rights'>[]>(
    `SELECT b.id, b.name, b.owner_id AS ownerId, m.role AS myRole
     FROM board b LEFT JOIN board_member m ON m.board_id = b.id AND m.person_id = ? WHERE b.id = ?`,
    [actor.id, boardId],
  );
  if (!row) throw notFound('board');
  return { ...row, rights: requireOnBoard(actor, row, action) };
}

/** Marks the board as changed without making anyone's edit of its name stale. */
export async function touchBoard(manager: EntityManager, boardId: string, at: string): Promise<void> {
  await manager.query('UPDATE board SET updated_at = ? WHERE id = ?', [at, boardId]);
}
