import { createHash } from 'node:crypto';
import type { MigrationInterface, QueryRunner } from 'typeorm';

interface Cut {
  snapshot: string;
}

const LATEST = `SELECT snapshot FROM revision v
  WHERE number = (SELECT max(number) FROM revision WHERE board_id = v.board_id)`;

/** Whether a rail differs from the latest revision is told by what it says, no longer by having been saved. */
export class CompareWithLatestRevision1769904000000 implements MigrationInterface {
  name = 'CompareWithLatestRevision1769904000000';

  async up(runner: QueryRunner): Promise<void> {
    await runner.query("ALTER TABLE rail ADD COLUMN document_hash text NOT NULL DEFAULT ('')");
    await runner.query('ALTER TABLE rail ADD COLUMN cut_hash text');
    const cuts: Cut[] = await runner.query(LATEST);
    for (const { snapshot } of cuts)
      for (const { railId, document } of JSON.parse(snapshot).rails) {
        // Snapshots are canonical already: writing a part of one again gives canonical text.
        const hash = createHash('sha256').update(JSON.stringify(document)).digest('hex');
        await runner.query('UPDATE rail SET cut_hash = ? WHERE id = ?', [hash, railId]);
      }
    // The others get theirs when they are saved next; until then they count as changed, as they did.
    await runner.query('UPDATE rail SET document_hash = cut_hash WHERE changed = 0 AND cut_hash IS NOT NULL');
    await runner.query('ALTER TABLE rail DROP COLUMN changed');
  }

  async down(runner: QueryRunner): Promise<void> {
    await runner.query('ALTER TABLE rail ADD COLUMN changed boolean NOT NULL DEFAULT (1)');
    await runner.query('UPDATE rail SET changed = (document_hash IS NOT cut_hash)');
    await runner.query('ALTER TABLE rail DROP COLUMN cut_hash');
    await runner.query('ALTER TABLE rail DROP COLUMN document_hash');
  }
}
