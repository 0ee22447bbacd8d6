import { existsSync, statSync } from 'node:fs';
import Database from 'better-sqlite3';
import { APPLICATION_ID } from '../db/application-id';
import { BadInput } from './bad-input';

/** Opens a file read-only and refuses what is not a whole Millpond database of a version we know. */
export function checkBackup(file: string, knownMigrations: readonly string[]): void {
  if (!existsSync(file) || !statSync(file).isFile()) throw new BadInput(`${file}: there is no such file`);
  const db = new Database(file, { readonly: true });
  try {
    if (db.pragma('application_id', { simple: true }) !== APPLICATION_ID)
      throw new BadInput(`${file}: is not a Millpond database`);
    const names = db.prepare<[], { name: string }>('SELECT name FROM migrations ORDER BY id').all();
    const unknown = names.find(({ name }) => !knownMigrations.includes(name));
    if (names.length === 0) throw new BadInput(`${file}: is not a Millpond database`);
    if (unknown) throw new BadInput(`${file}: was made by a newer Millpond (${unknown.name})`);
    if (db.pragma('integrity_check', { simple: true }) !== 'ok') throw new BadInput(`${file}: is damaged`);
    if ((db.pragma('foreign_key_check') as unknown[]).length > 0)
      throw new BadInput(`${file}: is damaged: rows point to rows that are not there`);
  } catch (error) {
    if (error instanceof BadInput) throw error;
    throw new BadInput(
      `${file}: is not a readable database (${error instanceof Error ? error.message : String(error)})`,
    );
  } finally {
    db.close();
  }
}
