import { ENGINE_VERSION } from '@shared/engine/version';
import type { Health, Site } from '@shared/schemas/person.schema';
import type { Context } from '../context';
import { DEMO_PASSWORD, demoRoles } from '../db/demo/people';
import { PersonEntity } from '../db/entities/person.entity';
import { VERSION } from '../version';

export async function readHealth(ctx: Context): Promise<Health> {
  const figures = { version: VERSION, engineVersion: ENGINE_VERSION };
  try {
    await ctx.db.rows('SELECT id FROM person LIMIT 1');
    return { status: 'ok', database: 'ok', ...figures };
  } catch (error) {
    ctx.log.error({ err: error }, 'the database does not answer');
    return { status: 'failing', database: 'failing', ...figures };
  }
}

/** Demo people appear only while they can sign in with the demo password. */
export async function readSite(ctx: Context): Promise<Site> {
  const { demo } = ctx.config;
  const people = demo ? await ctx.db.manager.findBy(PersonEntity, { demo: true, disabled: false }) : [];
  const open = new Set(people.map((person) => person.email));
  const demoPeople = [...demoRoles]
    .filter(([email]) => open.has(email))
    .map(([email, role]) => ({ email, password: DEMO_PASSWORD, role }));
  return { demo, demoPeople, version: VERSION };
}
