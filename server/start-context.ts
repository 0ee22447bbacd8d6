import { createSecretKey } from 'node:crypto';
import type { Config } from './config/environment';
import { keptSecret } from './config/secret';
import type { Context } from './context';
import { Database } from './db/database';
import { databaseFile } from './db/database-file';
import { createLogger } from './logger';
import { Mailer } from './mail/mailer';
import { Background } from './services/background';
import { Passwords } from './services/passwords';

/** Opens what the server and the command work with; `db.close()` lets it go. */
export async function startContext(config: Config): Promise<Context> {
  const log = createLogger(config.logLevel);
  const secret = createSecretKey(config.secret ?? keptSecret(config.dataFolder), 'utf8');
  const db = await Database.open(databaseFile(config.dataFolder));
  return {
    config,
    secret,
    db,
    mailer: new Mailer(db, log, config),
    passwords: new Passwords(),
    background: new Background(log),
    log,
    now: () => new Date(),
  };
}
