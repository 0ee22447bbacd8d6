import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { routes } from '../../server/routes';
import { boardRights } from '../../server/services/rights';
import { type Caller, openTestApp, type TestApp } from '../helpers/app';
import {
  addressOf,
  expectedStatus,
  type RightsRow,
  type Role,
  rightsTable,
  roles,
} from '../helpers/rights-table';

const callerFor = (t: TestApp, role: Role): Promise<Caller> =>
  role === 'nobody' ? Promise.resolve(t.nobody) : t.as(role);

async function statusOf(t: TestApp, row: RightsRow, role: Role): Promise<number> {
  const caller = await callerFor(t, role);
  return (await caller.send(row.method, addressOf(row), row.body)).status;
}

/**
 * Refusals, reads and the end of the caller's own sessions change nothing for the next cell and share one
 * application; a change that goes through gets its own.
 */
const changesSomething = (row: RightsRow, role: Role): boolean =>
  row.method !== 'get' &&
  row.ok < 400 &&
  !/^\/(sessions?|password-resets)$/.test(row.path) &&
  row.may.includes(role);

let shared: TestApp;
beforeAll(async () => {
  shared = await openTestApp();
});
afterAll(() => shared.close());

describe('the rights table', () => {
  it('has a row for every route', () => {
    const inTable = new Set(rightsTable.map((row) => `${row.method} ${row.path}`));
    const registered = new Set(routes.map((route) => `${route.method} ${route.path}`));
    expect([...inTable].sort()).toEqual([...registered].sort());
  });

  for (const row of rightsTable) {
    it(`${row.method.toUpperCase()} ${row.path}${row.note ? ` (${row.note})` : ''}`, async () => {
      const found: Partial<Record<Role, number>> = {};
      for (const role of roles) {
        if (!changesSomething(row, role)) {
          found[role] = await statusOf(shared, row, role);
          continue;
        }
        const own = await openTestApp();
        found[role] = await statusOf(own, row, role);
        await own.close();
      }
      expect(found).toEqual(Object.fromEntries(roles.map((role) => [role, expectedStatus(row, role)])));
    });
  }
});

describe('rights on a board', () => {
  const standing = { ownerId: 'o', myRole: null };

  it('are none at all for whoever is not on it, administrators may look', () => {
    expect(boardRights({ id: 'x', siteRole: 'member' }, standing)).toBeNull();
    expect(boardRights({ id: 'x', siteRole: 'librarian' }, standing)).toBeNull();
    const admin = boardRights({ id: 'x', siteRole: 'admin' }, standing);
    expect(Object.values(admin ?? {})).not.toContain(true);
  });

  it('come from the board role whatever the site role', () => {
    for (const siteRole of ['member', 'librarian', 'admin'] as const) {
      const as = (myRole: 'engineer' | 'reviewer' | 'layout') =>
        boardRights({ id: 'x', siteRole }, { ownerId: 'o', myRole });
      expect(as('engineer')).toMatchObject({ edit: true, signOff: false, placement: true, manage: false });
      expect(as('reviewer')).toMatchObject({ edit: false, signOff: true, placement: false, comment: true });
      expect(as('layout')).toMatchObject({ edit: false, signOff: false, placement: true, trace: true });
    }
  });

  it('let only the owner manage', () => {
    const owner = boardRights({ id: 'o', siteRole: 'member' }, { ownerId: 'o', myRole: 'engineer' });
    expect(owner?.manage).toBe(true);
  });

  it('are decided in one module: no other file of the server looks at the actor’s role', () => {
    const folder = path.resolve(import.meta.dirname, '../../server');
    const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((f) => f.endsWith('.ts'));
    const deciding = files.filter((file) =>
      /(actor|who|rights)\??\.(siteRole|edit|manage)\b|myRole [!=]==/.test(
        readFileSync(path.join(folder, file), 'utf8'),
      ),
    );
    expect(deciding).toEqual([path.join('services', 'rights.ts')]);
  });
});
