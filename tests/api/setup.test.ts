import { recipeMount } from '@shared/rail/setup';
import { boardDetailSchema } from '@shared/schemas/board.schema';
import type { BoardSetup } from '@shared/schemas/board-setup.schema';
import { type Rail, railListSchema, railWithPartsSchema } from '@shared/schemas/rail.schema';
import { railDocumentSchema } from '@shared/schemas/rail-document.schema';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { demoSetup } from '../../server/db/demo/setup';
import { type Caller, openTestApp, type TestApp } from '../helpers/app';
import { DEMO_BOARD, OTHER_BOARD, partId, people } from '../helpers/people';
import { railSpec } from '../helpers/rail-body';

const BOARD = `/boards/${DEMO_BOARD}`;
const SETUP = `${BOARD}/setup`;
const RAILS = `${BOARD}/rails`;
let t: TestApp;
let engineer: Caller;
beforeEach(async () => {
  t = await openTestApp();
  engineer = await t.as('engineer');
});
afterEach(() => t.close());

const board = async () => boardDetailSchema.parse((await engineer.get(BOARD).expect(200)).body);
const layersOf = (setup: BoardSetup) => setup.stackup?.layers ?? [];
const at = (name: string) => layersOf(demoSetup).findIndex((layer) => layer.name === name);

/** A copy of the demo board's setup, changed. */
function changed(change: (setup: BoardSetup) => unknown): BoardSetup {
  const setup = structuredClone(demoSetup);
  change(setup);
  return setup;
}
const thicker = (name: string, thickness_m: number) =>
  changed((setup) => {
    layersOf(setup)[at(name)].thickness_m = thickness_m;
  });

async function refused(setup: unknown): Promise<{ path: string; message: string }[]> {
  const { setupVersion } = await board();
  const { body } = await engineer.put(SETUP, { version: setupVersion, setup }).expect(422);
  expect((await board()).setupVersion).toBe(setupVersion);
  return body.errors;
}

const [recipe] = demoSetup.recipes;

/** A rail on the planes L2 gnd and L3 core, its one line mounted by a recipe. */
async function railOnStackup(name = 'VDD_LAID'): Promise<Rail> {
  const spec = {
    ...railSpec(name),
    plane: {
      capacitance_F: 1e-12,
      resistance_ohm: 1e-3,
      inductance_H: 1e-11,
      geometry: {
        length_m: 0.05,
        width_m: 0.04,
        spacing_m: 1e-3,
        relative_permittivity: 2,
        pair: ['L2 gnd', 'L3 core'],
      },
    },
  };
  const bank = [{ partId: partId('AB-C0402-X6S-1U-10'), count: 6, recipeId: recipe.id, side: 'bottom' }];
  const { body } = await engineer.post(RAILS, { spec, bank }).expect(201);
  return railWithPartsSchema.parse(body).rail;
}

/** So that a test is about its own rail alone. */
async function deleteRails(): Promise<void> {
  const { rails } = railListSchema.parse((await engineer.get(RAILS).expect(200)).body);
  for (const { id, version } of rails) await engineer.delete(`${RAILS}/${id}?version=${version}`).expect(204);
}

const readRail = async (id: string) =>
  railWithPartsSchema.parse((await engineer.get(`${RAILS}/${id}`).expect(200)).body).rail;
const readDocument = async (id: string) =>
  railDocumentSchema.parse((await engineer.get(`${RAILS}/${id}/document`).expect(200)).body);

describe('stack-up and mount recipes', () => {
  it('are saved as one and read back as they were sent', async () => {
    const before = await board();
    expect(before.setup).toEqual(demoSetup);
    const setup = thicker('L2 gnd', 35e-6);
    const { body } = await engineer.put(SETUP, { version: before.setupVersion, setup }).expect(200);
    const saved = boardDetailSchema.parse(body);
    expect(saved).toMatchObject({ setup, setupVersion: before.setupVersion + 1, version: before.version });
    expect(await board()).toEqual(saved);
  });

  it('may be missing, as on a new board', async () => {
    const { body } = await engineer.post('/boards', { name: 'Bare' }).expect(201);
    const bare = boardDetailSchema.parse(body);
    expect(bare).toMatchObject({ setup: { stackup: null, recipes: [] }, setupVersion: 1 });
    const address = `/boards/${bare.id}/setup`;
    await engineer.put(address, { version: 1, setup: { ...demoSetup, stackup: null } }).expect(200);
    const after = boardDetailSchema.parse((await engineer.get(`/boards/${bare.id}`)).body);
    expect(after.setup).toEqual({ stackup: null, recipes: demoSetup.recipes });
  });

  const layer = (i: number, patch: object) => (s: BoardSetup) => Object.assign(layersOf(s)[i], patch);
  const mount = (i: number, patch: object) => (s: BoardSetup) => Object.assign(s.recipes[i], patch);
  const cut = (from: number, count: number) => (s: BoardSetup) => layersOf(s).splice(from, count);
  const wrong: [path: string, message: RegExp, change: (setup: BoardSetup) => unknown][] = [
    ['stackup.layers[1].thickness_m', /above zero/, layer(1, { thickness_m: 0 })],
    ['stackup.layers[2].name', /must not be empty/, layer(2, { name: ' ' })],
    ['stackup.layers[4].name', /has this name/, layer(4, { name: 'L2 gnd' })],
    ['stackup.layers[3].relative_permittivity', /at least 1/, layer(3, { relative_permittivity: 0.5 })],
    ['stackup.layers[0].kind', /outer layers are copper/, cut(0, 1)],
    ['stackup.layers[1].kind', /needs a dielectric/, cut(1, 1)],
    ['stackup.layers', /at least three/, cut(2, 13)],
    ['recipes[2].via_spacing_m', /wider than the drill/, mount(2, { via_spacing_m: 0.2e-3 })],
    ['recipes[0].trace_length_m', /not be negative/, mount(0, { trace_length_m: -1e-4 })],
    ['recipes[1].via_pairs', /whole number/, mount(1, { via_pairs: 1.5 })],
    ['recipes[1].coupling', /at most 1/, mount(1, { coupling: 1.2 })],
    ['recipes[3].name', /has this name/, mount(3, { name: demoSetup.recipes[0].name.toUpperCase() })],
  ];
  it.each(wrong)('refuse what is wrong at %s', async (path, message, change) => {
    expect(await refused(changed(change))).toContainEqual({
      path: `setup.${path}`,
      message: expect.stringMatching(message),
    });
  });

  it('refuse a stale save and hand over the newer state', async () => {
    const { setupVersion: version } = await board();
    const first = thicker('L3 core', 35e-6);
    await engineer.put(SETUP, { version, setup: first }).expect(200);
    const { body } = await engineer.put(SETUP, { version, setup: demoSetup }).expect(409);
    expect(body.type).toBe('urn:millpond:problem:stale');
    expect(body.changedBy).toEqual({ id: people.engineer.id, name: expect.any(String) });
    expect(boardDetailSchema.parse(body.current)).toMatchObject({ setup: first, setupVersion: version + 1 });
    expect((await board()).setup).toEqual(first);
  });

  it('are not there for outsiders and not to be changed by reviewers', async () => {
    const body = { version: 1, setup: demoSetup };
    await (await t.as('outsider')).put(SETUP, body).expect(404);
    await (await t.as('librarian')).put(SETUP, body).expect(404);
    const reviewer = await t.as('reviewer');
    await reviewer.put(SETUP, body).expect(403);
    await (await t.as('layout')).put(SETUP, body).expect(403);
    await t.nobody.put(SETUP, body).expect(401);
    expect(boardDetailSchema.parse((await reviewer.get(BOARD).expect(200)).body).setup).toEqual(demoSetup);
    await engineer.put(`/boards/${OTHER_BOARD}/setup`, body).expect(404);
  });
});

describe('what rails stand on', () => {
  it('cannot go: a recipe that a line uses, with the rail’s name', async () => {
    await deleteRails();
    await railOnStackup();
    const without = changed((setup) => setup.recipes.shift());
    const faults = await refused(without);
    expect(faults).toEqual([{ path: 'setup.recipes', message: expect.stringContaining('VDD_LAID') }]);
    // Neither does one that is put in its place under the same name.
    const renamed = changed((setup) => {
      setup.recipes[0] = { ...recipe, id: partId('another') };
    });
    expect(await refused(renamed)).toHaveLength(1);
    await deleteRails();
    await engineer.put(SETUP, { version: (await board()).setupVersion, setup: without }).expect(200);
  });

  it('cannot go: the planes of a pair, their names, or what lies between them alone', async () => {
    await railOnStackup('VDD_FIRST');
    const named = (name: string) => expect.stringContaining(name);
    const renamed = changed((setup) => {
      layersOf(setup)[at('L3 core')].name = 'L3 other';
    });
    const [fault] = await refused(renamed);
    expect(fault).toMatchObject({ path: 'setup.stackup', message: named('L3 core') });
    const signal = changed((setup) => {
      Object.assign(layersOf(setup)[at('L2 gnd')], { use: 'signal' });
    });
    expect((await refused(signal))[0]).toMatchObject({ path: 'setup.stackup', message: named('L2 gnd') });
    expect((await refused({ ...demoSetup, stackup: null }))[0]).toMatchObject({ path: 'setup.stackup' });
  });

  it('names the rail whose planes would go', async () => {
    await deleteRails();
    await railOnStackup('VDD_ONLY');
    const gone = changed((setup) => layersOf(setup).splice(at('L3 core'), 2));
    expect(await refused(gone)).toEqual([
      { path: 'setup.stackup', message: expect.stringMatching(/^VDD_ONLY: /) },
    ]);
  });

  it('follows the stack-up: planes, document and result, but not the version', async () => {
    const made = await railOnStackup();
    // C = ε₀·εr·A/h; the demo core is 0.1 mm of 4.1.
    expect(made.spec.plane?.capacitance_F).toBeCloseTo((8.8541878e-12 * 4.1 * 0.05 * 0.04) / 1e-4, 14);
    const document = await readDocument(made.id);
    const hashes = () =>
      t.ctx.db.rows<{ hash: string }>(`SELECT document_hash AS hash FROM rail WHERE id = '${made.id}'`);
    const [{ hash }] = await hashes();
    const setup = thicker('core 2–3', 2e-4);
    await engineer.put(SETUP, { version: (await board()).setupVersion, setup }).expect(200);
    const after = await readRail(made.id);
    expect(after.version).toBe(made.version);
    expect(after.updatedAt).toBe(made.updatedAt);
    expect(after.spec.plane?.geometry?.spacing_m).toBeCloseTo(2e-4, 12);
    expect(after.spec.plane?.capacitance_F).toBeCloseTo((made.spec.plane?.capacitance_F ?? 0) / 2, 16);
    expect(after.summary).not.toEqual(made.summary);
    const renewed = await readDocument(made.id);
    expect(renewed.rail.plane?.capacitance_F).toBe(after.spec.plane?.capacitance_F);
    expect(renewed).not.toEqual(document);
    expect((await hashes())[0].hash).not.toBe(hash);
    // Nobody's edit has become stale by it.
    await engineer.patch(`${RAILS}/${made.id}`, { version: made.version, bank: made.bank }).expect(200);
  });

  it('takes the mounting inductance from the recipe, on the line’s own side', async () => {
    const rail = await railOnStackup();
    const mountOf = async () => (await readDocument(rail.id)).bank[0];
    const expected = recipeMount(recipe, rail.spec, demoSetup, 'bottom').total_H;
    expect(await mountOf()).toMatchObject({ mount_H: expected, recipe: recipe.name });
    const setup = changed((s) => {
      s.recipes[0].trace_length_m = 1e-3;
    });
    await engineer.put(SETUP, { version: (await board()).setupVersion, setup }).expect(200);
    const longer = await mountOf();
    expect(longer.mount_H).toBe(recipeMount(setup.recipes[0], rail.spec, setup, 'bottom').total_H);
    expect(longer.mount_H).toBeGreaterThan(expected);
    expect((await readRail(rail.id)).summary.tightest).not.toEqual(rail.summary.tightest);
  });
});
