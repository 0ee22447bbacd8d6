import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { testFolder } from '../helpers/prepared-database';
import { millpond } from '../helpers/process';

const document = {
  format: 'millpond-rail',
  version: 1,
  rail: {
    name: 'VDD',
    voltage_V: 1,
    target: { kind: 'flat', impedance_ohm: 0.05 },
    band_Hz: [1e4, 1e7],
    source: { kind: 'rl', resistance_ohm: 0.002, inductance_H: 2e-8 },
  },
  parts: [
    {
      id: 'BULK',
      capacitance_F: 1e-4,
      esr_ohm: 0.01,
      esl_H: 1.5e-9,
      mount_H: 8e-10,
      unit_cost: 0.4,
      area_mm2: 20,
    },
    {
      id: 'SMALL',
      capacitance_F: 1e-6,
      esr_ohm: 0.015,
      esl_H: 3e-10,
      mount_H: 5e-10,
      unit_cost: 0.02,
      area_mm2: 1,
    },
  ],
  bank: [{ part: 'BULK', count: 1 }],
  search: { minimise: 'parts', candidates: ['BULK', 'SMALL'] },
  frequencies_Hz: [1e4, 1e6],
};

/** Runs a document command on a file with this content. */
async function run(command: string, content: unknown, ...more: string[]) {
  const folder = testFolder();
  const file = path.join(folder, 'rail.json');
  writeFileSync(file, typeof content === 'string' ? content : JSON.stringify(content));
  return millpond([command, file, ...more], folder);
}

const change = (rail: object, rest: object = {}) => ({
  ...document,
  ...rest,
  rail: { ...document.rail, ...rail },
});

describe('analyse', () => {
  it('prints one object at the frequencies asked for; status tells whether the rail holds', async () => {
    const { status, stdout, stderr } = await run('analyse', document);
    const answer = JSON.parse(stdout);
    expect(Object.keys(answer)).toEqual(['frequency_Hz', 're_ohm', 'im_ohm', 'peaks', 'tightest', 'holds']);
    expect(answer.frequency_Hz).toEqual([1e4, 1e6]);
    expect(answer.re_ohm).toHaveLength(2);
    expect(answer.tightest).toMatchObject({ target_ohm: 0.05, headroom_dB: expect.any(Number) });
    expect([status, stderr]).toEqual([answer.holds ? 0 : 1, '']);
    const short = await run('analyse', change({ target: { kind: 'flat', impedance_ohm: 1e-4 } }));
    expect([short.status, JSON.parse(short.stdout).holds]).toEqual([1, false]);
  });

  it.each([
    ['an unknown key', { ...document, colour: 'blue' }, 'colour: unknown key'],
    ['an unknown key inside', change({ colour: 'blue' }), 'rail.colour: unknown key'],
    ['a wrong number', change({ voltage_V: -1 }), 'rail.voltage_V'],
    ['a part that is not there', { ...document, bank: [{ part: 'X', count: 1 }] }, 'bank[0].part'],
    ['no JSON', '{', 'not JSON'],
  ])('refuses %s with one line that names file and field, and prints nothing', async (_, content, said) => {
    const { status, stdout, stderr } = await run('analyse', content);
    expect([status, stdout]).toEqual([2, '']);
    expect(stderr.trimEnd().split('\n')).toHaveLength(1);
    expect(stderr).toContain('rail.json');
    expect(stderr).toContain(said);
  });
});

describe('search', () => {
  it('prints the mix with its proof, and names locked lines beside it', async () => {
    const free = JSON.parse((await run('search', document)).stdout);
    expect(free).toMatchObject({ proven: true, holds: true, lower_bound: free.weight });
    expect(free).not.toHaveProperty('locked');
    const bank = [{ part: 'BULK', count: 1, locked: true }];
    const locked = JSON.parse((await run('search', { ...document, bank }, '--seconds', '20')).stdout);
    expect(locked.locked).toEqual([{ part: 'BULK', count: 1 }]);
    const whole = [...locked.locked, ...locked.mix];
    expect((await run('analyse', { ...document, bank: whole })).status).toBe(0);
  });

  it('says why there is none, and refuses a wrong limit', async () => {
    const none = await run('search', change({ target: { kind: 'flat', impedance_ohm: 1e-9 } }));
    expect(none.status).toBe(0);
    expect(JSON.parse(none.stdout)).toMatchObject({
      mix: null,
      reason: expect.any(String),
      frequency_Hz: expect.any(Number),
    });
    expect((await run('search', document, '--seconds', '0')).status).toBe(2);
  });
});

describe('schema', () => {
  it('prints the document as JSON Schema', async () => {
    const { status, stdout } = await millpond(['schema'], testFolder());
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({
      type: 'object',
      required: expect.arrayContaining(['format', 'rail', 'parts']),
    });
  });
});
