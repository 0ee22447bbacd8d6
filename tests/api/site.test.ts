import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { healthSchema, siteSchema } from '@shared/schemas/person.schema';
import request from 'supertest';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { openTestApp, type TestApp } from '../helpers/app';
import { testFolder } from '../helpers/prepared-database';

let t: TestApp;
beforeEach(async () => {
  const clientFolder = testFolder();
  mkdirSync(path.join(clientFolder, 'assets'));
  writeFileSync(path.join(clientFolder, 'index.html'), '<!doctype html><title>Millpond</title>');
  writeFileSync(path.join(clientFolder, 'assets', 'app-1a2b.js'), '/* '.padEnd(4000, 'x'));
  writeFileSync(path.join(clientFolder, '.hidden'), 'no');
  t = await openTestApp({}, { clientFolder });
});
afterEach(() => t.close());

const page = (url: string) => request(t.app).get(url).set('Accept', 'text/html');

describe('the client', () => {
  it('is served with its assets kept for ever and its page asked for anew', async () => {
    const asset = await request(t.app).get('/assets/app-1a2b.js').set('Accept-Encoding', 'gzip').expect(200);
    expect(asset.get('Cache-Control')).toBe('public, max-age=31536000, immutable');
    expect(asset.get('Content-Encoding')).toBe('gzip');
    expect((await page('/').expect(200)).get('Cache-Control')).toBe('no-cache');
  });

  it('is one page for every screen', async () => {
    for (const url of ['/boards', '/boards/x/rails/y', '/invitation/abc', '/unknown']) {
      const answer = await page(url).expect(200);
      expect(answer.text).toContain('<title>Millpond</title>');
      expect(answer.get('Cache-Control')).toBe('no-cache');
    }
    await page('/assets/gone.js').expect(404);
    await page('/api/unknown')
      .expect(404)
      .expect('Content-Type', /problem\+json/);
    await request(t.app).post('/boards').set('Accept', 'text/html').expect(404);
    expect((await page('/.hidden')).text).not.toContain('no\n');
    expect((await page('/..%2f..%2fpackage.json')).text).not.toContain('dependencies');
  });

  it('may load nothing from outside', async () => {
    const answer = await page('/').expect(200);
    const policy = answer.get('Content-Security-Policy') ?? '';
    expect(policy).toContain("default-src 'self'");
    expect(policy).toContain("script-src 'self';");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(policy).not.toMatch(/https?:|\*|unsafe-eval/);
    expect(answer.get('X-Content-Type-Options')).toBe('nosniff');
    expect(answer.get('X-Powered-By')).toBeUndefined();
    expect(answer.get('Strict-Transport-Security')).toBeUndefined();
  });
});

describe('open answers', () => {
  it('tell the sign-in page about the demo', async () => {
    const site = siteSchema.parse((await t.nobody.get('/site').expect(200)).body);
    expect(site.demoPeople.map((person) => person.role)).toEqual([
      'engineer',
      'reviewer',
      'layout',
      'librarian',
      'admin',
    ]);
    for (const { email, password } of site.demoPeople)
      await t.nobody.post('/session', { email, password }).expect(201);
  });

  it('tell whether the database answers', async () => {
    const health = healthSchema.parse((await t.nobody.get('/health').expect(200)).body);
    expect(health).toMatchObject({ status: 'ok', database: 'ok' });
    await t.ctx.db.dataSource.destroy();
    expect((await t.nobody.get('/health').expect(503)).body.database).toBe('failing');
    await t.ctx.db.dataSource.initialize();
  });

  it('are never kept by a cache', async () => {
    expect((await t.nobody.get('/site')).get('Cache-Control')).toBe('no-store');
  });
});
