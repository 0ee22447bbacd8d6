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

describe('analyse --conditions', () => {
  const aged = change(
    {
      voltage_V: 3.3,
      conditions: { coldest_C: -20, usual_C: 50, hottest_C: 85, age_h: 87_660, vary: ['capacitance', 'esr'] },
    },
    {
      parts: [
        document.parts[0],
        {
          ...document.parts[1],
          technology: 'ceramic',
          dielectric: 'X5R',
          case: '0402',
          tolerance: 'K',
          rated_voltage_V: 6.3,
          temperature_curve: [
            [-55, 0.9],
            [25, 1],
            [85, 0.9],
          ],
          bias_curve: [
            [0, 1],
            [3.3, 0.6],
            [6.3, 0.3],
          ],
          ageing_percent_per_decade: 2.5,
        },
      ],
      bank: [
        { part: 'BULK', count: 2 },
        { part: 'SMALL', count: 4 },
      ],
    },
  );

  it('prints what each part is in service, every corner and each part missing; holds only if all corners do', async () => {
    const { status, stdout } = await run('analyse', aged, '--conditions');
    const answer = JSON.parse(stdout);
    const small = answer.parts.find((part: { part: string }) => part.part === 'SMALL');
    const factors = small.factors.map((one: { factor: number }) => one.factor);
    expect(small.service_F / (1e-6 * factors.reduce((a: number, b: number) => a * b, 1))).toBeCloseTo(1, 12);
    expect(factors[0]).toBeCloseTo(0.6, 12);
    expect(factors[2]).toBeCloseTo(1 - 0.025 * Math.log10(87.66), 12);
    expect(small.estimated).toBe(false);
    expect(answer.parts.find((part: { part: string }) => part.part === 'BULK').service_F).toBe(1e-4);
    expect(answer.corners).toHaveLength(16);
    expect(answer.missing).toHaveLength(2);
    expect(answer.assumed).toBe(false);
    expect(answer.tightest).toEqual(answer.service.tightest);
    expect(answer.holds).toBe(
      answer.service.holds && answer.corners.every((one: { holds: boolean }) => one.holds),
    );
    expect(status).toBe(answer.holds ? 0 : 1);
    const plain = JSON.parse((await run('analyse', aged)).stdout);
    expect(answer.catalogue.tightest).toEqual(plain.tightest);
    expect(Object.keys(plain)).toEqual(['frequency_Hz', 're_ohm', 'im_ohm', 'peaks', 'tightest', 'holds']);
  });

  it('names the field that stops it: bias over the rating, a curve that does not rise, a tolerance that cannot be', async () => {
    const over = await run('analyse', { ...aged, rail: { ...aged.rail, voltage_V: 7 } }, '--conditions');
    expect(over).toMatchObject({ status: 2, stdout: '' });
    expect(over.stderr).toContain('rail.json: parts[1].rated_voltage_V: SMALL: ');
    const curve = structuredClone(aged) as typeof document;
    Object.assign(curve.parts[1], {
      bias_curve: [
        [0, 1],
        [3, 0.5],
        [3, 0.4],
      ],
    });
    const crossed = await run('analyse', curve, '--conditions');
    expect(crossed.status).toBe(2);
    expect(crossed.stderr).toContain('parts[1].bias_curve[2][0]: voltage must rise');
    const letter = structuredClone(aged) as typeof document;
    Object.assign(letter.parts[1], { tolerance: 'D' });
    expect((await run('analyse', letter, '--conditions')).stderr).toContain('parts[1].tolerance');
    const flat = await run('analyse', {
      ...aged,
      rail: {
        ...aged.rail,
        plane: {
          capacitance_F: 1e-9,
          resistance_ohm: 0,
          inductance_H: 0,
          geometry: { length_m: 0.05, width_m: 0.05, spacing_m: 0, relative_permittivity: 4 },
        },
      },
    });
    expect(flat.stderr).toContain('rail.plane.geometry.spacing_m: spacing must be above zero');
  });
});

describe('step', () => {
  // Published network A: 2 mΩ + 10 nH against 2 mΩ + 100 µF, 1 A: 9.2589 mV at 1.3977 µs (published-checks step-A-x0, -t0);
  // a rise of a nanosecond moves the time by half of it.
  const networkA = {
    ...change({
      source: { kind: 'rl', resistance_ohm: 0.002, inductance_H: 1e-8 },
      load_step: { before_A: 0.5, step_A: 1, rise_s: 1e-9, hold_s: 1e-4, fall_s: 1e-9 },
    }),
    parts: [{ id: 'C', capacitance_F: 1e-4, esr_ohm: 0.002, esl_H: 0, mount_H: 0 }],
    bank: [{ part: 'C', count: 1 }],
    search: undefined,
  };

  it('prints droop, its time and overshoot about the settled voltage before the step', async () => {
    const { status, stdout } = await run('step', networkA);
    expect(status).toBe(0);
    const answer = JSON.parse(stdout);
    expect(Object.keys(answer)).toEqual(['droop_V', 'droop_time_s', 'overshoot_V', 'time_s', 'voltage_V']);
    expect(answer.droop_V / 9.2588953e-3).toBeCloseTo(1, 4);
    expect(answer.droop_time_s / 1.3981772e-6).toBeCloseTo(1, 4);
    // Back down it swings as far up, less what a step up leaves standing: 9.2589 mV − 2 mV
    expect(answer.overshoot_V / 7.2588953e-3).toBeCloseTo(1, 4);
    expect(answer.time_s.length).toBe(answer.voltage_V.length);
    expect(answer.voltage_V[0]).toBeCloseTo(1 - 0.5 * 0.002, 12);
    expect(answer.voltage_V.at(-1)).toBeCloseTo(1 - 0.5 * 0.002, 5);
  });

  it('says what it lacks: a load step, a source that holds the voltage', async () => {
    const none = await run('step', document);
    expect(none).toMatchObject({ status: 2, stdout: '' });
    expect(none.stderr).toContain(
      'rail.json: rail.load_step: the document says no load step, nor does its target',
    );
    const open = await run('step', { ...networkA, rail: { ...networkA.rail, source: { kind: 'open' } } });
    expect(open.stderr).toMatch(/rail\.json: source: .*never settles/);
  });
});
