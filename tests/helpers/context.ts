import { createSecretKey } from 'node:crypto';
import { pino } from 'pino';
import { type Config, readConfig } from '../../server/config/environment';
import type { Context } from '../../server/context';
import { Database } from '../../server/db/database';
import { Mailer } from '../../server/mail/mailer';
import { Background } from '../../server/services/background';
import { Passwords } from '../../server/services/passwords';

/** The lowest that bcrypt takes: the suite is about what is stored, not about how long it takes. */
const TEST_COST = 4;

/** A real context on `file`; no limits on attempts unless a test asks for them. */
export async function testContext(file: string, change: Partial<Config> = {}): Promise<Context> {
  const config = { ...readConfig({ MILLPOND_RATE_LIMIT: '0' }), ...change };
  const log = pino({ level: 'silent' });
  const db = await Database.open(file);
  return {
    config,
    secret: createSecretKey('a secret for tests only, long enough', 'utf8'),
    db,
    mailer: new Mailer(db, log, config),
    passwords: new Passwords(TEST_COST),
    background: new Background(log),
    log,
    now: () => new Date(),
  };
}
