import { randomUUID } from 'node:crypto';
import { railDocument } from '@shared/rail/document';
import {
  type BankLine,
  type RailList,
  type RailWithParts,
  type SearchSettings,
  searchSettingsSchema,
  type UpdateRail,
} from '@shared/schemas/rail.schema';
import type { RailDocument } from '@shared/schemas/rail-document.schema';
import type { RailSpec } from '@shared/schemas/rail-spec.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../context';
import { RailEntity } from '../db/entities/rail.entity';
import { partsById } from '../db/repositories/part.repository';
import { conflict, stale } from '../errors/problems';
import type { Actor } from './actor';
import { openBoard, touchBoard } from './board-access';
import { setupOf } from './board-setup';
import { personRef } from './person.service';
import {
  checkedParts,
  nameKey,
  planesFrom,
  requireFreeName,
  requireRecipes,
  storeUsedParts,
} from './rail-checks';
import { railResult } from './rail-results';
import { loadRail, railList, railWithParts } from './rail-view';

const MOST_RAILS = 500;

export async function listRails(ctx: Context, actor: Actor, boardId: string): Promise<RailList> {
  await openBoard(ctx.db.manager, actor, boardId, 'see');
  return railList(ctx.db.manager, boardId);
}

export async function readRail(
  ctx: Context,
  actor: Actor,
  boardId: string,
  railId: string,
): Promise<RailWithParts> {
  await openBoard(ctx.db.manager, actor, boardId, 'see');
  return railWithParts(ctx.db.manager, boardId, railId);
}

interface RailContent {
  spec: RailSpec;
  bank: BankLine[];
  search: SearchSettings;
}

export async function createRail(
  ctx: Context,
  actor: Actor,
  boardId: string,
  { spec, bank, search = searchSettingsSchema.parse({}) }: Omit<RailContent, 'search'> & Partial<RailContent>,
): Promise<RailWithParts> {
  return ctx.db.write(async (manager) => {
    await openBoard(manager, actor, boardId, 'edit');
    if ((await manager.countBy(RailEntity, { boardId })) >= MOST_RAILS)
      throw conflict(`A board has at most ${MOST_RAILS} rails.`);
    const id = randomUUID();
    const now = ctx.now().toISOString();
    const stored = await checked(manager, boardId, id, { spec, bank, search });
    const last = await manager.maximum(RailEntity, 'position', { boardId });
    await manager.insert(RailEntity, {
      ...stored,
      id,
      boardId,
      position: (last ?? -1) + 1,
      createdAt: now,
      updatedAt: now,
      updatedById: actor.id,
    });
    await storeUsedParts(manager, id, bank);
    await touchBoard(manager, boardId, now);
    return railWithParts(manager, boardId, id);
  });
}

export async function updateRail(
  ctx: Context,
  actor: Actor,
  boardId: string,
  railId: string,
  body: UpdateRail,
): Promise<RailWithParts> {
  return ctx.db.write(async (manager) => {
    await openBoard(manager, actor, boardId, 'edit');
    const rail = await requireCurrent(manager, boardId, railId, body.version);
    const { spec = rail.spec, bank = rail.bank, search = rail.search } = body;
    const stored = await checked(manager, boardId, railId, { spec, bank, search });
    const now = ctx.now().toISOString();
    await manager.update(
      RailEntity,
      { id: railId },
      { ...stored, version: rail.version + 1, updatedAt: now, updatedById: actor.id },
    );
    await storeUsedParts(manager, railId, bank);
    await touchBoard(manager, boardId, now);
    return railWithParts(manager, boardId, railId);
  });
}

export async function deleteRail(
  ctx: Context,
  actor: Actor,
  boardId: string,
  railId: string,
  version: number,
): Promise<void> {
  await ctx.db.write(async (manager) => {
    await openBoard(manager, actor, boardId, 'edit');
    await requireCurrent(manager, boardId, railId, version);
    await manager.delete(RailEntity, { id: railId });
    await touchBoard(manager, boardId, ctx.now().toISOString());
  });
}

/** The rail as a document, with the parts of its bank and of its search. */
export async function exportRail(
  ctx: Context,
  actor: Actor,
  boardId: string,
  railId: string,
): Promise<RailDocument> {
  await openBoard(ctx.db.manager, actor, boardId, 'see');
  const { spec, bank, search } = await loadRail(ctx.db.manager, boardId, railId);
  const ids = [...bank.map((line) => line.partId), ...(search.candidateIds ?? [])];
  const parts = await partsById(ctx.db.manager, ids);
  return railDocument(spec, bank, parts, await setupOf(ctx.db.manager, boardId), search);
}

async function requireCurrent(manager: EntityManager, boardId: string, railId: string, version: number) {
  const rail = await loadRail(manager, boardId, railId);
  if (rail.version !== version)
    throw stale(await railWithParts(manager, boardId, railId), personRef(rail.updatedBy), rail.updatedAt);
  return rail;
}

async function checked(manager: EntityManager, boardId: string, railId: string, content: RailContent) {
  await requireFreeName(manager, boardId, railId, content.spec.name);
  const parts = await checkedParts(manager, content.bank, content.search);
  const setup = await setupOf(manager, boardId);
  requireRecipes(content.bank, setup);
  const spec = planesFrom(content.spec, setup);
  return { ...content, spec, nameKey: nameKey(spec.name), ...railResult(spec, content.bank, parts, setup) };
}
