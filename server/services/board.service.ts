import { randomUUID } from 'node:crypto';
import type { BoardDetail, BoardMember, BoardRole, BoardSummary } from '@shared/schemas/board.schema';
import type { Page, PageQuery } from '@shared/schemas/common.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../context';
import { BoardEntity } from '../db/entities/board.entity';
import { BoardMemberEntity } from '../db/entities/board-member.entity';
import { stale } from '../errors/problems';
import type { Actor } from './actor';
import { openBoard } from './board-access';
import { loadSetup } from './board-setup';
import { boardSummaries, boardSummary } from './board-summary';
import { personRef } from './person.service';

export async function listBoards(ctx: Context, actor: Actor, query: PageQuery): Promise<Page<BoardSummary>> {
  const { limit, offset } = query;
  const page = await boardSummaries(ctx.db.manager, actor, limit, offset);
  return { ...page, limit, offset };
}

interface MemberRow {
  id: string;
  name: string;
  email: string;
  disabled: number;
  role: BoardRole;
}

async function membersOf(manager: EntityManager, boardId: string): Promise<BoardMember[]> {
  const rows = await manager.query<MemberRow[]>(
    `SELECT p.id, p.name, p.email, p.disabled, m.role FROM board_member m
     JOIN person p ON p.id = m.person_id WHERE m.board_id = ? ORDER BY p.name, p.id`,
    [boardId],
  );
  return rows.map(({ role, disabled, ...person }) => ({
    role,
    person: { ...person, disabled: disabled !== 0 },
  }));
}

export async function boardDetail(
  manager: EntityManager,
  actor: Actor,
  boardId: string,
): Promise<BoardDetail> {
  const summary = await boardSummary(manager, actor, boardId);
  return { ...summary, members: await membersOf(manager, boardId), ...(await loadSetup(manager, boardId)) };
}

export async function readBoard(ctx: Context, actor: Actor, boardId: string): Promise<BoardDetail> {
  return boardDetail(ctx.db.manager, actor, boardId);
}

export async function createBoard(
  ctx: Context,
  actor: Actor,
  body: { name: string; description: string },
): Promise<BoardDetail> {
  const id = randomUUID();
  const now = ctx.now().toISOString();
  return ctx.db.write(async (manager) => {
    await manager.insert(BoardEntity, {
      ...body,
      id,
      ownerId: actor.id,
      createdAt: now,
      updatedAt: now,
      updatedById: actor.id,
    });
    await manager.insert(BoardMemberEntity, { boardId: id, personId: actor.id, role: 'engineer' });
    return boardDetail(manager, actor, id);
  });
}

export async function updateBoard(
  ctx: Context,
  actor: Actor,
  boardId: string,
  body: { version: number; name?: string; description?: string },
): Promise<BoardDetail> {
  return ctx.db.write(async (manager) => {
    await openBoard(manager, actor, boardId, 'manage');
    const board = await requireCurrent(manager, actor, boardId, body.version);
    const { name = board.name, description = board.description } = body;
    await manager.update(
      BoardEntity,
      { id: boardId },
      {
        name,
        description,
        version: board.version + 1,
        updatedAt: ctx.now().toISOString(),
        updatedById: actor.id,
      },
    );
    return boardDetail(manager, actor, boardId);
  });
}

async function requireCurrent(
  manager: EntityManager,
  actor: Actor,
  boardId: string,
  version: number,
): Promise<BoardEntity> {
  const board = await manager.findOneOrFail(BoardEntity, {
    where: { id: boardId },
    relations: { updatedBy: true },
  });
  if (board.version !== version)
    throw stale(await boardDetail(manager, actor, boardId), personRef(board.updatedBy), board.updatedAt);
  return board;
}

/** With its rails and revisions. */
export async function deleteBoard(
  ctx: Context,
  actor: Actor,
  boardId: string,
  version: number,
): Promise<void> {
  await ctx.db.write(async (manager) => {
    await openBoard(manager, actor, boardId, 'manage');
    await requireCurrent(manager, actor, boardId, version);
    await manager.delete(BoardEntity, { id: boardId });
  });
}
