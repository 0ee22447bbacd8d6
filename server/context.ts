import type { KeyObject } from 'node:crypto';
import type { Logger } from 'pino';
import type { Config } from './config/environment';
import type { Database } from './db/database';
import type { Mailer } from './mail/mailer';
import type { Background } from './services/background';
import type { Passwords } from './services/passwords';

/** What services need from outside; made once at start, replaced piece by piece in tests. */
export interface Context {
  config: Config;
  /** Signs session cookies. As a key object: from text it would be made anew for every request. */
  secret: KeyObject;
  db: Database;
  mailer: Mailer;
  passwords: Passwords;
  background: Background;
  log: Logger;
  now: () => Date;
}
