import { createHash } from 'node:crypto';
import { setImmediate } from 'node:timers/promises';
import { ENGINE_VERSION } from '@shared/engine/version';
import { canonicalJson } from '@shared/formats/canonical-json';
import { railDocument } from '@shared/rail/document';
import { nextBlock, revisionRail } from '@shared/rail/revision';
import type { PersonRef } from '@shared/schemas/common.schema';
import type { RevisionRail } from '@shared/schemas/revision.schema';
import type { EntityManager } from 'typeorm';
import { RailEntity } from '../db/entities/rail.entity';
import { partsById } from '../db/repositories/part.repository';
import { setupOf } from './board-setup';

/** Everything a revision says, in the order-free form that its hash is taken over. */
export interface Snapshot {
  format: 'millpond-revision';
  version: 1;
  board: { id: string; name: string };
  letter: string;
  note: string;
  createdAt: string;
  createdBy: PersonRef;
  engineVersion: string;
  rails: RevisionRail[];
}

/** Every rail of the board as it stands, with its parts' data and results; lets others breathe between rails. */
export async function snapshotRails(manager: EntityManager, boardId: string): Promise<RevisionRail[]> {
  const rails = await manager.find(RailEntity, {
    where: { boardId },
    order: { position: 'ASC', id: 'ASC' },
  });
  const parts = await partsById(
    manager,
    rails.flatMap((rail) => rail.bank.map((line) => line.partId)),
  );
  const setup = await setupOf(manager, boardId);
  const results: RevisionRail[] = [];
  let first = 101;
  for (const rail of rails) {
    const result = revisionRail(rail.id, railDocument(rail.spec, rail.bank, parts, setup), first);
    results.push(result);
    first = nextBlock(first, result.instances.length);
    await setImmediate();
  }
  return results;
}

export function sealSnapshot(content: Omit<Snapshot, 'format' | 'version' | 'engineVersion'>): {
  snapshot: string;
  hash: string;
} {
  const whole: Snapshot = {
    format: 'millpond-revision',
    version: 1,
    engineVersion: ENGINE_VERSION,
    ...content,
  };
  const snapshot = canonicalJson(whole);
  return { snapshot, hash: createHash('sha256').update(snapshot).digest('hex') };
}

const sum = (values: (number | null)[]): number | null =>
  values.reduce<number | null>(
    (total, value) => (total === null || value === null ? null : total + value),
    0,
  );

/** The figures that lists show of a revision. */
export function revisionTotals(rails: readonly RevisionRail[]) {
  const verdicts = rails.map((rail) => rail.summary.holds);
  return {
    engineVersion: ENGINE_VERSION,
    railsTotal: rails.length,
    railsHold: verdicts.filter((holds) => holds === true).length,
    railsShort: verdicts.filter((holds) => holds === false).length,
    railsUnknown: verdicts.filter((holds) => holds === null).length,
    parts: rails.reduce((total, rail) => total + rail.summary.parts, 0),
    cost: sum(rails.map((rail) => rail.summary.cost)),
    area_mm2: sum(rails.map((rail) => rail.summary.area_mm2)),
  };
}
