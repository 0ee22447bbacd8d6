import { railDocument } from '@shared/rail/document';
import { summariseRail } from '@shared/rail/summary';
import type { Part } from '@shared/schemas/part.schema';
import type { BankLine, RailSummary } from '@shared/schemas/rail.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../context';
import { RailEntity } from '../db/entities/rail.entity';
import { RailPartEntity } from '../db/entities/rail-part.entity';
import { partsById } from '../db/repositories/part.repository';
import { documentHash } from './document-hash';

/** The stored result of a rail, with its verdict and its document's hash in columns of their own for lists that count. */
export function railResult(
  spec: RailSpec,
  bank: readonly BankLine[],
  parts: ReadonlyMap<string, Part>,
): { summary: RailSummary; holds: boolean | null; documentHash: string } {
  const document = railDocument(spec, bank, parts);
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
  for (const rail of rails)
    await manager.update(RailEntity, { id: rail.id }, railResult(rail.spec, rail.bank, parts));
  ctx.log.info({ partId, rails: rails.length }, 'results renewed for a changed part');
}
