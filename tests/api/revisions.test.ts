import { createHash } from 'node:crypto';
import { canonicalJson } from '@shared/formats/canonical-json';
import { summariseRail } from '@shared/rail/summary';
import { revisionDetailSchema, revisionPageSchema } from '@shared/schemas/revision.schema';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { routes } from '../../server/routes';
import { revisionLetter } from '../../server/services/revision-letter';
import { type Caller, openTestApp, type TestApp } from '../helpers/app';
import { DEMO_BOARD, OTHER_BOARD, partId, people, railId } from '../helpers/people';
import { railBody } from '../helpers/rail-body';

const REVISIONS = `/boards/${DEMO_BOARD}/revisions`;
let t: TestApp;
let engineer: Caller;
beforeEach(async () => {
  t = await openTestApp();
  engineer = await t.as('engineer');
});
afterEach(() => t.close());

const cut = async (note = 'For the prototype') =>
  revisionDetailSchema.parse((await engineer.post(REVISIONS, { note }).expect(201)).body);

describe('a revision', () => {
  it('holds rails, banks, parts and results', async () => {
    const revision = await cut();
    expect(revision).toMatchObject({
      letter: 'C',
      note: 'For the prototype',
      boardName: 'Tide gateway',
      createdBy: { id: people.engineer.id, name: people.engineer.name },
      rails: { total: 6, hold: 4, short: 2, unknown: 0 },
    });
    for (const rail of revision.railResults) {
      expect(rail.summary).toEqual(summariseRail(rail.document));
      expect(rail.instances).toHaveLength(rail.summary.parts);
    }
    const designators = revision.railResults.flatMap((rail) => rail.instances.map((one) => one.designator));
    expect(new Set(designators).size).toBe(designators.length);
    expect(revision.parts).toBe(designators.length);
    expect((await engineer.get(`${REVISIONS}/C`).expect(200)).body).toEqual(revision);
  });

  it('is listed without its snapshot, newest first', async () => {
    await cut();
    const { body } = await engineer.get(REVISIONS).expect(200);
    expect(revisionPageSchema.parse(body).items.map((item) => item.letter)).toEqual(['C', 'B', 'A']);
    expect(JSON.stringify(body)).not.toContain('railResults');
    expect((await engineer.get(`${REVISIONS}?limit=1&offset=1`)).body.items[0].letter).toBe('B');
  });

  it('does not change when rails and parts do', async () => {
    const before = await cut();
    await engineer.patch(`/boards/${DEMO_BOARD}/rails/${railId('VDD_IO')}`, { version: 1, bank: [] });
    await (await t.as('librarian'))
      .patch(`/parts/${partId('AB-C0402-X6S-1U-10')}`, { version: 1, esr_ohm: 0.5 })
      .expect(200);
    expect((await engineer.get(`${REVISIONS}/C`)).body).toEqual(before);
  });

  it('has a hash that anyone can check against the document', async () => {
    const { hash } = await cut();
    const answer = await engineer.get(`${REVISIONS}/C/document.json`).expect(200);
    expect(createHash('sha256').update(answer.text).digest('hex')).toBe(hash);
    expect(canonicalJson(JSON.parse(answer.text))).toBe(answer.text);
    expect(answer.get('Content-Disposition')).toBe('attachment; filename=tide-gateway-C.json');
  });

  it('cannot be changed or removed, by no route and not in the database', async () => {
    const methods = routes.filter((route) => route.path.includes('/revisions')).map((route) => route.method);
    expect(new Set(methods)).toEqual(new Set(['get', 'post']));
    for (const method of ['put', 'patch', 'delete'] as const)
      expect((await engineer.send(method, `${REVISIONS}/A`, {})).status).toBe(405);
    const change = (sql: string) => t.ctx.db.write((manager) => manager.query(sql));
    await expect(change("UPDATE revision SET note = 'other'")).rejects.toThrow('a revision never changes');
    await expect(change("DELETE FROM revision WHERE letter = 'A'")).rejects.toThrow('only with its board');
    await expect(change(`DELETE FROM person WHERE id = '${people.owner.id}'`)).rejects.toThrow();
    expect((await engineer.get(REVISIONS)).body.total).toBe(2);
  });

  it('needs a note and a rail', async () => {
    expect((await engineer.post(REVISIONS, { note: ' ' }).expect(422)).body.errors[0].path).toBe('note');
    await (await t.as('outsider')).post(`/boards/${OTHER_BOARD}/revisions`, { note: 'Empty' }).expect(409);
  });

  it('gets the next letter, also when several are cut at once', async () => {
    const answers = await Promise.all([cut(), cut(), cut()]);
    expect(answers.map((revision) => revision.letter).sort()).toEqual(['C', 'D', 'E']);
    expect([1, 26, 27, 52, 53, 702, 703].map(revisionLetter)).toEqual([
      'A',
      'Z',
      'AA',
      'AZ',
      'BA',
      'ZZ',
      'AAA',
    ]);
  });

  it('is found by its letter only', async () => {
    for (const letter of ['Z', 'a', '1', 'ABCD', '%00'])
      await engineer.get(`${REVISIONS}/${letter}`).expect(404);
  });
});

describe('the placement list', () => {
  it('has one row a capacitor', async () => {
    const answer = await (await t.as('layout')).get(`${REVISIONS}/B/placement.csv`).expect(200);
    expect(answer.type).toBe('text/csv');
    expect(answer.charset).toBe('utf-8');
    expect(answer.get('Content-Disposition')).toBe('attachment; filename=tide-gateway-B-placement.csv');
    const [header, ...rows] = answer.text.trimEnd().split('\r\n');
    expect(header.split(',').slice(0, 7)).toEqual([
      'reference designator',
      'part',
      'value',
      'case',
      'side',
      'rail',
      'mount',
    ]);
    const { body } = await engineer.get(`${REVISIONS}/B`);
    expect(rows).toHaveLength(body.parts);
  });

  it('keeps names from becoming formulas', async () => {
    const { body } = await engineer.post(`/boards/${DEMO_BOARD}/rails`, railBody('=1+1,"x"')).expect(201);
    expect(body.rail.spec.name).toBe('=1+1,"x"');
    await cut();
    const { text } = await engineer.get(`${REVISIONS}/C/placement.csv`).expect(200);
    expect(text).toContain(`"'=1+1,""x"""`);
  });
});
