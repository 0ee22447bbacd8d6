import type { Page } from '@shared/schemas/common.schema';
import type { Part, PartFacets, PartQuery } from '@shared/schemas/part.schema';
import { type EntityManager, In } from 'typeorm';
import type { Context } from '../context';
import { PartEntity } from '../db/entities/part.entity';
import { likePattern } from './like';
import { partView } from './part-view';

export async function listParts(ctx: Context, query: PartQuery): Promise<Page<Part>> {
  const search = ctx.db.manager.createQueryBuilder(PartEntity, 'p').leftJoin('p.updatedBy', 'u');
  search.addSelect(['u.id', 'u.name']);
  for (const name of ['technology', 'dielectric', 'caseSize', 'state'] as const)
    if (query[name]) search.andWhere(`p.${name} = :${name}`, { [name]: query[name] });
  if (query.min_rated_V !== undefined)
    search.andWhere('p.rated_voltage_V >= :rated', { rated: query.min_rated_V });
  if (query.min_F !== undefined) search.andWhere('p.capacitance_F >= :low', { low: query.min_F });
  if (query.max_F !== undefined) search.andWhere('p.capacitance_F <= :high', { high: query.max_F });
  words(query.q).forEach((word, i) => {
    search.andWhere(`p.searchText LIKE :q${i} ESCAPE '\\'`, { [`q${i}`]: likePattern(word) });
  });
  const [parts, total] = await search
    .orderBy(`p.${query.sort}`, query.order === 'asc' ? 'ASC' : 'DESC', 'NULLS LAST')
    .addOrderBy('p.id', 'ASC')
    .limit(query.limit)
    .offset(query.offset)
    .getManyAndCount();
  return { items: parts.map(partView), total, limit: query.limit, offset: query.offset };
}

const words = (text = ''): string[] => text.toLowerCase().split(/\s+/).filter(Boolean).slice(0, 8);

/** What the library holds, for the filters: each value with how many parts have it. */
export async function partFacets(ctx: Context): Promise<PartFacets> {
  const count = (column: 'technology' | 'dielectric' | 'case_size') =>
    ctx.db.rows<{ value: string; count: number }>(
      `SELECT ${column} AS value, count(*) AS count FROM part WHERE ${column} <> '' GROUP BY ${column} ORDER BY ${column}`,
    );
  return {
    technologies: await count('technology'),
    dielectrics: await count('dielectric'),
    caseSizes: await count('case_size'),
  };
}

const CHUNK = 500;

/** Parts by id, in chunks: a statement takes a limited number of parameters. */
export async function partsById(manager: EntityManager, ids: Iterable<string>): Promise<Map<string, Part>> {
  const wanted = [...new Set(ids)];
  const found = new Map<string, Part>();
  for (let i = 0; i < wanted.length; i += CHUNK) {
    const parts = await manager.find(PartEntity, {
      where: { id: In(wanted.slice(i, i + CHUNK)) },
      relations: { updatedBy: true },
    });
    for (const part of parts) found.set(part.id, partView(part));
  }
  return found;
}
