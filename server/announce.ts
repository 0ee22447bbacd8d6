import { isIP } from 'node:net';
import type { Context } from './context';
import { PersonEntity } from './db/entities/person.entity';
import { readSite } from './services/site.service';

const isLoopback = (host: string): boolean =>
  host === 'localhost' || host === '::1' || (isIP(host) === 4 && host.startsWith('127.'));

/** What a person reads after starting: where it is, and how to get in. */
export async function announce(ctx: Context, port: number): Promise<void> {
  const { config } = ctx;
  const host = config.host.includes(':') ? `[${config.host}]` : config.host;
  const lines = [`Millpond is running at http://${host}:${port}`];
  const { demoPeople } = await readSite(ctx);
  if (demoPeople.length > 0) {
    const width = Math.max(...demoPeople.map((person) => person.email.length));
    lines.push('', `Demo sign-ins, all with the password  ${demoPeople[0].password}`);
    for (const { email, role } of demoPeople) lines.push(`  ${email.padEnd(width)}  ${role}`);
    lines.push('', 'For real use start with MILLPOND_DEMO=0 (see .env.example).');
    if (!isLoopback(config.host))
      ctx.log.warn('demo sign-ins are open to everyone who reaches this address; set MILLPOND_DEMO=0');
  } else if (!(await ctx.db.manager.exists(PersonEntity))) {
    lines.push('', 'Nobody can sign in yet. Make the first administrator: npm run millpond -- admin create');
  }
  process.stdout.write(`${lines.join('\n')}\n`);
}
