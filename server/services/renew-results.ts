import { ENGINE_VERSION } from '@shared/engine/version';
import { EMPTY_SETUP } from '@shared/schemas/board-setup.schema';
import type { Context } from '../context';
import { BoardEntity } from '../db/entities/board.entity';
import { RailEntity } from '../db/entities/rail.entity';
import { partsById } from '../db/repositories/part.repository';
import { railResult } from './rail-results';

/** At start-up: results that an older engine has computed are computed anew. Revisions keep what they were cut with. */
export async function renewOldResults(ctx: Context): Promise<number> {
  return ctx.db.write(async (manager) => {
    const old = (await manager.find(RailEntity)).filter(
      (rail) => rail.summary.engineVersion !== ENGINE_VERSION,
    );
    if (old.length === 0) return 0;
    const parts = await partsById(
      manager,
      old.flatMap((rail) => rail.bank.map((line) => line.partId)),
    );
    const boards = new Map((await manager.find(BoardEntity)).map((board) => [board.id, board]));
    for (const { id, boardId, spec, bank } of old)
      await manager.update(
        RailEntity,
        { id },
        railResult(spec, bank, parts, boards.get(boardId)?.setup ?? EMPTY_SETUP),
      );
    ctx.log.info({ rails: old.length, engineVersion: ENGINE_VERSION }, 'results renewed for a newer engine');
    return old.length;
  });
}
