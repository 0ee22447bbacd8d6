import { randomUUID } from 'node:crypto';
import {
  type Part,
  type PartFields,
  type PartState,
  partFieldsSchema,
  TOLERANCE_MISFIT,
  toleranceFits,
} from '@shared/schemas/part.schema';
import { type EntityManager, Not } from 'typeorm';
import type { Context } from '../context';
import { BoardMemberEntity } from '../db/entities/board-member.entity';
import { PartEntity } from '../db/entities/part.entity';
import { invalid, notFound, stale } from '../errors/problems';
import type { Actor } from './actor';
import { partFieldNames, partKeys, partView } from './part-view';
import { personRef } from './person.service';
import { refreshRailsUsing } from './rail-results';
import { requireAddPart, requireEditPart, requireSetPartState } from './rights';

const isEngineerSomewhere = (manager: EntityManager, actor: Actor): Promise<boolean> =>
  manager.existsBy(BoardMemberEntity, { personId: actor.id, role: 'engineer' });

async function load(manager: EntityManager, id: string): Promise<PartEntity> {
  const part = await manager.findOne(PartEntity, { where: { id }, relations: { updatedBy: true } });
  if (!part) throw notFound('part');
  return part;
}

async function requireFreeNumber(manager: EntityManager, numberKey: string, id: string): Promise<void> {
  if (await manager.existsBy(PartEntity, { numberKey, id: Not(id) }))
    throw invalid([{ path: 'partNumber', message: 'another part has this number' }]);
}

function requireCurrent(part: PartEntity, version: number): void {
  if (part.version !== version) throw stale(partView(part), personRef(part.updatedBy), part.updatedAt);
}

export async function readPart(ctx: Context, id: string): Promise<Part> {
  return partView(await load(ctx.db.manager, id));
}

export async function createPart(ctx: Context, actor: Actor, fields: PartFields): Promise<Part> {
  return ctx.db.write(async (manager) => {
    requireAddPart(actor, await isEngineerSomewhere(manager, actor));
    const id = randomUUID();
    const keys = partKeys(fields);
    await requireFreeNumber(manager, keys.numberKey, id);
    const now = ctx.now().toISOString();
    await manager.insert(PartEntity, {
      ...fields,
      ...keys,
      id,
      state: 'draft',
      createdAt: now,
      updatedAt: now,
      updatedById: actor.id,
    });
    return partView(await load(manager, id));
  });
}

export async function updatePart(
  ctx: Context,
  actor: Actor,
  id: string,
  { version, ...change }: Partial<PartFields> & { version: number },
): Promise<Part> {
  return ctx.db.write(async (manager) => {
    const part = await load(manager, id);
    requireEditPart(actor, await isEngineerSomewhere(manager, actor), part.state);
    requireCurrent(part, version);
    const fields = partFieldsSchema.parse({ ...pickFields(part), ...change });
    if (!toleranceFits(fields)) throw invalid([{ path: 'tolerance', message: TOLERANCE_MISFIT }]);
    const keys = partKeys(fields);
    await requireFreeNumber(manager, keys.numberKey, id);
    await save(ctx, manager, actor, part, { ...fields, ...keys });
    await refreshRailsUsing(ctx, manager, id);
    return partView(await load(manager, id));
  });
}

export async function setPartState(
  ctx: Context,
  actor: Actor,
  id: string,
  body: { version: number; state: PartState },
): Promise<Part> {
  return ctx.db.write(async (manager) => {
    requireSetPartState(actor);
    const part = await load(manager, id);
    requireCurrent(part, body.version);
    if (part.state === body.state) return partView(part);
    await save(ctx, manager, actor, part, { state: body.state });
    return partView(await load(manager, id));
  });
}

const pickFields = (part: PartEntity) => Object.fromEntries(partFieldNames.map((name) => [name, part[name]]));

async function save(
  ctx: Context,
  manager: EntityManager,
  actor: Actor,
  part: PartEntity,
  change: Partial<Omit<PartEntity, 'updatedBy'>>,
): Promise<void> {
  await manager.update(
    PartEntity,
    { id: part.id },
    { ...change, version: part.version + 1, updatedAt: ctx.now().toISOString(), updatedById: actor.id },
  );
}
