import { currentSessionSchema, sessionSchema } from '@shared/schemas/person.schema';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { DEMO_PASSWORD } from '../../server/db/demo/people';
import { PersonEntity } from '../../server/db/entities/person.entity';
import { SessionEntity } from '../../server/db/entities/session.entity';
import { openTestApp, type TestApp } from '../helpers/app';
import { people } from '../helpers/people';

let t: TestApp;
beforeEach(async () => {
  t = await openTestApp();
});
afterEach(() => t.close());

const signIn = (email = people.owner.email, password = DEMO_PASSWORD) =>
  t.nobody.post('/session', { email, password });

describe('signing in', () => {
  it('sets a cookie that scripts cannot read and other sites do not send', async () => {
    const answer = await signIn().expect(201);
    const session = sessionSchema.parse(answer.body);
    expect(session.person).toMatchObject({ email: people.owner.email, siteRole: 'member' });
    const [cookie] = answer.get('Set-Cookie') ?? [];
    expect(cookie).toMatch(/HttpOnly/);
    expect(cookie).toMatch(/SameSite=Strict/);
    expect(cookie).not.toMatch(/Secure/);
    const mine = await t.withCookie(cookie).get('/session').expect(200);
    expect(mine.body).toEqual(answer.body);
  });

  it('takes the address in any case and never answers with a password', async () => {
    const answer = await signIn('  Engineer@AlderBrook.example ').expect(201);
    expect(JSON.stringify(answer.body)).not.toMatch(/hash|password/i);
  });

  it('answers alike for an unknown person, a wrong password and a disabled person', async () => {
    await t.ctx.db.write((m) => m.update(PersonEntity, { id: people.layout.id }, { disabled: true }));
    const answers = [
      await signIn('nobody@alderbrook.example').expect(401),
      await signIn(people.owner.email, 'not the password').expect(401),
      await signIn(people.layout.email).expect(401),
      await signIn(people.owner.email, `${DEMO_PASSWORD}${'x'.repeat(80)}`).expect(401),
    ];
    for (const answer of answers) {
      expect(answer.body).toEqual(answers[0].body);
      expect(answer.get('Set-Cookie')).toBeUndefined();
    }
  });

  it('does the same hashing work for an unknown person', async () => {
    const asked: (string | null)[] = [];
    const real = t.ctx.passwords.matches.bind(t.ctx.passwords);
    t.ctx.passwords.matches = (password, hash) => {
      asked.push(hash);
      return real(password, hash);
    };
    await signIn('nobody@alderbrook.example').expect(401);
    await signIn(people.owner.email, 'not the password').expect(401);
    expect(asked).toHaveLength(2);
    expect(asked[0]).toBeNull();
  });

  it('closes demo accounts when demo mode is off', async () => {
    const demo = await t.as('owner');
    const real = await t.as('stranger');
    t.ctx.config.demo = false;
    await signIn().expect(401);
    await demo.get('/boards').expect(401);
    await real.get('/boards').expect(200);
    expect((await t.nobody.get('/site').expect(200)).body).toMatchObject({ demo: false, demoPeople: [] });
  });

  it('sends the cookie over https only when the base address is https', async () => {
    t.ctx.config.secureCookie = true;
    const [cookie] = (await signIn().expect(201)).get('Set-Cookie') ?? [];
    expect(cookie).toMatch(/Secure/);
  });
});

describe('a session', () => {
  it('that is not there is an answer of its own, not an error', async () => {
    const answer = await t.nobody.get('/session').expect(200);
    expect(currentSessionSchema.parse(answer.body)).toBeNull();
  });

  it('ends with signing out, for the old cookie too', async () => {
    const me = await t.as('owner');
    const answer = await me.delete('/session').expect(204);
    expect(answer.get('Set-Cookie')?.[0]).toMatch(/millpond_session=;/);
    expect((await me.get('/session').expect(200)).body).toBeNull();
    await me.get('/boards').expect(401);
    await t.nobody.delete('/session').expect(204);
  });

  it('ends everywhere at once', async () => {
    const [here, there, other] = [await t.as('owner'), await t.as('owner'), await t.as('reviewer')];
    await here.delete('/sessions').expect(204);
    await here.get('/boards').expect(401);
    await there.get('/boards').expect(401);
    await other.get('/boards').expect(200);
  });

  it('ends when its time is over, and is swept away', async () => {
    const me = await t.as('owner');
    const start = Date.now();
    t.ctx.now = () => new Date(start + 8 * 24 * 3600 * 1000);
    await me.get('/boards').expect(401);
    await t.as('reviewer');
    expect(await t.ctx.db.manager.countBy(SessionEntity, { personId: people.owner.id })).toBe(0);
  });

  it('is refused when its token is not ours', async () => {
    const me = await t.as('owner');
    const forged = [
      'millpond_session=abc',
      'millpond_session=eyJhbGciOiJub25lIn0.eyJqdGkiOiJ4In0.',
      `${me.cookie?.slice(0, -3)}xyz`,
      'millpond_session[jti]=1',
      'millpond_session=j:{"a":1}',
    ];
    for (const cookie of forged) await t.withCookie(cookie).get('/boards').expect(401);
  });

  it('ends at once for a disabled person, who cannot come back', async () => {
    const me = await t.as('layout');
    const admin = await t.as('admin');
    await admin.patch(`/people/${people.layout.id}`, { version: 1, disabled: true }).expect(200);
    await me.get('/boards').expect(401);
    await signIn(people.layout.email).expect(401);
  });
});

describe('changing the password', () => {
  const next = 'another long password';

  it('keeps this session, ends the others, sends a mail', async () => {
    const [here, there] = [await t.as('owner'), await t.as('owner')];
    await here.put('/session/password', { currentPassword: DEMO_PASSWORD, password: next }).expect(200);
    await here.get('/session').expect(200);
    await there.get('/boards').expect(401);
    await signIn().expect(401);
    await signIn(people.owner.email, next).expect(201);
    await t.ctx.background.idle();
    const mail = await (await t.as('admin')).get('/mail').expect(200);
    expect(mail.body.items[0]).toMatchObject({
      to: people.owner.email,
      subject: 'Your Millpond password was changed',
    });
  });

  it('names the field that is wrong', async () => {
    const me = await t.as('owner');
    const wrong = await me.put('/session/password', { currentPassword: 'no', password: next }).expect(422);
    expect(wrong.body.errors).toEqual([{ path: 'currentPassword', message: 'is not your password' }]);
    const short = await me
      .put('/session/password', { currentPassword: DEMO_PASSWORD, password: 'short' })
      .expect(422);
    expect(short.body.errors[0].path).toBe('password');
    const long = { currentPassword: DEMO_PASSWORD, password: 'ü'.repeat(37) };
    expect((await me.put('/session/password', long).expect(422)).body.errors[0].path).toBe('password');
  });
});

describe('the demo password', () => {
  it('may be kept while demo mode is on', async () => {
    const me = await t.as('stranger');
    const body = { currentPassword: DEMO_PASSWORD, password: DEMO_PASSWORD };
    await me.put('/session/password', body).expect(200);
    await signIn(people.stranger.email).expect(201);
  });

  it('is refused at its field when demo mode is off', async () => {
    const me = await t.as('stranger');
    t.ctx.config.demo = false;
    const body = { currentPassword: DEMO_PASSWORD, password: DEMO_PASSWORD };
    const answer = await me.put('/session/password', body).expect(422);
    expect(answer.body.errors).toEqual([
      { path: 'password', message: expect.stringContaining('demo password') },
    ]);
  });

  it('lets nobody in when demo mode is off, whoever’s it is', async () => {
    await signIn(people.stranger.email).expect(201);
    t.ctx.config.demo = false;
    await signIn(people.stranger.email).expect(401);
  });
});

describe('limits on attempts', () => {
  it('stops guessing one person’s password, not the others’ sign-in', async () => {
    await t.close();
    t = await openTestApp({ rateLimit: 3 });
    for (let i = 0; i < 3; i++) await signIn(people.owner.email, 'a wrong password').expect(401);
    const stopped = await signIn().expect(429);
    expect(stopped.type).toBe('application/problem+json');
    await signIn(people.reviewer.email).expect(201);
  });

  it('does not count successful sign-ins', async () => {
    await t.close();
    t = await openTestApp({ rateLimit: 2 });
    for (let i = 0; i < 6; i++) await signIn().expect(201);
  });

  it('counts by the caller’s own address behind a trusted proxy only', async () => {
    const attempt = (address: string) =>
      signIn(people.owner.email, 'a wrong password').set('X-Forwarded-For', address);
    await t.close();
    t = await openTestApp({ rateLimit: 1 });
    await attempt('203.0.113.1').expect(401);
    await attempt('203.0.113.2').expect(429);
    await t.close();
    t = await openTestApp({ rateLimit: 1, trustProxy: 1 });
    await attempt('203.0.113.1').expect(401);
    await attempt('203.0.113.1').expect(429);
    await attempt('203.0.113.2').expect(401);
  });

  it('limits requests for a reset and the use of links', async () => {
    await t.close();
    t = await openTestApp({ rateLimit: 2 });
    const reset = () => t.nobody.post('/password-resets', { email: people.owner.email });
    await reset().expect(202);
    await reset().expect(429);
    const link = () => t.nobody.get(`/invitations/${'x'.repeat(43)}`);
    for (let i = 0; i < 10; i++) await link().expect(404);
    await link().expect(429);
  });
});

describe('requests from other sites', () => {
  it('are refused by what the browser says of them', async () => {
    const me = await t.as('owner');
    const post = () => me.post('/boards', { name: 'X' });
    await post().set('Sec-Fetch-Site', 'cross-site').expect(403);
    await post().set('Sec-Fetch-Site', 'same-site').expect(403);
    await post().set('Origin', 'https://elsewhere.example').expect(403);
    await post().set('Origin', 'null').expect(403);
    await post().set('Sec-Fetch-Site', 'same-origin').expect(201);
    await post().set('Origin', t.ctx.config.baseUrl).expect(201);
    await me.get('/boards').set('Sec-Fetch-Site', 'cross-site').expect(200);
  });
});
