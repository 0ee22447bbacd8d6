import type { Part } from '@shared/schemas/part.schema';
import type { Rail, RailList, RailWithParts } from '@shared/schemas/rail.schema';
import type { EntityManager } from 'typeorm';
import { RailEntity } from '../db/entities/rail.entity';
import { findParts } from '../db/repositories/part.repository';
import { notFound } from '../errors/problems';
import { personRef } from './person.service';

export function railView(rail: RailEntity): Rail {
  return {
    id: rail.id,
    boardId: rail.boardId,
    position: rail.position,
    version: rail.version,
    updatedAt: rail.updatedAt,
    updatedBy: personRef(rail.updatedBy),
    spec: rail.spec,
    bank: rail.bank,
    search: rail.search,
    summary: rail.summary,
  };
}

export async function loadRail(manager: EntityManager, boardId: string, railId: string): Promise<RailEntity> {
  const rail = await manager.findOne(RailEntity, {
    where: { id: railId, boardId },
    relations: { updatedBy: true },
  });
  if (!rail) throw notFound('rail');
  return rail;
}

/** All parts that the rails name, whatever their count. `whose` is a fixed piece of SQL over `rp` and `r`. */
function usedParts(manager: EntityManager, whose: string, value: string): Promise<Part[]> {
  return findParts(manager, {
    conditions: [
      `p.id IN (SELECT rp.part_id FROM rail_part rp JOIN rail r ON r.id = rp.rail_id WHERE ${whose} = ?)`,
    ],
    parameters: [value],
    tail: 'ORDER BY p.part_number, p.id',
  });
}

export async function railWithParts(
  manager: EntityManager,
  boardId: string,
  railId: string,
): Promise<RailWithParts> {
  const rail = await loadRail(manager, boardId, railId);
  return { rail: railView(rail), parts: await usedParts(manager, 'rp.rail_id', railId) };
}

export async function railList(manager: EntityManager, boardId: string): Promise<RailList> {
  const rails = await manager.find(RailEntity, {
    where: { boardId },
    relations: { updatedBy: true },
    order: { position: 'ASC', id: 'ASC' },
  });
  return { rails: rails.map(railView), parts: await usedParts(manager, 'r.board_id', boardId) };
}
