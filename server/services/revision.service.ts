import { randomUUID } from 'node:crypto';
import { placementCsv } from '@shared/rail/placement-csv';
import type { Page, PageQuery, PersonRef } from '@shared/schemas/common.schema';
import type { Revision, RevisionDetail } from '@shared/schemas/revision.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../context';
import { RailEntity } from '../db/entities/rail.entity';
import { RevisionEntity } from '../db/entities/revision.entity';
import { conflict, notFound } from '../errors/problems';
import type { Actor } from './actor';
import { openBoard, touchBoard } from './board-access';
import { fileSafe } from './file-name';
import { revisionLetter } from './revision-letter';
import { revisionTotals, type Snapshot, sealSnapshot, snapshotRails } from './revision-snapshot';

function revisionView(row: RevisionEntity): Revision {
  const { id, boardId, letter, note, createdAt, createdById, engineVersion, hash } = row;
  const createdBy = { id: createdById, name: row.createdBy?.name ?? '' };
  const rails = {
    total: row.railsTotal,
    hold: row.railsHold,
    short: row.railsShort,
    unknown: row.railsUnknown,
  };
  const { parts, cost, area_mm2 } = row;
  return {
    id,
    boardId,
    letter,
    note,
    createdAt,
    createdBy,
    engineVersion,
    hash,
    rails,
    parts,
    cost,
    area_mm2,
  };
}

export async function listRevisions(
  ctx: Context,
  actor: Actor,
  boardId: string,
  { limit, offset }: PageQuery,
): Promise<Page<Revision>> {
  await openBoard(ctx.db.manager, actor, boardId, 'see');
  const [rows, total] = await ctx.db.manager.findAndCount(RevisionEntity, {
    where: { boardId },
    relations: { createdBy: true },
    order: { number: 'DESC' },
    take: limit,
    skip: offset,
  });
  return { items: rows.map(revisionView), total, limit, offset };
}

/** Snapshot, results and hash in one transaction: what is cut is what stood on the board at that moment. */
export async function cutRevision(
  ctx: Context,
  actor: Actor,
  boardId: string,
  note: string,
): Promise<RevisionDetail> {
  return ctx.db.write(async (manager) => {
    const board = await openBoard(manager, actor, boardId, 'edit');
    const createdAt = ctx.now().toISOString();
    const letter = await storeRevision(manager, board, actor, note, createdAt);
    await touchBoard(manager, boardId, createdAt);
    return detail(manager, boardId, letter);
  });
}

/** Cuts without asking who may; answers with the letter. */
export async function storeRevision(
  manager: EntityManager,
  board: { id: string; name: string },
  { id: createdById, name }: PersonRef,
  note: string,
  createdAt: string,
): Promise<string> {
  const boardId = board.id;
  const rails = await snapshotRails(manager, boardId);
  if (rails.length === 0) throw conflict('The board has no rails yet; there is nothing to cut.');
  const number = ((await manager.maximum(RevisionEntity, 'number', { boardId })) ?? 0) + 1;
  const letter = revisionLetter(number);
  const sealed = sealSnapshot({
    board: { id: boardId, name: board.name },
    letter,
    note,
    createdAt,
    createdBy: { id: createdById, name },
    rails,
  });
  await manager.insert(RevisionEntity, {
    id: randomUUID(),
    boardId,
    number,
    letter,
    note,
    createdAt,
    createdById,
    ...revisionTotals(rails),
    ...sealed,
  });
  await manager.update(RailEntity, { boardId }, { cutHash: () => 'document_hash' });
  return letter;
}

async function load(manager: EntityManager, boardId: string, letter: string) {
  const row = await manager
    .createQueryBuilder(RevisionEntity, 'v')
    .addSelect('v.snapshot')
    .leftJoin('v.createdBy', 'p')
    .addSelect(['p.id', 'p.name'])
    .where('v.boardId = :boardId AND v.letter = :letter', { boardId, letter })
    .getOne();
  if (!row) throw notFound('revision');
  return row;
}

const parsed = (row: RevisionEntity): Snapshot => JSON.parse(row.snapshot);

async function detail(manager: EntityManager, boardId: string, letter: string): Promise<RevisionDetail> {
  const row = await load(manager, boardId, letter);
  const { board, rails } = parsed(row);
  return { ...revisionView(row), boardName: board.name, railResults: rails };
}

export async function readRevision(
  ctx: Context,
  actor: Actor,
  boardId: string,
  letter: string,
): Promise<RevisionDetail> {
  await openBoard(ctx.db.manager, actor, boardId, 'see');
  return detail(ctx.db.manager, boardId, letter);
}

export interface Download {
  fileName: string;
  text: string;
}

export async function placementList(
  ctx: Context,
  actor: Actor,
  boardId: string,
  letter: string,
): Promise<Download> {
  await openBoard(ctx.db.manager, actor, boardId, 'see');
  const { board, rails } = parsed(await load(ctx.db.manager, boardId, letter));
  return {
    fileName: `${fileSafe(board.name)}-${letter}-placement.csv`,
    text: placementCsv(rails.flatMap((rail) => rail.instances)),
  };
}

/** The very bytes that the hash was taken over. */
export async function revisionDocument(
  ctx: Context,
  actor: Actor,
  boardId: string,
  letter: string,
): Promise<Download> {
  const board = await openBoard(ctx.db.manager, actor, boardId, 'see');
  const { snapshot } = await load(ctx.db.manager, boardId, letter);
  return { fileName: `${fileSafe(board.name)}-${letter}.json`, text: snapshot };
}
