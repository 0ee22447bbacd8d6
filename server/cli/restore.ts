import { chmodSync, copyFileSync, existsSync, mkdirSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import Database from 'better-sqlite3';
import { databaseFile } from '../db/database-file';
import { migrationNames } from '../db/migrations';
import { oneFile, readArguments, userPath } from './arguments';
import { BadInput } from './bad-input';
import { checkBackup } from './check-backup';
import { commandConfig } from './settings';

/** Puts a backup in the database's place and keeps what stood there aside. */
export async function run(args: string[]): Promise<number> {
  const { positionals } = readArguments(args, {});
  const backup = userPath(oneFile(positionals, 'restore'));
  const target = databaseFile(commandConfig().dataFolder);
  if (backup === target) throw new BadInput(`${backup}: is the database itself`);
  checkBackup(backup, migrationNames);
  mkdirSync(path.dirname(target), { recursive: true, mode: 0o700 });
  const incoming = `${target}.incoming`;
  rmSync(incoming, { force: true });
  copyFileSync(backup, incoming);
  forgetSignIns(incoming);
  const aside = setAside(target, incoming);
  renameSync(incoming, target);
  process.stdout.write(
    aside
      ? `Restored from ${backup}; what stood there before is kept as ${aside}\n`
      : `Restored from ${backup}\n`,
  );
  return 0;
}

/** A session ended, or a link used, since the backup must not come back to life. */
function forgetSignIns(file: string): void {
  const db = new Database(file);
  db.exec('DELETE FROM session; DELETE FROM access_token;');
  db.pragma('journal_mode = DELETE');
  db.close();
  chmodSync(file, 0o600);
}

function setAside(target: string, incoming: string): string | null {
  if (!existsSync(target)) return null;
  if (!canHaveAlone(target)) {
    rmSync(incoming, { force: true });
    throw new BadInput('the database is in use; stop the server first');
  }
  const stamp = new Date().toISOString().replace(/[:.]/g, '-');
  const aside = `${target}.before-restore-${stamp}`;
  renameSync(target, aside);
  for (const suffix of ['-wal', '-shm']) rmSync(target + suffix, { force: true });
  return aside;
}

/** Leaving write-ahead mode needs the file alone, and moves everything into that one file. */
function canHaveAlone(file: string): boolean {
  const db = new Database(file, { timeout: 500 });
  try {
    return db.pragma('journal_mode = DELETE', { simple: true }) === 'delete';
  } catch (error) {
    if (error instanceof Error && 'code' in error && String(error.code).startsWith('SQLITE_BUSY'))
      return false;
    // Not a database at all: nothing can be using it.
    return true;
  } finally {
    db.close();
  }
}
