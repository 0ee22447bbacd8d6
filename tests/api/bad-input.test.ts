import { problemSchema } from '@shared/schemas/common.schema';
import fc from 'fast-check';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Caller, openTestApp, type TestApp } from '../helpers/app';
import { addressOf, type RightsRow, rightsTable } from '../helpers/rights-table';

let t: TestApp;
let owner: Caller;
beforeAll(async () => {
  t = await openTestApp();
  owner = await t.as('owner');
});
afterAll(() => t.close());

/** Rows that would end the session or the board that the sweep works with. */
const sweepable = rightsTable.filter(
  (row) => !(row.method === 'delete' && ['/session', '/sessions', '/boards/:boardId'].includes(row.path)),
);

async function expectRefusal(answer: { status: number; type: string; body: unknown }, what: string) {
  expect(answer.status, what).toBeLessThan(500);
  if (answer.status >= 400) {
    expect(answer.type, what).toBe('application/problem+json');
    expect(problemSchema.parse(answer.body).status, what).toBe(answer.status);
  }
}

const bodies = [
  'null',
  '[]',
  '{}',
  '"text"',
  '1',
  '',
  '{"__proto__":{"a":1}}',
  '[[[[]]]]',
  '{"version":1e400}',
  '\u0000',
];

/** Replaces one value somewhere inside by something of another kind. */
function* mutations(value: unknown): Generator<unknown> {
  if (typeof value !== 'object' || value === null) return;
  for (const key of Object.keys(value)) {
    const copy = (inner: unknown) =>
      Array.isArray(value)
        ? value.map((old: unknown, i) => (String(i) === key ? inner : old))
        : { ...value, [key]: inner };
    for (const odd of [null, -1, 1e308, 'x'.repeat(300), [], {}, '\u0000', '\ud800', true]) yield copy(odd);
    for (const inner of mutations((value as Record<string, unknown>)[key])) yield copy(inner);
  }
}

describe('bad input', () => {
  it('of any shape gets a problem document from every route, never a 500', async () => {
    for (const row of sweepable.filter((one) => one.method !== 'get'))
      for (const body of bodies) {
        const answer = await owner.send(row.method, addressOf(row)).send(body);
        await expectRefusal(answer, `${row.method} ${row.path} ${body}`);
      }
  });

  it('in any single field of a good body gets a problem document', async () => {
    const rows = sweepable.filter((row) => row.body !== undefined);
    for (const row of rows)
      for (const body of mutations(row.body)) {
        const answer = await owner.send(row.method, addressOf(row), body);
        await expectRefusal(answer, `${row.method} ${row.path} ${JSON.stringify(body).slice(0, 200)}`);
      }
  });

  it('in the address gets a problem document', async () => {
    const odd = ['x', '%00', '%F0%9F%92%A7', '..%2f..', "'--", '%E0%A4%A', 'a'.repeat(5000), '__proto__'];
    const withParameters = sweepable.filter((row) => row.at);
    for (const row of withParameters)
      for (const name of Object.keys(row.at ?? {}))
        for (const value of odd) {
          const address = addressOf({ ...row, at: { ...row.at, [name]: value } } satisfies RightsRow);
          await expectRefusal(await owner.send(row.method, address, row.body), address.slice(0, 100));
        }
  });

  it('in the query gets a problem document', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.constantFrom('/parts', '/people', '/boards', '/mail'),
        fc.constantFrom(
          'limit',
          'offset',
          'q',
          'sort',
          'min_F',
          'technology',
          'version',
          '__proto__',
          'q[a]',
        ),
        fc.oneof(fc.string(), fc.double().map(String), fc.constantFrom('-1', '1e99', 'NaN', '%')),
        async (path, key, value) => {
          const address = `${path}?${encodeURIComponent(key)}=${encodeURIComponent(value)}`;
          await expectRefusal(await owner.get(address), address);
        },
      ),
      { numRuns: 150, seed: 4780 },
    );
  });

  it('that is no JSON at all is told apart', async () => {
    await owner.post('/boards').send('{"name":').expect(400);
    await owner.post('/boards').set('Content-Type', 'text/plain').send('name').expect(415);
    await owner
      .post('/boards')
      .set('Content-Type', 'application/x-www-form-urlencoded')
      .send('a=b')
      .expect(415);
    await owner
      .post('/boards')
      .set('Content-Type', 'application/json; charset=koi8-r')
      .send('{}')
      .expect(415);
    await owner.post('/boards').set('Content-Encoding', 'gzip').send('not gzip').expect(400);
    const large = JSON.stringify({ name: 'x'.repeat(3 * 1024 * 1024) });
    const answer = await owner.post('/boards').send(large).expect(413);
    expect(answer.type).toBe('application/problem+json');
  });

  it('at an address that is not there, or with another method, is told so', async () => {
    await owner
      .get('/nothing')
      .expect(404)
      .expect('Content-Type', /problem\+json/);
    const answer = await owner.put('/boards', {}).expect(405);
    expect(answer.get('Allow')).toBe('GET, HEAD, POST');
    await request(t.app)
      .get('/nothing')
      .expect(404)
      .expect('Content-Type', /problem\+json/);
  });

  it('has left everything standing', async () => {
    await t.nobody.get('/health').expect(200);
    await owner.get('/boards').expect(200);
  });
});
