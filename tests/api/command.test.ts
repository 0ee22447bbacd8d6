import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import Database from 'better-sqlite3';
import { describe, expect, it, vi } from 'vitest';
import { BadInput } from '../../server/cli/bad-input';
import { commands } from '../../server/cli/commands';
import { databaseFile } from '../../server/db/database-file';
import { DEMO_PASSWORD } from '../../server/db/demo/people';
import { people } from '../helpers/people';
import { testFolder } from '../helpers/prepared-database';
import { millpond, startServer } from '../helpers/process';

const json = { 'Content-Type': 'application/json' };
const signIn = (url: string, email: string, password: string) =>
  fetch(`${url}/api/session`, { method: 'POST', headers: json, body: JSON.stringify({ email, password }) });

/** Without a process of its own, for what only has to be refused. */
async function inProcess(name: string, args: string[], dataFolder: string): Promise<number> {
  vi.stubEnv('MILLPOND_DATA', dataFolder);
  try {
    return await (await commands[name].load()).run(args);
  } catch (error) {
    expect(error).toBeInstanceOf(BadInput);
    throw error;
  } finally {
    vi.unstubAllEnvs();
  }
}

function count(file: string, table: string): number {
  const db = new Database(file, { readonly: true });
  const row = db.prepare<[], { n: number }>(`SELECT count(*) AS n FROM ${table}`).get();
  db.close();
  return row?.n ?? -1;
}

describe('the command', () => {
  it('lists its commands and refuses others with one line', async () => {
    const help = await millpond(['help'], testFolder());
    expect(help.status).toBe(0);
    expect(help.stdout).toMatch(/backup FILE/);
    const unknown = await millpond(['drain'], testFolder());
    expect(unknown).toEqual({
      status: 2,
      stdout: '',
      stderr: 'millpond: there is no command drain; millpond help lists them\n',
    });
  });

  it('makes the first administrator, who can then sign in', async () => {
    const folder = testFolder();
    const args = ['admin', 'create', '--email', 'Boss@pond.example', '--name', 'Boss', '--password-stdin'];
    const made = await millpond(args, folder, 'a long enough password\n');
    expect(made).toMatchObject({ status: 0, stderr: '' });
    expect(made.stdout).not.toContain('password');
    expect((await millpond(args, folder, 'a long enough password\n')).status).toBe(2);
    const server = await startServer(folder, { MILLPOND_DEMO: '0' });
    expect((await signIn(server.url, 'boss@pond.example', 'a long enough password')).status).toBe(201);
    const site = await (await fetch(`${server.url}/api/site`)).json();
    expect(site).toMatchObject({ demo: false, demoPeople: [] });
    expect((await server.stop()).status).toBe(0);
  });

  it('says in one line what is wrong with its input', async () => {
    const args = ['admin', 'create', '--email', 'a@b.example', '--name', 'B', '--password-stdin'];
    const ended = await millpond(args, testFolder(), 'short');
    expect(ended).toEqual({ status: 2, stdout: '', stderr: 'millpond: password: at least 12 characters\n' });
  });

  it('makes no administrator with the demo password, which is public', async () => {
    const args = ['admin', 'create', '--email', 'a@b.example', '--name', 'B', '--password-stdin'];
    const ended = await millpond(args, testFolder(), DEMO_PASSWORD);
    expect(ended.status).toBe(2);
    expect(ended.stderr).toMatch(/^millpond: password: is the demo password/);
  });

  it.each<[string, string[], RegExp]>([
    ['admin', [], /admin create/],
    ['admin', ['create', '--email', 'no', '--name', 'B', '--password-stdin'], /^email: /],
    ['admin', ['create', '--colour', 'red'], /--colour/],
    ['backup', [], /takes one file/],
    ['backup', ['a', 'b'], /takes one file/],
    ['backup', ['/nowhere/b.db'], /no database yet/],
    ['restore', ['/nowhere/b.db'], /no such file/],
    ['seed', ['now'], /unexpected word/],
  ])('refuses %s %j', async (name, args, message) => {
    await expect(inProcess(name, args, testFolder())).rejects.toThrow(message);
  });
});

describe('backup and restore', () => {
  it('copy a running server’s database and put it back once it is stopped', async () => {
    const folder = testFolder();
    const backup = path.join(testFolder(), 'copy.db');
    const server = await startServer(folder);
    const answer = await signIn(server.url, people.owner.email, DEMO_PASSWORD);
    const cookie = answer.headers.get('set-cookie')?.split(';')[0] ?? '';
    const saved = await millpond(['backup', backup], folder);
    expect(saved).toMatchObject({ status: 0, stderr: '' });
    expect(statSync(backup).mode & 0o077).toBe(0);
    expect((await millpond(['backup', backup], folder)).status).toBe(2);
    expect(count(backup, 'rail')).toBe(6);
    await fetch(`${server.url}/api/boards`, {
      method: 'POST',
      headers: { ...json, cookie },
      body: JSON.stringify({ name: 'After the backup' }),
    });

    const refused = await millpond(['restore', backup], folder);
    expect(refused).toMatchObject({
      status: 2,
      stderr: 'millpond: the database is in use; stop the server first\n',
    });
    expect(readdirSync(folder).filter((name) => name.includes('incoming'))).toEqual([]);
    expect((await fetch(`${server.url}/api/health`)).status).toBe(200);
    expect((await server.stop()).status).toBe(0);
    expect(count(databaseFile(folder), 'board')).toBe(2);

    const restored = await millpond(['restore', backup], folder);
    expect(restored).toMatchObject({ status: 0, stderr: '' });
    expect(count(databaseFile(folder), 'board')).toBe(1);
    expect(count(databaseFile(folder), 'session')).toBe(0);
    const aside = readdirSync(folder).find((name) => name.includes('before-restore')) ?? '';
    expect(count(path.join(folder, aside), 'board')).toBe(2);
    const again = await startServer(folder);
    expect((await signIn(again.url, people.owner.email, DEMO_PASSWORD)).status).toBe(201);
    await again.stop();
  });

  it('refuse files that are not ours, damaged or newer, and leave all as it was', async () => {
    const folder = testFolder();
    expect((await millpond(['seed'], folder)).status).toBe(0);
    const before = readFileSync(databaseFile(folder));
    const other = path.join(folder, 'other.db');
    const db = new Database(other);
    db.exec('CREATE TABLE migrations (id integer, name text)');
    db.close();
    const newer = path.join(folder, 'newer.db');
    writeFileSync(newer, before);
    const later = new Database(newer);
    later.exec("INSERT INTO migrations (timestamp, name) VALUES (1, 'FromTheFuture1')");
    later.close();
    const cut = path.join(folder, 'cut.db');
    writeFileSync(cut, before.subarray(0, Math.floor(before.length / 2)));
    const text = path.join(folder, 'text.db');
    writeFileSync(text, 'hello');
    const cases: [string, RegExp][] = [
      [other, /not a Millpond database/],
      [newer, /newer Millpond \(FromTheFuture1\)/],
      [cut, /damaged|not a readable/],
      [text, /not a readable/],
      [folder, /no such file/],
    ];
    for (const [file, message] of cases) {
      await expect(inProcess('restore', [file], folder), file).rejects.toThrow(message);
    }
    expect(readFileSync(databaseFile(folder)).equals(before)).toBe(true);
  });
});

describe('the server process', () => {
  it('keeps its secret to its user, logs no secrets, and stops in order', async () => {
    const folder = testFolder();
    const server = await startServer(folder);
    expect(statSync(path.join(folder, 'secret')).mode & 0o777).toBe(0o600);
    expect(statSync(databaseFile(folder)).mode & 0o777).toBe(0o600);
    const answer = await signIn(server.url, people.owner.email, DEMO_PASSWORD);
    const cookie = answer.headers.get('set-cookie')?.split(';')[0] ?? '';
    await fetch(`${server.url}/api/boards`, { headers: { cookie, authorization: 'Bearer secret-word' } });
    await fetch(`${server.url}/api/invitations/${'s'.repeat(43)}`);
    const { status, stdout, stderr } = await server.stop('SIGINT');
    expect(status).toBe(0);
    expect(stdout).toContain(people.owner.email);
    const lines = stderr.trim().split('\n');
    for (const line of lines) expect(() => JSON.parse(line)).not.toThrow();
    expect(stderr).toContain('"/api/boards"');
    expect(stderr).toContain('/api/invitations/…');
    for (const secret of [cookie.split('=')[1], 'secret-word', DEMO_PASSWORD, 'sssss'])
      expect(stderr).not.toContain(secret);
    expect(existsSync(`${databaseFile(folder)}-wal`)).toBe(false);
  });

  it('does not start with a wrong setting, and names it', async () => {
    await expect(startServer(testFolder(), { PORT: '99999' })).rejects.toThrow(/wrong setting: PORT/);
  });
});
