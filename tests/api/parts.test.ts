import { type Part, partFacetsSchema, partPageSchema, partSchema } from '@shared/schemas/part.schema';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { type Caller, openTestApp, type TestApp } from '../helpers/app';
import { DEMO_BOARD, partId, people, railId } from '../helpers/people';

let t: TestApp;
let librarian: Caller;
let engineer: Caller;
beforeEach(async () => {
  t = await openTestApp();
  librarian = await t.as('librarian');
  engineer = await t.as('engineer');
});
afterEach(() => t.close());

const find = async (query: string) =>
  partPageSchema.parse((await engineer.get(`/parts${query}`).expect(200)).body);

const fields = {
  partNumber: 'AB-NEW-1',
  description: 'A new part',
  technology: 'ceramic',
  dielectric: 'X7R',
  caseSize: '0402',
  capacitance_F: 1e-7,
  tolerance: 'K',
  rated_voltage_V: 16,
  esr_ohm: 0.02,
  esl_H: 3e-10,
  mount_H: 5e-10,
  height_mm: 0.55,
  termination: 'soft',
  unit_cost: null,
  area_mm2: 1.1,
};

const behaviour = {
  bias_curve: [
    [0, 1],
    [3.3, 0.92],
    [16, 0.57],
  ],
  temperature_curve: [
    [-55, 0.9],
    [25, 1],
    [125, 0.87],
  ],
  ageing_percent_per_decade: 2.5,
  esr_table: [
    [1e5, 0.05],
    [3e7, 0.02],
  ],
  impedance_table: [
    [1e6, 0.039, -1.59],
    [3e7, 0.021, 0.004],
    [1e9, 0.12, 1.88],
  ],
  esr_tolerance_percent: 25,
  esl_tolerance_percent: 0,
};
const nothingKnown = Object.fromEntries(Object.keys(behaviour).map((name) => [name, null]));

describe('the parts list', () => {
  it('filters by each column', async () => {
    const all = await find('');
    expect(all.total).toBe(61);
    const check = async (query: string, matches: (part: Part) => boolean) => {
      const found = await find(query);
      expect(found.items.length, query).toBeGreaterThan(0);
      expect(found.items.map((part) => part.id).sort(), query).toEqual(
        all.items
          .filter(matches)
          .map((part) => part.id)
          .sort(),
      );
    };
    await check('?technology=polymer', (part) => part.technology === 'polymer');
    await check('?dielectric=X6S', (part) => part.dielectric === 'X6S');
    await check('?caseSize=0402', (part) => part.caseSize === '0402');
    await check('?state=draft', (part) => part.state === 'draft');
    await check('?min_rated_V=50', (part) => part.rated_voltage_V >= 50);
    await check('?min_F=1e-6&max_F=1e-5', (part) => part.capacitance_F >= 1e-6 && part.capacitance_F <= 1e-5);
    await check('?q=0402%20c0g', (part) => part.caseSize === '0402' && part.dielectric === 'C0G');
  });

  it('takes wildcards in free text as they stand', async () => {
    expect((await find('?q=%25')).total).toBe(0);
    expect((await find('?q=_')).total).toBe(0);
    expect((await find(`?q=${encodeURIComponent("'; DROP TABLE part; --")}`)).total).toBe(0);
    expect((await find('?q=')).total).toBe(61);
  });

  it('sorts by every column, what is unknown last, and pages without gaps', async () => {
    await librarian.post('/parts', fields).expect(201);
    for (const sort of ['partNumber', 'unit_cost', 'area_mm2', 'capacitance_F', 'caseSize', 'state']) {
      for (const order of ['asc', 'desc']) {
        const { items } = await find(`?sort=${sort}&order=${order}`);
        if (sort === 'unit_cost') expect(items.at(-1)?.unit_cost).toBeNull();
        const paged: string[] = [];
        for (let offset = 0; offset < 62; offset += 25)
          paged.push(
            ...(await find(`?sort=${sort}&order=${order}&limit=25&offset=${offset}`)).items.map((p) => p.id),
          );
        expect(paged, `${sort} ${order}`).toEqual(items.map((part) => part.id));
      }
    }
    await engineer.get('/parts?sort=id;DROP').expect(400);
  });

  it('carries curves and stays small enough to be read whole', async () => {
    const { text } = await engineer.get('/parts?limit=100').expect(200);
    const { items } = partPageSchema.parse(JSON.parse(text));
    expect(items.filter((part) => part.bias_curve).length).toBeGreaterThan(30);
    expect(items.filter((part) => part.technology === 'ceramic' && !part.bias_curve).length).toBeGreaterThan(
      5,
    );
    expect(items.filter((part) => part.esr_table).map((part) => part.partNumber)).toEqual([
      'AB-P7343-470U-2V5-6M',
    ]);
    expect(items.filter((part) => part.impedance_table).map((part) => part.partNumber)).toEqual([
      'AB-C0402-X7R-100N-16',
    ]);
    expect(text.length).toBeLessThan(300_000);
  });

  it('counts what it holds for the filters', async () => {
    const facets = partFacetsSchema.parse((await engineer.get('/parts/facets').expect(200)).body);
    expect(facets.technologies.reduce((sum, facet) => sum + facet.count, 0)).toBe(61);
    expect(facets.caseSizes).toContainEqual({ value: '0402', count: 16 });
    expect(facets.dielectrics.map((facet) => facet.value)).toEqual(['C0G', 'X5R', 'X6S', 'X7R', 'X7S']);
  });
});

describe('a part', () => {
  it('begins as a draft', async () => {
    const { body } = await engineer.post('/parts', fields).expect(201);
    expect(partSchema.parse(body)).toMatchObject({
      ...fields,
      state: 'draft',
      version: 1,
      updatedBy: { id: people.engineer.id },
    });
    expect((await engineer.get(`/parts/${body.id}`).expect(200)).body).toEqual(body);
  });

  it('has a number of its own, whatever its case', async () => {
    const again = await engineer
      .post('/parts', { ...fields, partNumber: 'ab-c0402-x7r-100n-16' })
      .expect(422);
    expect(again.body.errors).toEqual([{ path: 'partNumber', message: 'another part has this number' }]);
  });

  it('keeps what a change leaves out', async () => {
    const { body: part } = await engineer.post('/parts', fields).expect(201);
    const { body } = await engineer.patch(`/parts/${part.id}`, { version: 1, esr_ohm: 0.03 }).expect(200);
    expect(body).toMatchObject({ ...fields, esr_ohm: 0.03, version: 2 });
  });

  it('refuses a stale change', async () => {
    const address = `/parts/${partId('AB-C0402-X7S-4U7-4')}`;
    await engineer.patch(address, { version: 1, unit_cost: 2 }).expect(200);
    const { body } = await librarian.patch(address, { version: 1, unit_cost: 3 }).expect(409);
    expect(body).toMatchObject({ current: { unit_cost: 2 }, changedBy: { id: people.engineer.id } });
    await librarian.put(`${address}/state`, { version: 1, state: 'approved' }).expect(409);
  });

  it('is approved, retired and taken back by a librarian, then closed to others', async () => {
    const address = `/parts/${partId('AB-C0402-X7S-4U7-4')}`;
    const set = async (version: number, state: string) =>
      (await librarian.put(`${address}/state`, { version, state }).expect(200)).body;
    expect(await set(1, 'approved')).toMatchObject({ state: 'approved', version: 2 });
    await engineer.patch(address, { version: 2, unit_cost: 2 }).expect(403);
    expect(await set(2, 'approved')).toMatchObject({ version: 2 });
    expect(await set(2, 'retired')).toMatchObject({ state: 'retired', version: 3 });
    expect(await set(3, 'draft')).toMatchObject({ state: 'draft', version: 4 });
    await engineer.patch(address, { version: 4, unit_cost: 2 }).expect(200);
  });

  it('renews the results of the rails that use it, without making an edit stale', async () => {
    const rail = `/boards/${DEMO_BOARD}/rails/${railId('VDD_CORE')}`;
    const before = (await engineer.get(rail)).body.rail;
    const revision = (await engineer.get(`/boards/${DEMO_BOARD}/revisions/B`)).body;
    await librarian
      .patch(`/parts/${partId('AB-P7343-470U-2V5-6M')}`, {
        version: 1,
        esr_ohm: 0.05,
        esr_table: null,
        unit_cost: 1.88,
      })
      .expect(200);
    const after = (await engineer.get(rail)).body.rail;
    expect(after.version).toBe(before.version);
    expect(after.summary.tightest.headroom_dB).toBeLessThan(before.summary.tightest.headroom_dB - 0.5);
    expect(after.summary.cost).toBeCloseTo(before.summary.cost + 4, 9);
    expect((await engineer.get(`/boards/${DEMO_BOARD}`)).body.changedRails).toBe(1);
    expect((await engineer.get(`/boards/${DEMO_BOARD}/revisions/B`)).body).toEqual(revision);
  });

  it('keeps its curves and tables as they are given, in the library’s list as well', async () => {
    const { body: part } = await engineer.post('/parts', { ...fields, ...behaviour }).expect(201);
    expect(partSchema.parse(part)).toMatchObject(behaviour);
    expect((await engineer.get(`/parts/${part.id}`).expect(200)).body).toEqual(part);
    expect((await find('?q=ab-new-1')).items).toEqual([part]);
  });

  it('keeps the curves that a change leaves out and forgets those that it empties', async () => {
    const { body: part } = await engineer.post('/parts', { ...fields, ...behaviour }).expect(201);
    const address = `/parts/${part.id}`;
    const kept = (await engineer.patch(address, { version: 1, esr_ohm: 0.03 }).expect(200)).body;
    expect(kept).toMatchObject({ ...fields, ...behaviour, esr_ohm: 0.03 });
    const change = { version: 2, bias_curve: null, esl_tolerance_percent: null };
    const some = (await engineer.patch(address, change).expect(200)).body;
    expect(some).toMatchObject({ ...behaviour, bias_curve: null, esl_tolerance_percent: null });
    const bare = (await engineer.patch(address, { version: 3, ...nothingKnown }).expect(200)).body;
    expect(bare).toMatchObject({ ...fields, ...nothingKnown, esr_ohm: 0.03 });
    expect((await find('?q=ab-new-1')).items).toEqual([bare]);
  });

  it('says at which point a curve is wrong', async () => {
    const refused = async (wrong: object) =>
      (await engineer.post('/parts', { ...fields, ...wrong }).expect(422)).body.errors;
    const at = (path: string, message: string) => [{ path, message: expect.stringContaining(message) }];
    const bias = (...points: number[][]) => refused({ bias_curve: points });
    expect(await bias([0, 1], [5, 0.8], [5, 0.7])).toEqual(at('bias_curve[2][0]', 'must rise'));
    expect(await bias([1, 1], [5, 0.8])).toEqual(at('bias_curve', 'first point is 0 V with factor 1'));
    expect(await bias([0, 0.9], [5, 0.8])).toEqual(at('bias_curve', 'first point is 0 V with factor 1'));
    expect(await bias([0, 1], [5, -0.8])).toEqual(at('bias_curve[1][1]', 'above zero'));
    expect(await bias([0, 1])).toEqual(at('bias_curve', 'at least two points'));
    expect(await bias([0, 1], [5, 1.6])).toEqual(at('bias_curve[1][1]', 'above 1.5'));
    const warm = (...points: number[][]) => refused({ temperature_curve: points });
    expect(await warm([-55, 0.9], [20, 1])).toEqual(at('temperature_curve', 'must reach 25 °C'));
    const many = Array.from({ length: 201 }, (_, i) => [i - 60, 1]);
    expect(await refused({ temperature_curve: many })).toEqual(at('temperature_curve', 'at most 200'));
    const impedance_table = [
      [1e6, 0.04, -1.6],
      [1e7, -0.02, -0.1],
    ];
    expect(await refused({ impedance_table })).toEqual(at('impedance_table[1][1]', 'must not be negative'));
    expect(await refused({ esr_tolerance_percent: 95 })).toEqual(at('esr_tolerance_percent', 'at most 90'));
    expect((await find('?q=ab-new-1')).total).toBe(0);
  });

  it('renews the results of its rails when its ESR over frequency changes', async () => {
    const rail = `/boards/${DEMO_BOARD}/rails/${railId('VDD_CORE')}`;
    const before = (await engineer.get(rail)).body.rail.summary;
    const esr_table = [
      [1e3, 0.2],
      [1e8, 0.05],
    ];
    await librarian.patch(`/parts/${partId('AB-P7343-470U-2V5-6M')}`, { version: 1, esr_table }).expect(200);
    const after = (await engineer.get(rail)).body.rail.summary;
    expect(after.tightest.headroom_dB).toBeLessThan(before.tightest.headroom_dB - 0.5);
  });

  it('refuses numbers that are no numbers', async () => {
    for (const capacitance_F of [0, -1, '1e-7', null, 1e9])
      await engineer.post('/parts', { ...fields, capacitance_F }).expect(422);
    const huge = JSON.stringify(fields).replace('1e-7', '1e999');
    await engineer.post('/parts').send(huge).expect(422);
  });
});
