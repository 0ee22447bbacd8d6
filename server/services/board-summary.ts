import type { BoardRole, BoardSummary } from '@shared/schemas/board.schema';
import type { EntityManager } from 'typeorm';
import { notFound } from '../errors/problems';
import type { Actor } from './actor';
import { boardRights, seesAllBoards } from './rights';

interface BoardRow {
  id: string;
  name: string;
  description: string;
  ownerId: string;
  ownerName: string;
  version: number;
  createdAt: string;
  updatedAt: string;
  myRole: BoardRole | null;
  total: number | null;
  hold: number | null;
  short: number | null;
  changed: number | null;
  /** Rails of the latest revision, and how many of them are still here. */
  cut: number | null;
  kept: number | null;
  letter: string | null;
  cutAt: string | null;
}

/** `visible` and `page` are fixed pieces of SQL; values go through parameters only. */
const summarySql = (visible: string, page: string) => `
  SELECT b.id, b.name, b.description, b.owner_id AS ownerId, o.name AS ownerName, b.version,
    b.created_at AS createdAt, b.updated_at AS updatedAt, m.role AS myRole,
    r.total, r.hold, r.short, r.changed, r.kept, v.rails_total AS cut, v.letter, v.created_at AS cutAt
  FROM (SELECT * FROM board b WHERE ${visible} ${page}) b
  JOIN person o ON o.id = b.owner_id
  LEFT JOIN board_member m ON m.board_id = b.id AND m.person_id = ?
  LEFT JOIN (
    SELECT board_id, count(*) AS total, sum(holds = 1) AS hold, sum(holds = 0) AS short,
      sum(document_hash IS NOT cut_hash) AS changed, count(cut_hash) AS kept
    FROM rail GROUP BY board_id
  ) r ON r.board_id = b.id
  LEFT JOIN revision v ON v.board_id = b.id
    AND v.number = (SELECT max(number) FROM revision WHERE board_id = b.id)
  ORDER BY b.name, b.id`;

function summaryOf(actor: Actor, row: BoardRow): BoardSummary {
  const rights = boardRights(actor, row);
  if (rights === null) throw notFound('board');
  const total = row.total ?? 0;
  const hold = row.hold ?? 0;
  const short = row.short ?? 0;
  return {
    id: row.id,
    name: row.name,
    description: row.description,
    owner: { id: row.ownerId, name: row.ownerName },
    version: row.version,
    createdAt: row.createdAt,
    updatedAt: row.updatedAt,
    myRole: row.myRole,
    rights,
    rails: { total, hold, short, unknown: total - hold - short },
    latestRevision: row.letter && row.cutAt ? { letter: row.letter, createdAt: row.cutAt } : null,
    changedRails: (row.changed ?? 0) + (row.cut ?? 0) - (row.kept ?? 0),
  };
}

const MINE = 'b.id IN (SELECT board_id FROM board_member WHERE person_id = ?)';

/** The boards that this person may see, by name. */
export async function boardSummaries(
  manager: EntityManager,
  actor: Actor,
  limit: number,
  offset: number,
): Promise<{ items: BoardSummary[]; total: number }> {
  const [visible, mine] = seesAllBoards(actor) ? ['1', []] : [MINE, [actor.id]];
  const [count] = await manager.query<{ n: number }[]>(
    `SELECT count(*) AS n FROM board b WHERE ${visible}`,
    mine,
  );
  const rows = await manager.query<BoardRow[]>(
    summarySql(visible, 'ORDER BY b.name, b.id LIMIT ? OFFSET ?'),
    [...mine, limit, offset, actor.id],
  );
  return { items: rows.map((row) => summaryOf(actor, row)), total: count.n };
}

export async function boardSummary(
  manager: EntityManager,
  actor: Actor,
  boardId: string,
): Promise<BoardSummary> {
  const [row] = await manager.query<BoardRow[]>(summarySql('b.id = ?', ''), [boardId, actor.id]);
  if (!row) throw notFound('board');
  return summaryOf(actor, row);
}
