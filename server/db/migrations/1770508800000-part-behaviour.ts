import type { MigrationInterface, QueryRunner } from 'typeorm';

const columns = [
  ['bias_curve', 'text'],
  ['temperature_curve', 'text'],
  ['ageing_percent_per_decade', 'real'],
  ['esr_table', 'text'],
  ['impedance_table', 'text'],
  ['esr_tolerance_percent', 'real'],
  ['esl_tolerance_percent', 'real'],
] as const;

/** Parts say how they behave away from catalogue conditions. Nothing is known of those that are there: all stays null. */
export class PartBehaviour1770508800000 implements MigrationInterface {
  name = 'PartBehaviour1770508800000';

  async up(runner: QueryRunner): Promise<void> {
    for (const [name, type] of columns) await runner.query(`ALTER TABLE part ADD COLUMN ${name} ${type}`);
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const [name] of [...columns].reverse()) await runner.query(`ALTER TABLE part DROP COLUMN ${name}`);
  }
}
