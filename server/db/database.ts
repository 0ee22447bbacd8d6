import { closeSync, mkdirSync, openSync } from 'node:fs';
import path from 'node:path';
import type { DataSource, EntityManager } from 'typeorm';
import { createDataSource } from './data-source';

/**
 * Reads go straight to `manager`. Every write goes through `write`, one at a time: the driver has a single
 * connection, so two transactions that run at once would end up inside each other.
 */
export class Database {
  private tail: Promise<unknown> = Promise.resolve();

  constructor(private readonly source: DataSource) {}

  static async open(file: string): Promise<Database> {
    mkdirSync(path.dirname(file), { recursive: true, mode: 0o700 });
    // Made by us, so that only the server's user may read it; SQLite gives its side files the same mode.
    closeSync(openSync(file, 'a', 0o600));
    const source = createDataSource(file);
    await source.initialize();
    return new Database(source);
  }

  get manager(): EntityManager {
    return this.source.manager;
  }

  get dataSource(): DataSource {
    return this.source;
  }

  write<T>(work: (manager: EntityManager) => Promise<T>): Promise<T> {
    const run = this.tail.then(() => this.source.transaction(work));
    this.tail = run.catch(() => undefined);
    return run;
  }

  async rows<Row>(sql: string, parameters: unknown[] = []): Promise<Row[]> {
    return this.source.query(sql, parameters);
  }

  async close(): Promise<void> {
    await this.tail;
    if (this.source.isInitialized) await this.source.destroy();
  }
}
