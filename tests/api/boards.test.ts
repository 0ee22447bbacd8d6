import { boardDetailSchema, boardPageSchema } from '@shared/schemas/board.schema';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { PersonEntity } from '../../server/db/entities/person.entity';
import { type Caller, openTestApp, type TestApp } from '../helpers/app';
import { DEMO_BOARD, OTHER_BOARD, people, railId } from '../helpers/people';
import { railBody } from '../helpers/rail-body';

let t: TestApp;
let owner: Caller;
beforeEach(async () => {
  t = await openTestApp();
  owner = await t.as('owner');
});
afterEach(() => t.close());

describe('the list of boards', () => {
  it('counts rails by their results and knows the latest revision', async () => {
    const page = boardPageSchema.parse((await owner.get('/boards').expect(200)).body);
    expect(page.total).toBe(1);
    expect(page.items[0]).toMatchObject({
      name: 'Tide gateway',
      myRole: 'engineer',
      rails: { total: 6, hold: 4, short: 2, unknown: 0 },
      latestRevision: { letter: 'B' },
      changedRails: 0,
    });
    expect(page.items[0].rights).toMatchObject({ edit: true, manage: true, signOff: false });
  });

  it('shows each person their boards, an administrator all', async () => {
    const names = async (who: Parameters<TestApp['as']>[0]) => {
      const { body } = await (await t.as(who)).get('/boards').expect(200);
      return boardPageSchema.parse(body).items.map((board) => board.name);
    };
    expect(await names('stranger')).toEqual([]);
    expect(await names('librarian')).toEqual([]);
    expect(await names('outsider')).toEqual(['Other board']);
    expect(await names('admin')).toEqual(['Other board', 'Tide gateway']);
  });

  it('pages in a stable order', async () => {
    for (let i = 0; i < 5; i++) await owner.post('/boards', { name: 'Same name' }).expect(201);
    const ids = new Set<string>();
    for (let offset = 0; offset < 6; offset += 2) {
      const { body } = await owner.get(`/boards?limit=2&offset=${offset}`).expect(200);
      expect(body).toMatchObject({ total: 6, limit: 2, offset });
      for (const { id } of boardPageSchema.parse(body).items) ids.add(id);
    }
    expect(ids.size).toBe(6);
    await owner.get('/boards?limit=0').expect(400);
    await owner.get('/boards?limit=2&limit=3').expect(400);
    const odd = await owner.get('/boards?limt=2').expect(400);
    expect(odd.body.errors).toEqual([{ path: 'limt', message: 'is not a known field' }]);
  });
});

describe('a board', () => {
  it('belongs to whoever made it', async () => {
    const stranger = await t.as('stranger');
    const { body } = await stranger.post('/boards', { name: '  My board ' }).expect(201);
    const board = boardDetailSchema.parse(body);
    expect(board).toMatchObject({
      name: 'My board',
      myRole: 'engineer',
      rights: { manage: true, edit: true },
      rails: { total: 0 },
      latestRevision: null,
    });
    expect(board.members.map(({ person, role }) => [person.email, role])).toEqual([
      [people.stranger.email, 'engineer'],
    ]);
    await owner.get(`/boards/${board.id}`).expect(404);
  });

  it('refuses a stale change and hands over the newer state', async () => {
    await owner.patch(`/boards/${DEMO_BOARD}`, { version: 1, name: 'First' }).expect(200);
    const { body } = await owner.patch(`/boards/${DEMO_BOARD}`, { version: 1, name: 'Second' }).expect(409);
    expect(body).toMatchObject({
      type: 'urn:millpond:problem:stale',
      current: { name: 'First', version: 2 },
      changedBy: { id: people.owner.id },
    });
    expect(boardDetailSchema.parse(body.current).name).toBe('First');
  });

  it('goes with its rails and revisions', async () => {
    await owner.delete(`/boards/${DEMO_BOARD}`).expect(400);
    await owner.delete(`/boards/${DEMO_BOARD}?version=7`).expect(409);
    await owner.delete(`/boards/${DEMO_BOARD}?version=1`).expect(204);
    await owner.get(`/boards/${DEMO_BOARD}`).expect(404);
    const counts = await t.ctx.db.rows<{ n: number }>(
      'SELECT (SELECT count(*) FROM rail) + (SELECT count(*) FROM revision) + (SELECT count(*) FROM rail_part) AS n',
    );
    expect(counts[0].n).toBe(0);
  });

  it('counts rails changed since the latest revision', async () => {
    await owner.post(`/boards/${DEMO_BOARD}/rails`, railBody('VDD_NEW')).expect(201);
    const changed = async () => (await owner.get(`/boards/${DEMO_BOARD}`)).body.changedRails;
    expect(await changed()).toBe(1);
    await owner.post(`/boards/${DEMO_BOARD}/revisions`, { note: 'With the new rail' }).expect(201);
    expect(await changed()).toBe(0);
  });

  it('does not count an edit that is undone, and counts a deleted rail', async () => {
    const address = `/boards/${DEMO_BOARD}/rails/${railId('VDD_IO')}`;
    const changed = async () => (await owner.get(`/boards/${DEMO_BOARD}`)).body.changedRails;
    const { rail } = (await owner.get(address).expect(200)).body;
    await owner.patch(address, { version: 1, bank: [] }).expect(200);
    expect(await changed()).toBe(1);
    await owner.patch(address, { version: 2, bank: rail.bank }).expect(200);
    expect(await changed()).toBe(0);
    await owner.patch(address, { version: 3, search: { max_per_part: 7 } }).expect(200);
    expect(await changed()).toBe(0);
    await owner.delete(`${address}?version=4`).expect(204);
    expect(await changed()).toBe(1);
    await owner.post(`/boards/${DEMO_BOARD}/revisions`, { note: 'Without it' }).expect(201);
    expect(await changed()).toBe(0);
  });

  it('knows what has changed also in a database that recorded saves only', async () => {
    const changed = async () => (await owner.get(`/boards/${DEMO_BOARD}`)).body.changedRails;
    await owner
      .patch(`/boards/${DEMO_BOARD}/rails/${railId('VDD_IO')}`, { version: 1, bank: [] })
      .expect(200);
    await owner.delete(`/boards/${DEMO_BOARD}/rails/${railId('VDD_AUX')}?version=1`).expect(204);
    expect(await changed()).toBe(2);
    await t.ctx.db.dataSource.undoLastMigration();
    await t.ctx.db.dataSource.runMigrations();
    expect(await changed()).toBe(2);
  });

  it('says which fields are wrong', async () => {
    const { body } = await owner.post('/boards', { name: ' ', colour: 'red' }).expect(422);
    expect(body.errors).toEqual([
      { path: 'name', message: 'must not be empty' },
      { path: 'colour', message: 'is not a known field' },
    ]);
  });
});

describe('people of a board', () => {
  const member = (id: string) => `/boards/${DEMO_BOARD}/members/${id}`;

  it('are chosen by its owner', async () => {
    const { body } = await owner.put(member(people.stranger.id), { role: 'reviewer' }).expect(200);
    expect(boardDetailSchema.parse(body).members).toContainEqual({
      person: {
        id: people.stranger.id,
        name: people.stranger.name,
        email: people.stranger.email,
        disabled: false,
      },
      role: 'reviewer',
    });
    await owner.put(member(people.stranger.id), { role: 'layout' }).expect(200);
    const stranger = await t.as('stranger');
    expect((await stranger.get(`/boards/${DEMO_BOARD}`).expect(200)).body.myRole).toBe('layout');
    await owner.delete(member(people.stranger.id)).expect(200);
    await stranger.get(`/boards/${DEMO_BOARD}`).expect(404);
    await owner.delete(member(people.stranger.id)).expect(404);
  });

  it('always include the owner as an engineer', async () => {
    await owner.put(member(people.owner.id), { role: 'reviewer' }).expect(409);
    await owner.delete(member(people.owner.id)).expect(409);
    await owner.put(member(people.owner.id), { role: 'engineer' }).expect(200);
  });

  it('cannot be someone unknown or disabled', async () => {
    await owner.put(member(DEMO_BOARD), { role: 'layout' }).expect(404);
    await t.ctx.db.write((m) => m.update(PersonEntity, { id: people.stranger.id }, { disabled: true }));
    await owner.put(member(people.stranger.id), { role: 'layout' }).expect(409);
  });

  it('have rights on this board only', async () => {
    await owner.get(`/boards/${OTHER_BOARD}`).expect(404);
    await owner.patch(`/boards/${OTHER_BOARD}`, { version: 1, name: 'Mine now' }).expect(404);
  });
});
