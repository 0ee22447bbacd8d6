import { EngineError } from '@shared/engine/errors';
import { ownMount_H, resolveSpec } from '@shared/rail/setup';
import type { BoardDetail } from '@shared/schemas/board.schema';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../context';
import { BoardEntity } from '../db/entities/board.entity';
import { RailEntity } from '../db/entities/rail.entity';
import { partsById } from '../db/repositories/part.repository';
import { invalid, stale } from '../errors/problems';
import type { Actor } from './actor';
import { boardDetail } from './board.service';
import { openBoard, touchBoard } from './board-access';
import { loadSetup } from './board-setup';
import { personRef } from './person.service';
import { railResult } from './rail-results';

/**
 * Saves stack-up and recipes and computes every rail of the board anew. A recipe that a bank still uses, or a layer that a rail
 * takes its planes from, may not go: the answer names the rails.
 */
export async function saveSetup(
  ctx: Context,
  actor: Actor,
  boardId: string,
  body: { version: number; setup: BoardSetup },
): Promise<BoardDetail> {
  return ctx.db.write(async (manager) => {
    await openBoard(manager, actor, boardId, 'edit');
    const { setupVersion } = await loadSetup(manager, boardId);
    const now = ctx.now().toISOString();
    if (setupVersion !== body.version) throw await staleSetup(manager, actor, boardId);
    const rails = await manager.findBy(RailEntity, { boardId });
    requireUsedRecipes(rails, body.setup);
    await manager.update(
      BoardEntity,
      { id: boardId },
      {
        setup: body.setup,
        setupVersion: setupVersion + 1,
        setupUpdatedAt: now,
        setupUpdatedById: actor.id,
      },
    );
    await renewRails(manager, rails, body.setup);
    await touchBoard(manager, boardId, now);
    return boardDetail(manager, actor, boardId);
  });
}

/** The refusal of a save that started from an older setup, with who saved the newer one and when. */
async function staleSetup(manager: EntityManager, actor: Actor, boardId: string) {
  const board = await manager.findOneOrFail(BoardEntity, {
    where: { id: boardId },
    relations: { setupUpdatedBy: true },
  });
  return stale(
    await boardDetail(manager, actor, boardId),
    personRef(board.setupUpdatedBy),
    board.setupUpdatedAt ?? board.createdAt,
  );
}

function requireUsedRecipes(rails: readonly RailEntity[], setup: BoardSetup): void {
  const known = new Set(setup.recipes.map((recipe) => recipe.id));
  const users = rails.filter((rail) =>
    rail.bank.some((line) => line.recipeId !== null && !known.has(line.recipeId)),
  );
  if (users.length > 0)
    throw invalid([{ path: 'setup.recipes', message: `a recipe that goes is used by ${names(users)}` }]);
}

const names = (rails: readonly RailEntity[]) => rails.map((rail) => rail.spec.name).join(', ');

/** Specifications follow the stack-up; nobody's edit of a rail gets stale by it. */
async function renewRails(
  manager: EntityManager,
  rails: readonly RailEntity[],
  setup: BoardSetup,
): Promise<void> {
  const parts = await partsById(
    manager,
    rails.flatMap((rail) => rail.bank.map((line) => line.partId)),
  );
  for (const rail of rails) {
    try {
      const spec = resolveSpec(rail.spec, setup);
      for (const line of rail.bank) ownMount_H(line, spec, setup);
      await manager.update(
        RailEntity,
        { id: rail.id },
        { spec, ...railResult(spec, rail.bank, parts, setup) },
      );
    } catch (error) {
      if (!(error instanceof EngineError)) throw error;
      throw invalid([{ path: 'setup.stackup', message: `${rail.spec.name}: ${error.message}` }]);
    }
  }
}
