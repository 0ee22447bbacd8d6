import type { RailList } from '@shared/schemas/rail.schema';
import type { Context } from '../context';
import { RailEntity } from '../db/entities/rail.entity';
import { invalid } from '../errors/problems';
import type { Actor } from './actor';
import { openBoard, touchBoard } from './board-access';
import { railList } from './rail-view';

/** Takes the new order only when it names every rail of the board exactly once. */
export async function orderRails(
  ctx: Context,
  actor: Actor,
  boardId: string,
  railIds: readonly string[],
): Promise<RailList> {
  return ctx.db.write(async (manager) => {
    await openBoard(manager, actor, boardId, 'edit');
    const rails = await manager.find(RailEntity, {
      where: { boardId },
      select: { id: true, position: true },
    });
    const wanted = new Set(railIds);
    const same = wanted.size === railIds.length && wanted.size === rails.length;
    if (!same || rails.some((rail) => !wanted.has(rail.id)))
      throw invalid([{ path: 'railIds', message: 'must name every rail of the board once' }]);
    for (const [position, id] of railIds.entries()) await manager.update(RailEntity, { id }, { position });
    await touchBoard(manager, boardId, ctx.now().toISOString());
    return railList(manager, boardId);
  });
}
