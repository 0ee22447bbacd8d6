import type { Logger } from 'pino';
import type { Config } from './config/environment';
import type { Database } from './db/database';
import type { Mailer } from './mail/mailer';
import type { Background } from './services/background';
import type { Passwords } from './services/passwords';

/** What services need from outside; made once at start, replaced piece by piece in tests. */
export interface Context {
  config: Config;
  secret: string;
  db: Database;
  mailer: Mailer;
  passwords: Passwords;
  background: Background;
  log: Logger;
  now: () => Date;
}
