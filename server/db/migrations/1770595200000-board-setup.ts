import type { MigrationInterface, QueryRunner } from 'typeorm';

/** A board keeps its stack-up and mount recipes. */
export class BoardSetup1770595200000 implements MigrationInterface {
  name = 'BoardSetup1770595200000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE board ADD COLUMN setup text');
    await runner.query('ALTER TABLE board ADD COLUMN setup_version integer NOT NULL DEFAULT (1)');
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE board DROP COLUMN setup_version');
    await runner.query('ALTER TABLE board DROP COLUMN setup');
  }
}
