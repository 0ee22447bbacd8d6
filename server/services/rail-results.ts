import { railDocument } from '@shared/rail/document';
import { summariseRail } from '@shared/rail/summary';
import { type BoardSetup, EMPTY_SETUP } from '@shared/schemas/board-setup.schema';
import type { Part } from '@shared/schemas/part.schema';
import type { BankLine, RailSummary } from '@shared/schemas/rail.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../context';
import { RailEntity } from '../db/entities/rail.entity';
import { RailPartEntity } from '../db/entities/rail-part.entity';
import { partsById } from '../db/repositories/part.repository';
import { setupOf } from './board-setup';
import { documentHash } from './document-hash';

/** The stored result of a rail, with its verdict and its document's hash in columns of their own for lists that count. */
export function railResult(
  spec: RailSpec,
  bank: readonly BankLine[],
  parts: ReadonlyMap<string, Part>,
  setup: BoardSetup,
): { summary: RailSummary; holds: boolean | null; documentHash: string } {
  const document = railDocument(spec, bank, parts, setup);
  const summary = summariseRail(document);
  return { summary, holds: summary.holds, documentHash: documentHash(document) };
}

/** A changed part changes the results of every rail that uses it, not their versions: nobody's edit gets stale. */
export async function refreshRailsUsing(ctx: Context, manager: EntityManager, partId: string): Promise<void> {
  const rails = await manager
    .createQueryBuilder(RailEntity, 'r')
    .innerJoin(RailPartEntity, 'rp', 'rp.railId = r.id AND rp.partId = :partId', { partId })
    .getMany();
  if (rails.length === 0) return;
  const parts = await partsById(
    manager,
    rails.flatMap((rail) => rail.bank.map((line) => line.partId)),
  );
  const setups = await setupsOf(manager, rails);
  for (const { id, boardId, spec, bank } of rails)
    await manager.update(
      RailEntity,
      { id },
      railResult(spec, bank, parts, setups.get(boardId) ?? EMPTY_SETUP),
    );
  ctx.log.info({ partId, rails: rails.length }, 'results renewed for a changed part');
}

async function setupsOf(
  manager: EntityManager,
  rails: readonly RailEntity[],
): Promise<Map<string, BoardSetup>> {
  const ids = [...new Set(rails.map((rail) => rail.boardId))];
  return new Map(await Promise.all(ids.map(async (id) => [id, await setupOf(manager, id)] as const)));
}
