import 'reflect-metadata';
import type BetterSqlite3 from 'better-sqlite3';
import { DataSource } from 'typeorm';
import { entities } from './entities';
import { migrations } from './migrations';

/** A data source on one SQLite file; `initialize()` opens it and runs the migrations that are missing. */
export function createDataSource(file: string): DataSource {
  return new DataSource({
    type: 'better-sqlite3',
    database: file,
    entities,
    migrations,
    migrationsRun: true,
    migrationsTransactionMode: 'all',
    synchronize: false,
    logging: false,
    timeout: 5000,
    prepareDatabase: (db: BetterSqlite3.Database) => {
      db.pragma('journal_mode = WAL');
      db.pragma('synchronous = NORMAL');
      db.pragma('foreign_keys = ON');
      db.pragma('busy_timeout = 5000');
      db.pragma('trusted_schema = OFF');
    },
  });
}
