import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openTestApp, type TestApp } from '../helpers/app';
import { FakeMailServer } from '../helpers/mail-server';

let server: FakeMailServer;
let t: TestApp;
beforeEach(async () => {
  server = await FakeMailServer.start();
  t = await openTestApp({ smtpUrl: server.url, mailFrom: 'Millpond <pond@alderbrook.example>' });
});
afterEach(async () => {
  await t.close();
  await server.stop();
});

const invite = async () =>
  (await t.as('admin'))
    .post('/invitations', { email: 'new@alderbrook.example', name: 'Zoë "Z" Ny' })
    .expect(201);

describe('with a mail server', () => {
  it('hands the mail over and keeps no body', async () => {
    await invite();
    expect(server.received).toHaveLength(1);
    const [mail] = server.received;
    expect(mail.from).toContain('pond@alderbrook.example');
    expect(mail.to[0]).toContain('new@alderbrook.example');
    expect(mail.data).toContain('Subject: Your invitation to Millpond');
    expect(mail.data.replace(/=\n/g, '')).toContain(`${t.ctx.config.baseUrl}/invitation/`);
    const { body } = await (await t.as('admin')).get('/mail').expect(200);
    expect(body.items).toMatchObject([{ state: 'sent', text: null, html: null, error: null }]);
  });

  it('says when a mail was refused; the invitation stands and can be sent again', async () => {
    server.refuse = true;
    const { body: person } = await invite();
    const admin = await t.as('admin');
    const { body } = await admin.get('/mail').expect(200);
    expect(body.items[0]).toMatchObject({ state: 'failed', text: null });
    expect(body.items[0].error).toMatch(/no such mailbox/);
    server.refuse = false;
    await admin.post(`/people/${person.id}/invitation`).expect(200);
    expect(server.received).toHaveLength(1);
  });

  it('does not fail when the server is away', async () => {
    await server.stop();
    await invite();
    const { body } = await (await t.as('admin')).get('/mail').expect(200);
    expect(body.items[0].state).toBe('failed');
    server = await FakeMailServer.start();
  });
});
