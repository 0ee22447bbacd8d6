import { railListSchema, railWithPartsSchema, searchSettingsSchema } from '@shared/schemas/rail.schema';
import { railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { renewOldResults } from '../../server/services/renew-results';
import { type Caller, openTestApp, type TestApp } from '../helpers/app';
import { DEMO_BOARD, OTHER_BOARD, partId, people, railId } from '../helpers/people';
import { railBody, railSpec } from '../helpers/rail-body';

const RAILS = `/boards/${DEMO_BOARD}/rails`;
let t: TestApp;
let engineer: Caller;
beforeEach(async () => {
  t = await openTestApp();
  engineer = await t.as('engineer');
});
afterEach(() => t.close());

const list = async () => railListSchema.parse((await engineer.get(RAILS).expect(200)).body);

describe('rails', () => {
  it('are listed by position with every part they use', async () => {
    const { rails, parts } = await list();
    expect(rails.map((rail) => rail.spec.name)).toEqual([
      'VDD_CORE',
      'VDD_DDR',
      'VDD_IO',
      'VDD_SERDES',
      'VDD_AUX',
      'VBUS_72',
    ]);
    const known = new Set(parts.map((part) => part.id));
    for (const line of rails.flatMap((rail) => rail.bank)) expect(known.has(line.partId)).toBe(true);
  });

  it('are made with a result by the shared engine', async () => {
    const { body } = await engineer.post(RAILS, railBody('VDD_NEW')).expect(201);
    const { rail, parts } = railWithPartsSchema.parse(body);
    expect(rail).toMatchObject({ position: 6, version: 1, updatedBy: { id: people.engineer.id } });
    expect(rail.summary).toMatchObject({ holds: true, parts: 7, kinds: 2, error: null });
    const { tightest, catalogue, worst, missing } = rail.summary;
    expect(tightest?.headroom_dB).toBeGreaterThan(0);
    expect(catalogue?.tightest.headroom_dB).toBeGreaterThan(tightest?.headroom_dB ?? 0);
    expect(worst?.tightest.headroom_dB).toBeLessThan(tightest?.headroom_dB ?? 0);
    expect(missing).toMatchObject({ part: expect.stringContaining('AB-'), holds: false });
    expect(rail.search).toEqual(searchSettingsSchema.parse({}));
    expect(parts).toHaveLength(2);
  });

  it('that were stored before a setting existed have its default', async () => {
    await t.ctx.db.write((manager) => manager.query(`UPDATE rail SET search = '{"minimise":"area"}'`));
    for (const rail of (await list()).rails)
      expect(rail.search).toEqual(searchSettingsSchema.parse({ minimise: 'area' }));
  });

  it('that an older engine computed are computed anew at start-up', async () => {
    const before = await list();
    await t.ctx.db.write((manager) =>
      manager.query(
        `UPDATE rail SET summary = json_object('engineVersion', '1.0.0', 'holds', json('true'), 'tightest', NULL,
           'parts', 0, 'kinds', 0, 'cost', NULL, 'area_mm2', NULL, 'error', NULL), holds = 1`,
      ),
    );
    // Lists read what is stored, also while it is old.
    expect((await list()).rails[0].summary).toMatchObject({ engineVersion: '1.0.0', worst: null });
    await expect(renewOldResults(t.ctx)).resolves.toBe(before.rails.length);
    await expect(renewOldResults(t.ctx)).resolves.toBe(0);
    const after = await list();
    expect(after.rails.map((rail) => rail.summary)).toEqual(before.rails.map((rail) => rail.summary));
    expect(after.rails.map((rail) => rail.version)).toEqual(before.rails.map((rail) => rail.version));
  });

  it('say why there is no result', async () => {
    const spec = { ...railSpec('VDD_OPEN'), source: { kind: 'open' } };
    const { body } = await engineer.post(RAILS, { spec }).expect(201);
    expect(body.rail.summary).toMatchObject({ holds: null, tightest: null });
    expect(body.rail.summary.error).toMatch(/bank is empty/);
    expect((await engineer.get(`/boards/${DEMO_BOARD}`)).body.rails).toMatchObject({ total: 7, unknown: 1 });
  });

  it('get a new result with every save', async () => {
    const id = railId('VDD_AUX');
    const { body } = await engineer.patch(`${RAILS}/${id}`, { version: 1, bank: [] }).expect(200);
    expect(body.rail).toMatchObject({ version: 2, bank: [], summary: { parts: 0, holds: false } });
    expect(body.parts).toEqual([]);
    expect(body.rail.spec.name).toBe('VDD_AUX');
  });

  it('keep a line of count 0 in the bank, and its part at hand', async () => {
    const bank = [{ partId: partId('AB-C0402-X7R-100N-16'), count: 0 }];
    const { body } = await engineer.patch(`${RAILS}/${railId('VDD_AUX')}`, { version: 1, bank }).expect(200);
    expect(body.rail.bank).toHaveLength(1);
    expect(body.parts).toHaveLength(1);
    expect(body.rail.summary.parts).toBe(0);
  });

  it('refuse a stale save and say who saved what', async () => {
    const address = `${RAILS}/${railId('VDD_IO')}`;
    await (await t.as('owner')).patch(address, { version: 1, bank: [] }).expect(200);
    const { body } = await engineer
      .patch(address, { version: 1, search: { minimise: 'cost' } })
      .expect(409)
      .expect('Content-Type', /application\/problem\+json/);
    expect(body).toMatchObject({ status: 409, changedBy: { id: people.owner.id, name: people.owner.name } });
    expect(Date.parse(body.changedAt)).toBeGreaterThan(Date.now() - 60_000);
    expect(railWithPartsSchema.parse(body.current).rail).toMatchObject({ version: 2, bank: [] });
    await engineer.delete(`${address}?version=1`).expect(409);
  });

  it('let exactly one of two simultaneous saves through', async () => {
    const address = `${RAILS}/${railId('VDD_IO')}`;
    const saves = Array.from({ length: 8 }, () => engineer.patch(address, { version: 1, bank: [] }));
    const statuses = (await Promise.all(saves)).map((answer) => answer.status).sort();
    expect(statuses).toEqual([200, 409, 409, 409, 409, 409, 409, 409]);
  });

  it('have names that differ by more than case', async () => {
    for (const body of [railBody('vdd_io'), railBody(' VDD_IO ')]) {
      const { body: problem } = await engineer.post(RAILS, body).expect(422);
      expect(problem.errors).toEqual([
        { path: 'spec.name', message: 'another rail of this board has this name' },
      ]);
    }
    const spec = railSpec('vdd_io');
    await engineer.patch(`${RAILS}/${railId('VDD_AUX')}`, { version: 1, spec }).expect(422);
    await engineer.patch(`${RAILS}/${railId('VDD_IO')}`, { version: 1, spec }).expect(200);
    await (await t.as('outsider')).post(`/boards/${OTHER_BOARD}/rails`, railBody('VDD_IO')).expect(201);
  });

  it('name the line whose part the library does not have', async () => {
    const bank = [
      { partId: partId('AB-C0402-X7R-100N-16'), count: 1 },
      { partId: railId('nothing'), count: 1 },
    ];
    const search = { candidateIds: [railId('nothing')] };
    const { body } = await engineer.post(RAILS, { ...railBody('VDD_NEW'), bank, search }).expect(422);
    expect(body.errors).toEqual([
      { path: 'bank[1].partId', message: 'the library has no such part' },
      { path: 'search.candidateIds[0]', message: 'the library has no such part' },
    ]);
  });

  it('name each wrong field with its path', async () => {
    const spec = { ...railSpec('X'), band_Hz: [1e6, 1e3], voltage_V: -1, extra: 1 };
    const { body } = await engineer.post(RAILS, { spec }).expect(422);
    const paths = body.errors.map((fault: { path: string }) => fault.path);
    expect(paths).toEqual(expect.arrayContaining(['spec.band_Hz[1]', 'spec.voltage_V', 'spec.extra']));
  });

  it('take a new order that names each of them once', async () => {
    const ids = (await list()).rails.map((rail) => rail.id);
    const turned = [...ids].reverse();
    const { body } = await engineer.put(`${RAILS}/order`, { railIds: turned }).expect(200);
    expect(railListSchema.parse(body).rails.map((rail) => rail.id)).toEqual(turned);
    expect((await list()).rails.map((rail) => rail.id)).toEqual(turned);
    for (const railIds of [ids.slice(1), [...ids, ids[0]], [...ids.slice(1), railId('nothing')], []])
      await engineer.put(`${RAILS}/order`, { railIds }).expect(422);
  });

  it('belong to their board', async () => {
    const outsider = await t.as('outsider');
    const elsewhere = `/boards/${OTHER_BOARD}/rails/${railId('VDD_IO')}`;
    await outsider.get(elsewhere).expect(404);
    await outsider.patch(elsewhere, { version: 1, bank: [] }).expect(404);
    await outsider.delete(`${elsewhere}?version=1`).expect(404);
    await outsider.get(`${elsewhere}/document`).expect(404);
  });

  it('can be deleted', async () => {
    await engineer.delete(`${RAILS}/${railId('VDD_IO')}`).expect(400);
    await engineer.delete(`${RAILS}/${railId('VDD_IO')}?version=1`).expect(204);
    expect((await list()).rails).toHaveLength(5);
  });

  it('leave as a document that the schema takes back', async () => {
    const address = `${RAILS}/${railId('VDD_IO')}`;
    const candidateIds = [partId('AB-C0402-X7R-100N-16')];
    await engineer.patch(address, { version: 1, search: { candidateIds } }).expect(200);
    const answer = await engineer.get(`${address}/document`).expect(200);
    expect(answer.get('Content-Disposition')).toBe('attachment; filename=vdd_io.rail.json');
    const document = railDocumentSchema.parse(JSON.parse(answer.text));
    expect(document.rail.name).toBe('VDD_IO');
    expect(document.search?.candidates).toEqual(['AB-C0402-X7R-100N-16']);
  });
});
