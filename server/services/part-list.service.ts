import type { Page } from '@shared/schemas/common.schema';
import type { Part, PartFacets, PartQuery } from '@shared/schemas/part.schema';
import type { Context } from '../context';
import { countParts, findParts, type PartSearch } from '../db/repositories/part.repository';
import { likePattern } from './like';

/** The column behind each name that a query may sort or filter by. */
const columns = {
  partNumber: 'p.part_number',
  capacitance_F: 'p.capacitance_f',
  esr_ohm: 'p.esr_ohm',
  esl_H: 'p.esl_h',
  rated_voltage_V: 'p.rated_voltage_v',
  unit_cost: 'p.unit_cost',
  area_mm2: 'p.area_mm2',
  caseSize: 'p.case_size',
  dielectric: 'p.dielectric',
  technology: 'p.technology',
  state: 'p.state',
} as const;

const words = (text = ''): string[] => text.toLowerCase().split(/\s+/).filter(Boolean).slice(0, 8);

function searchOf(query: PartQuery): PartSearch {
  const conditions: string[] = [];
  const parameters: unknown[] = [];
  const require = (condition: string, value: unknown) => {
    conditions.push(condition);
    parameters.push(value);
  };
  for (const name of ['technology', 'dielectric', 'caseSize', 'state'] as const)
    if (query[name]) require(`${columns[name]} = ?`, query[name]);
  if (query.min_rated_V !== undefined) require('p.rated_voltage_v >= ?', query.min_rated_V);
  if (query.min_F !== undefined) require('p.capacitance_f >= ?', query.min_F);
  if (query.max_F !== undefined) require('p.capacitance_f <= ?', query.max_F);
  for (const word of words(query.q)) require("p.search_text LIKE ? ESCAPE '\\'", likePattern(word));
  return { conditions, parameters };
}

/** What is not known stands last, whichever way the list runs. */
export async function listParts(ctx: Context, query: PartQuery): Promise<Page<Part>> {
  const { limit, offset } = query;
  const search = searchOf(query);
  const direction = query.order === 'asc' ? 'ASC' : 'DESC';
  const items = await findParts(ctx.db.manager, {
    ...search,
    tail: `ORDER BY ${columns[query.sort]} ${direction} NULLS LAST, p.id LIMIT ? OFFSET ?`,
    tailParameters: [limit, offset],
  });
  return { items, total: await countParts(ctx.db.manager, search), limit, offset };
}

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
