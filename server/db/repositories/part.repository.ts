import type { Part } from '@shared/schemas/part.schema';
import type { EntityManager } from 'typeorm';

/** Lists of parts are read often and whole: plain rows cost a tenth of entities. */
const SELECT = `SELECT p.id, p.part_number AS partNumber, p.description, p.technology, p.dielectric,
  p.case_size AS caseSize, p.capacitance_f AS capacitance_F, p.tolerance, p.rated_voltage_v AS rated_voltage_V,
  p.esr_ohm, p.esl_h AS esl_H, p.mount_h AS mount_H, p.height_mm, p.termination, p.unit_cost, p.area_mm2,
  p.bias_curve, p.temperature_curve, p.ageing_percent_per_decade, p.esr_table, p.impedance_table,
  p.esr_tolerance_percent, p.esl_tolerance_percent, p.state, p.version, p.created_at AS createdAt, p.updated_at AS updatedAt, p.updated_by AS editorId, u.name AS editorName
FROM part p LEFT JOIN person u ON u.id = p.updated_by`;

type TableName = 'bias_curve' | 'temperature_curve' | 'esr_table' | 'impedance_table';

/** As SQLite gives it: curves and tables are JSON text. */
type PartRow = Omit<Part, 'updatedBy' | TableName> &
  Record<TableName, string | null> & { editorId: string | null; editorName: string | null };

const points = <T>(text: string | null): T | null => (text === null ? null : JSON.parse(text));

/** `conditions` and `tail` are fixed pieces of SQL over `p`; what a person gave goes into `parameters`. */
export interface PartSearch {
  conditions: string[];
  parameters: unknown[];
  tail?: string;
  tailParameters?: unknown[];
}

const whereOf = (conditions: string[]): string =>
  conditions.length > 0 ? `WHERE ${conditions.join(' AND ')}` : '';

export async function findParts(manager: EntityManager, search: PartSearch): Promise<Part[]> {
  const { conditions, parameters, tail = '', tailParameters = [] } = search;
  const rows = await manager.query<PartRow[]>(`${SELECT} ${whereOf(conditions)} ${tail}`, [
    ...parameters,
    ...tailParameters,
  ]);
  return rows.map(({ editorId, editorName, ...part }) => ({
    ...part,
    bias_curve: points(part.bias_curve),
    temperature_curve: points(part.temperature_curve),
    esr_table: points(part.esr_table),
    impedance_table: points(part.impedance_table),
    updatedBy: editorId !== null && editorName !== null ? { id: editorId, name: editorName } : null,
  }));
}

export async function countParts(
  manager: EntityManager,
  { conditions, parameters }: PartSearch,
): Promise<number> {
  const [row] = await manager.query<{ n: number }[]>(
    `SELECT count(*) AS n FROM part p ${whereOf(conditions)}`,
    parameters,
  );
  return row.n;
}

const CHUNK = 500;

/** Parts by id, in chunks: a statement takes a limited number of parameters. */
export async function partsById(manager: EntityManager, ids: Iterable<string>): Promise<Map<string, Part>> {
  const wanted = [...new Set(ids)];
  const found = new Map<string, Part>();
  for (let i = 0; i < wanted.length; i += CHUNK) {
    const some = wanted.slice(i, i + CHUNK);
    const conditions = [`p.id IN (${some.map(() => '?').join(', ')})`];
    for (const part of await findParts(manager, { conditions, parameters: some })) found.set(part.id, part);
  }
  return found;
}
