import 'reflect-metadata';
import { DataSource, type QueryRunner } from 'typeorm';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { Initial1767225600000 } from './1767225600000-initial';
import { PartBehaviour1770508800000 } from './1770508800000-part-behaviour';

let source: DataSource;
let runner: QueryRunner;
const migration = new PartBehaviour1770508800000();

/** A library as it was before parts could say how they behave. */
beforeEach(async () => {
  source = await new DataSource({ type: 'better-sqlite3', database: ':memory:' }).initialize();
  runner = source.createQueryRunner();
  await new Initial1767225600000().up(runner);
  await runner.query(`INSERT INTO part (id, part_number, number_key, search_text, technology, case_size, capacitance_f,
    tolerance, rated_voltage_v, esr_ohm, esl_h, mount_h, created_at, updated_at)
    VALUES ('p', 'C-1', 'c-1', 'c-1', 'ceramic', '0402', 1e-7, 'K', 16, 0.02, 3e-10, 5e-10, 'then', 'then')`);
});
afterEach(() => source.destroy());

const parts = (): Promise<Record<string, unknown>[]> => runner.query('SELECT * FROM part');

it('leaves the parts that are there as they are, with nothing known of their behaviour', async () => {
  const [before] = await parts();
  await migration.up(runner);
  expect(await parts()).toEqual([
    {
      ...before,
      bias_curve: null,
      temperature_curve: null,
      ageing_percent_per_decade: null,
      esr_table: null,
      impedance_table: null,
      esr_tolerance_percent: null,
      esl_tolerance_percent: null,
    },
  ]);
});

it('goes back, losing only what it brought', async () => {
  const before = await parts();
  await migration.up(runner);
  await runner.query("UPDATE part SET bias_curve = '[[0,1],[16,0.6]]', esr_tolerance_percent = 20");
  await migration.down(runner);
  expect(await parts()).toEqual(before);
});
