import { copyFileSync } from 'node:fs';
import path from 'node:path';
import type { Express } from 'express';
import request, { type Test } from 'supertest';
import { type AppOptions, createApp } from '../../server/app';
import type { Config } from '../../server/config/environment';
import type { Context } from '../../server/context';
import { PersonEntity } from '../../server/db/entities/person.entity';
import { SESSION_COOKIE } from '../../server/middleware/session';
import { startSession } from '../../server/services/session.service';
import { testContext } from './context';
import { type PersonKey, people } from './people';
import { preparedDatabase, testFolder } from './prepared-database';

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** Requests of one person, or of nobody. Changes say that they are JSON, as the client does. */
export class Caller {
  constructor(
    private readonly app: Express,
    readonly cookie: string | null,
  ) {}

  send(method: Method, url: string, body?: unknown): Test {
    const test = request(this.app)[method](`/api${url}`);
    if (this.cookie) test.set('Cookie', this.cookie);
    if (method === 'get') return test;
    test.set('Content-Type', 'application/json');
    return body === undefined ? test : test.send(JSON.stringify(body));
  }

  get = (url: string) => this.send('get', url);
  post = (url: string, body?: unknown) => this.send('post', url, body);
  put = (url: string, body?: unknown) => this.send('put', url, body);
  patch = (url: string, body?: unknown) => this.send('patch', url, body);
  delete = (url: string) => this.send('delete', url);
}

export class TestApp {
  readonly nobody: Caller;

  constructor(
    readonly ctx: Context,
    readonly app: Express,
    readonly folder: string,
  ) {
    this.nobody = new Caller(app, null);
  }

  /** Signed in without the password's cost. */
  async as(who: PersonKey): Promise<Caller> {
    return this.asPerson(people[who].id);
  }

  async asPerson(id: string): Promise<Caller> {
    const { token } = await this.ctx.db.write(async (manager) =>
      startSession(this.ctx, manager, await manager.findOneByOrFail(PersonEntity, { id })),
    );
    return new Caller(this.app, `${SESSION_COOKIE}=${token}`);
  }

  withCookie(cookie: string): Caller {
    return new Caller(this.app, cookie.split(';')[0]);
  }

  async close(): Promise<void> {
    await this.ctx.background.idle();
    await this.ctx.db.close();
  }
}

/** The real application on its own copy of the prepared database. */
export async function openTestApp(change: Partial<Config> = {}, options: AppOptions = {}): Promise<TestApp> {
  const folder = testFolder();
  const file = path.join(folder, 'millpond.db');
  copyFileSync(await preparedDatabase(), file);
  const ctx = await testContext(file, { dataFolder: folder, ...change });
  return new TestApp(ctx, createApp(ctx, options), folder);
}
