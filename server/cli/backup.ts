import { chmodSync, existsSync, renameSync, rmSync, statSync } from 'node:fs';
import path from 'node:path';
import Database from 'better-sqlite3';
import { databaseFile } from '../db/database-file';
import { oneFile, readArguments, userPath } from './arguments';
import { BadInput } from './bad-input';
import { commandConfig } from './settings';

/** A consistent copy while the server runs; the file appears under its name only when it is whole. */
export async function run(args: string[]): Promise<number> {
  const { values, positionals } = readArguments(args, { force: { type: 'boolean', default: false } });
  const target = userPath(oneFile(positionals, 'backup'));
  const source = databaseFile(commandConfig().dataFolder);
  if (!existsSync(source)) throw new BadInput(`there is no database yet in ${path.dirname(source)}`);
  if (!existsSync(path.dirname(target))) throw new BadInput(`${target}: its folder does not exist`);
  if (existsSync(target) && !statSync(target).isFile()) throw new BadInput(`${target}: is not a file`);
  if (existsSync(target) && !values.force)
    throw new BadInput(`${target}: exists already; --force writes over it`);
  await copyOnline(source, target);
  process.stdout.write(`Backup written: ${target} (${statSync(target).size} bytes)\n`);
  return 0;
}

async function copyOnline(source: string, target: string): Promise<void> {
  const unfinished = `${target}.unfinished`;
  rmSync(unfinished, { force: true });
  const db = new Database(source, { readonly: true, timeout: 5000 });
  try {
    await db.backup(unfinished);
    const copy = new Database(unfinished);
    // One plain file: no write-ahead log that has to travel with it.
    copy.pragma('journal_mode = DELETE');
    copy.close();
    chmodSync(unfinished, 0o600);
    renameSync(unfinished, target);
  } finally {
    db.close();
    rmSync(unfinished, { force: true });
  }
}
