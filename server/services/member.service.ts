import type { BoardDetail, BoardRole } from '@shared/schemas/board.schema';
import type { Context } from '../context';
import { BoardMemberEntity } from '../db/entities/board-member.entity';
import { PersonEntity } from '../db/entities/person.entity';
import { conflict, notFound } from '../errors/problems';
import type { Actor } from './actor';
import { boardDetail } from './board.service';
import { openBoard, touchBoard } from './board-access';

export async function setMember(
  ctx: Context,
  actor: Actor,
  boardId: string,
  personId: string,
  role: BoardRole,
): Promise<BoardDetail> {
  return ctx.db.write(async (manager) => {
    const board = await openBoard(manager, actor, boardId, 'manage');
    const person = await manager.findOneBy(PersonEntity, { id: personId });
    if (!person) throw notFound('person');
    if (personId === board.ownerId && role !== 'engineer')
      throw conflict('The board’s owner stays an engineer of it.');
    const isMember = await manager.existsBy(BoardMemberEntity, { boardId, personId });
    if (person.disabled && !isMember) throw conflict(`${person.name} is disabled.`);
    await manager.upsert(BoardMemberEntity, { boardId, personId, role }, ['boardId', 'personId']);
    await touchBoard(manager, boardId, ctx.now().toISOString());
    return boardDetail(manager, actor, boardId);
  });
}

export async function removeMember(
  ctx: Context,
  actor: Actor,
  boardId: string,
  personId: string,
): Promise<BoardDetail> {
  return ctx.db.write(async (manager) => {
    const board = await openBoard(manager, actor, boardId, 'manage');
    if (personId === board.ownerId) throw conflict('The board’s owner cannot be removed from it.');
    const { affected } = await manager.delete(BoardMemberEntity, { boardId, personId });
    if (affected === 0) throw notFound('member');
    await touchBoard(manager, boardId, ctx.now().toISOString());
    return boardDetail(manager, actor, boardId);
  });
}
