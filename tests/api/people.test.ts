import { mailPageSchema } from '@shared/schemas/mail.schema';
import { type Person, personPageSchema, personSchema, tokenInfoSchema } from '@shared/schemas/person.schema';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { DEMO_PASSWORD } from '../../server/db/demo/people';
import { AccessTokenEntity } from '../../server/db/entities/access-token.entity';
import { type Caller, openTestApp, type TestApp } from '../helpers/app';
import { people } from '../helpers/people';

const HOUR = 3600 * 1000;
const password = 'a long new password';
let t: TestApp;
let admin: Caller;
beforeEach(async () => {
  t = await openTestApp();
  admin = await t.as('admin');
});
afterEach(() => t.close());

/** The link in the newest mail, as a reader of the outbox finds it. */
async function newestLink(kind: 'invitation' | 'reset'): Promise<string> {
  await t.ctx.background.idle();
  const { items } = mailPageSchema.parse((await admin.get('/mail').expect(200)).body);
  const found = items[0].text?.match(new RegExp(`${t.ctx.config.baseUrl}/${kind}/([\\w-]+)`));
  expect(items[0].html).toContain(found?.[0]);
  return found?.[1] ?? '';
}

const invite = async (email = 'new@alderbrook.example', name = 'New <Person>'): Promise<Person> =>
  personSchema.parse((await admin.post('/invitations', { email, name }).expect(201)).body);

const later = (ms: number) => {
  const start = Date.now();
  t.ctx.now = () => new Date(start + ms);
};

describe('an invitation', () => {
  it('brings a new person in, signed in, once', async () => {
    const person = await invite();
    expect(person).toMatchObject({ invited: true, siteRole: 'member', disabled: false });
    const token = await newestLink('invitation');
    const info = await t.nobody.get(`/invitations/${token}`).expect(200);
    expect(tokenInfoSchema.parse(info.body)).toMatchObject({ email: person.email, name: 'New <Person>' });
    const answer = await t.nobody.post(`/invitations/${token}`, { name: 'Ada New', password }).expect(201);
    const me = t.withCookie(answer.get('Set-Cookie')?.[0] ?? '');
    expect((await me.get('/session').expect(200)).body.person.name).toBe('Ada New');
    await t.nobody.post(`/invitations/${token}`, { name: 'Twice', password }).expect(404);
    await t.nobody.get(`/invitations/${token}`).expect(404);
    await t.nobody.post('/session', { email: person.email, password }).expect(201);
    await admin.post(`/people/${person.id}/invitation`).expect(409);
  });

  it('escapes names in the HTML of its mail', async () => {
    await invite();
    const { items } = mailPageSchema.parse((await admin.get('/mail')).body);
    expect(items[0].html).toContain('New &lt;Person&gt;');
    expect(items[0]).toMatchObject({ state: 'kept', to: 'new@alderbrook.example', error: null });
    expect((await admin.get(`/mail/${items[0].id}`).expect(200)).body).toEqual(items[0]);
  });

  it('can be sent again, which voids the one before', async () => {
    const person = await invite();
    const first = await newestLink('invitation');
    await admin.post(`/people/${person.id}/invitation`).expect(200);
    const second = await newestLink('invitation');
    expect(second).not.toBe(first);
    await t.nobody.get(`/invitations/${first}`).expect(404);
    await t.nobody.get(`/invitations/${second}`).expect(200);
  });

  it('lasts seven days', async () => {
    await invite();
    const token = await newestLink('invitation');
    later(7 * 24 * HOUR - 60_000);
    await t.nobody.get(`/invitations/${token}`).expect(200);
    later(7 * 24 * HOUR + 60_000);
    await t.nobody.get(`/invitations/${token}`).expect(404);
    await t.nobody.post(`/invitations/${token}`, { name: 'Late', password }).expect(404);
  });

  it('is for an address that is not here yet', async () => {
    const { body } = await admin
      .post('/invitations', { email: 'Reviewer@alderbrook.example', name: 'X' })
      .expect(422);
    expect(body.errors[0].path).toBe('email');
  });

  it('is nothing for a disabled person, and cannot be used to sign in without a password', async () => {
    const person = await invite();
    const token = await newestLink('invitation');
    await t.nobody.post('/session', { email: person.email, password: 'null' }).expect(401);
    await admin.patch(`/people/${person.id}`, { version: 1, disabled: true }).expect(200);
    await t.nobody.get(`/invitations/${token}`).expect(404);
    await admin.post(`/people/${person.id}/invitation`).expect(409);
  });

  it('does not take the demo password when demo mode is off, and stays good', async () => {
    await invite();
    const token = await newestLink('invitation');
    t.ctx.config.demo = false;
    const answer = await t.nobody
      .post(`/invitations/${token}`, { name: 'Ada New', password: DEMO_PASSWORD })
      .expect(422);
    expect(answer.body.errors[0].path).toBe('password');
    await t.nobody.post(`/invitations/${token}`, { name: 'Ada New', password }).expect(201);
  });

  it('keeps only the hash of its token', async () => {
    await invite();
    const token = await newestLink('invitation');
    const rows = await t.ctx.db.manager.find(AccessTokenEntity);
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(token);
  });
});

describe('a password reset', () => {
  const ask = (email: string) => t.nobody.post('/password-resets', { email }).expect(202);
  const mails = async () => {
    await t.ctx.background.idle();
    return (await admin.get('/mail').expect(200)).body.total;
  };

  it('answers alike whether there is such a person or not', async () => {
    const here = await ask(people.owner.email);
    const nowhere = await ask('nobody@alderbrook.example');
    expect(here.text).toBe('');
    expect(nowhere.text).toBe('');
    expect(await mails()).toBe(1);
  });

  it('sets the password, ends all sessions, sends a notice', async () => {
    const me = await t.as('owner');
    await ask(` ${people.owner.email.toUpperCase()} `);
    const token = await newestLink('reset');
    expect((await t.nobody.get(`/password-resets/${token}`).expect(200)).body.email).toBe(people.owner.email);
    await t.nobody.post(`/password-resets/${token}`, { password: 'short' }).expect(422);
    await t.nobody.post(`/password-resets/${token}`, { password }).expect(204);
    await me.get('/boards').expect(401);
    await t.nobody.post('/session', { email: people.owner.email, password: DEMO_PASSWORD }).expect(401);
    await t.nobody.post('/session', { email: people.owner.email, password }).expect(201);
    await t.nobody.post(`/password-resets/${token}`, { password }).expect(404);
    expect(await mails()).toBe(2);
    const { body: site } = await t.nobody.get('/site');
    expect(site.demoPeople.map((one: { email: string }) => one.email)).not.toContain(people.owner.email);
  });

  it('does not take the demo password when demo mode is off', async () => {
    await ask(people.stranger.email);
    const token = await newestLink('reset');
    t.ctx.config.demo = false;
    const answer = await t.nobody.post(`/password-resets/${token}`, { password: DEMO_PASSWORD }).expect(422);
    expect(answer.body.errors[0].path).toBe('password');
    await t.nobody.post(`/password-resets/${token}`, { password }).expect(204);
  });

  it('lasts one hour, and only the newest link works', async () => {
    await ask(people.owner.email);
    const first = await newestLink('reset');
    await ask(people.owner.email);
    const second = await newestLink('reset');
    await t.nobody.get(`/password-resets/${first}`).expect(404);
    await t.nobody.get(`/password-resets/${second}`).expect(200);
    await t.nobody.get(`/invitations/${second}`).expect(404);
    later(HOUR + 60_000);
    await t.nobody.get(`/password-resets/${second}`).expect(404);
  });

  it('sends nothing to the disabled and the merely invited', async () => {
    const person = await invite();
    await admin.patch(`/people/${people.layout.id}`, { version: 1, disabled: true }).expect(200);
    const before = await mails();
    await ask(person.email);
    await ask(people.layout.email);
    expect(await mails()).toBe(before);
  });
});

describe('people', () => {
  it('are listed by name and found by name or address', async () => {
    const find = async (query: string) =>
      personPageSchema.parse((await (await t.as('stranger')).get(`/people${query}`).expect(200)).body);
    const all = await find('');
    expect(all.total).toBe(10);
    const names = all.items.map((person) => person.name);
    expect(names).toEqual([...names].sort());
    expect((await find('?q=varga')).items.map((person) => person.id)).toEqual([people.owner.id]);
    expect((await find('?q=reviewer%40')).total).toBe(1);
    expect((await find('?q=%25')).total).toBe(0);
    expect(JSON.stringify(all)).not.toMatch(/hash/i);
  });

  it('change with their version', async () => {
    const address = `/people/${people.stranger.id}`;
    const { body } = await admin.patch(address, { version: 1, siteRole: 'librarian' }).expect(200);
    expect(body).toMatchObject({ siteRole: 'librarian', version: 2 });
    const conflict = await admin.patch(address, { version: 1, name: 'Old' }).expect(409);
    expect(conflict.body).toMatchObject({ current: { version: 2 }, changedBy: { id: people.admin.id } });
    await admin.patch(`/people/${people.stranger.id.replace(/./, '0')}`, { version: 1 }).expect(404);
  });

  it('have a new role at once', async () => {
    const stranger = await t.as('stranger');
    await stranger.get('/mail').expect(403);
    await admin.patch(`/people/${people.stranger.id}`, { version: 1, siteRole: 'admin' }).expect(200);
    await stranger.get('/mail').expect(200);
  });

  it('always have an administrator among them who can sign in', async () => {
    await admin.patch(`/people/${people.adminOn.id}`, { version: 1, siteRole: 'member' }).expect(200);
    for (const change of [{ disabled: true }, { siteRole: 'member' }]) {
      const { body } = await admin.patch(`/people/${people.admin.id}`, { version: 1, ...change }).expect(409);
      expect(body.detail).toMatch(/last administrator/);
    }
    await invite('second-admin@alderbrook.example');
    await admin.patch(`/people/${people.admin.id}`, { version: 1, disabled: true }).expect(409);
    await admin.patch(`/people/${people.admin.id}`, { version: 1, name: 'Renamed' }).expect(200);
  });
});
