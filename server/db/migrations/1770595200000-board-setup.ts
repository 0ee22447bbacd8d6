import type { MigrationInterface, QueryRunner } from 'typeorm';

/** A board keeps its stack-up and mount recipes. */
export class BoardSetup1770595200000 implements MigrationInterface {
  name = 'BoardSetup1770595200000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE board ADD COLUMN setup text');
    await runner.query('ALTER TABLE board ADD COLUMN setup_version integer NOT NULL DEFAULT (1)');
    await runner.query('ALTER TABLE board ADD COLUMN setup_updated_at text');
    await runner.query(
      'ALTER TABLE board ADD COLUMN setup_updated_by text REFERENCES person (id) ON DELETE SET NULL',
    );
    await runner.query('CREATE INDEX board_by_setup_editor ON board (setup_updated_by)');
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('DROP INDEX board_by_setup_editor');
    await runner.query('ALTER TABLE board DROP COLUMN setup_updated_by');
    await runner.query('ALTER TABLE board DROP COLUMN setup_updated_at');
    await runner.query('ALTER TABLE board DROP COLUMN setup_version');
    await runner.query('ALTER TABLE board DROP COLUMN setup');
  }
}
