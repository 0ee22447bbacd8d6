import { kneeFrequency } from '@shared/engine/target';
import { railDocument } from '@shared/rail/document';
import { type Part, partFieldsSchema } from '@shared/schemas/part.schema';
import { railListSchema } from '@shared/schemas/rail.schema';
import { railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { railSpecSchema } from '@shared/schemas/rail-spec.schema';
import { revisionDetailSchema } from '@shared/schemas/revision.schema';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { demoParts } from '../../server/db/demo/parts';
import { demoRails } from '../../server/db/demo/rails';
import { seedDemo, seedOnFirstRun } from '../../server/db/demo/seed';
import { demoSetup } from '../../server/db/demo/setup';
import { entities } from '../../server/db/entities';
import { openTestApp, type TestApp } from '../helpers/app';
import { DEMO_BOARD, people } from '../helpers/people';

let t: TestApp;
beforeEach(async () => {
  t = await openTestApp();
});
afterEach(() => t.close());

const tables = ['person', 'part', 'board', 'board_member', 'rail', 'rail_part', 'revision'];
const contents = async () => {
  const all: Record<string, unknown[]> = {};
  for (const table of tables) all[table] = await t.ctx.db.rows(`SELECT * FROM ${table} ORDER BY 1, 2`);
  return all;
};

describe('the demo data', () => {
  it('is the same after seeding again', async () => {
    const before = await contents();
    await seedDemo(t.ctx);
    await seedOnFirstRun(t.ctx);
    expect(await contents()).toEqual(before);
  });

  it('leaves what people changed as it is', async () => {
    const owner = await t.as('owner');
    await owner.patch(`/boards/${DEMO_BOARD}`, { version: 1, name: 'Renamed' }).expect(200);
    await seedDemo(t.ctx);
    expect((await owner.get(`/boards/${DEMO_BOARD}`)).body).toMatchObject({
      name: 'Renamed',
      rails: { total: 6 },
    });
  });

  it('holds by the schemas, with four rails that hold and two that are short', async () => {
    for (const { fields } of demoParts) expect(partFieldsSchema.parse(fields)).toEqual(fields);
    for (const { spec } of demoRails) expect(railSpecSchema.parse(spec)).toEqual(spec);
    const { body } = await (await t.as('owner')).get(`/boards/${DEMO_BOARD}/rails`).expect(200);
    const { rails, parts } = railListSchema.parse(body);
    const byId = new Map(parts.map((part: Part) => [part.id, part]));
    const headroom = new Map(rails.map((rail) => [rail.spec.name, rail.summary.tightest?.headroom_dB ?? 0]));
    for (const rail of rails) railDocumentSchema.parse(railDocument(rail.spec, rail.bank, byId, demoSetup));
    expect(rails.filter((rail) => rail.summary.holds).length).toBe(4);
    expect(headroom.get('VDD_CORE')).toBeLessThan(-1.5);
    expect(headroom.get('VDD_CORE')).toBeGreaterThan(-3);
    expect(headroom.get('VDD_AUX')).toBeLessThan(-2);
    for (const rail of rails)
      for (const line of rail.bank)
        expect(byId.get(line.partId)?.rated_voltage_V).toBeGreaterThanOrEqual(rail.spec.voltage_V);
  });

  it('has a rail for each way to hold and yet be short', async () => {
    const { body } = await (await t.as('reviewer')).get(`/boards/${DEMO_BOARD}/revisions/B`).expect(200);
    const { railResults } = revisionDetailSchema.parse(body);
    const checksOf = (name: string) => {
      const checks = railResults.find(({ document }) => document.rail.name === name)?.checks;
      if (!checks) throw new Error(`${name} has no checks`);
      return checks;
    };
    const aux = checksOf('VDD_AUX');
    expect([aux.catalogue.holds, aux.service.holds]).toEqual([true, false]);
    expect(aux.parts.some((part) => part.estimated)).toBe(true);
    const serdes = checksOf('VDD_SERDES');
    expect([serdes.catalogue.holds, serdes.service.holds]).toEqual([true, true]);
    expect(serdes.pattern?.swing_V).toBeGreaterThan(serdes.allowance_V ?? Number.POSITIVE_INFINITY);
    expect(serdes.step?.droop_V).toBeLessThan(serdes.allowance_V ?? 0);
    const bus = checksOf('VBUS_72');
    expect([bus.service.holds, bus.worst.holds, bus.missing?.holds]).toEqual([true, true, false]);
    expect(checksOf('VDD_DDR').start_up.holds).toBe(false);
  });

  it('keeps each band at what it was found from', () => {
    const derived = demoRails.filter(({ spec }) => spec.band_basis);
    expect(derived.length).toBeGreaterThan(0);
    for (const { spec } of derived) {
      const { rise_s = 0, knee = 0.35, regulator_bandwidth_Hz } = spec.band_basis ?? {};
      expect(spec.band_Hz).toEqual([regulator_bandwidth_Hz, kneeFrequency(rise_s, knee)]);
    }
  });

  it('shows real farthest distances on at least two rails of its latest revision', async () => {
    const { body } = await (await t.as('layout')).get(`/boards/${DEMO_BOARD}/revisions/B`).expect(200);
    const { railResults } = revisionDetailSchema.parse(body);
    const real = railResults.filter(({ instances }) =>
      instances.some(
        ({ farthest_m, farthestReason, distance_m }) =>
          farthestReason === null && farthest_m !== null && farthest_m > (distance_m ?? 0),
      ),
    );
    expect(real.length).toBeGreaterThanOrEqual(2);
  });

  it('has parts of every state and one person for each role', async () => {
    const states = demoParts.map((part) => part.state);
    expect(new Set(states)).toEqual(new Set(['approved', 'draft', 'retired']));
    expect(new Set(demoParts.map((part) => part.fields.partNumber)).size).toBe(demoParts.length);
    const { body } = await (await t.as('admin')).get(`/boards/${DEMO_BOARD}`).expect(200);
    expect(body.myRole).toBeNull();
    expect(body.owner.id).toBe(people.owner.id);
  });
});

describe('the database', () => {
  it('has exactly the columns that the entities say', async () => {
    const { dataSource } = t.ctx.db;
    for (const entity of entities) {
      const meta = dataSource.getMetadata(entity);
      const rows = await t.ctx.db.rows<{ name: string; notnull: number }>(
        `SELECT name, "notnull" FROM pragma_table_info('${meta.tableName}')`,
      );
      const inDatabase = rows.map((row) => `${row.name} ${row.notnull ? 'always' : 'maybe'}`);
      const inEntity = meta.columns.map(
        (column) => `${column.databaseName} ${column.isNullable ? 'maybe' : 'always'}`,
      );
      expect(inDatabase.sort(), meta.tableName).toEqual(inEntity.sort());
    }
  });

  it('has an index that begins with each foreign key, and enforces them', async () => {
    const [{ foreign_keys }] = await t.ctx.db.rows<{ foreign_keys: number }>('PRAGMA foreign_keys');
    expect(foreign_keys).toBe(1);
    const [{ journal_mode }] = await t.ctx.db.rows<{ journal_mode: string }>('PRAGMA journal_mode');
    expect(journal_mode).toBe('wal');
    for (const table of [...tables, 'session', 'access_token']) {
      const keys = await t.ctx.db.rows<{ column: string }>(
        `SELECT "from" AS column FROM pragma_foreign_key_list('${table}')`,
      );
      const leading = await t.ctx.db.rows<{ column: string }>(
        `SELECT x.name AS column FROM pragma_index_list('${table}') i JOIN pragma_index_info(i.name) x WHERE x.seqno = 0`,
      );
      const indexed = new Set(leading.map((row) => row.column));
      for (const { column } of keys) expect(indexed.has(column), `${table}.${column}`).toBe(true);
    }
  });
});
