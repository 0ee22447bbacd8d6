import { type BoardSetup, EMPTY_SETUP } from '@shared/schemas/board-setup.schema';
import type { EntityManager } from 'typeorm';
import { BoardEntity } from '../db/entities/board.entity';

/** The board's stack-up and mount recipes, with the version that a save must name. */
export async function loadSetup(
  manager: EntityManager,
  boardId: string,
): Promise<{ setup: BoardSetup; setupVersion: number }> {
  const board = await manager.findOneOrFail(BoardEntity, {
    where: { id: boardId },
    select: { id: true, setup: true, setupVersion: true },
  });
  return { setup: board.setup ?? EMPTY_SETUP, setupVersion: board.setupVersion };
}

export const setupOf = async (manager: EntityManager, boardId: string): Promise<BoardSetup> =>
  (await loadSetup(manager, boardId)).setup;
