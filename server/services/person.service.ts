import type { Page, PageQuery, PersonRef } from '@shared/schemas/common.schema';
import type { Person, SiteRole } from '@shared/schemas/person.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../context';
import { PersonEntity } from '../db/entities/person.entity';
import { SessionEntity } from '../db/entities/session.entity';
import { conflict, notFound, stale } from '../errors/problems';
import type { Actor } from './actor';
import { likePattern } from './like';
import { requireOnSite } from './rights';

export function personView(person: PersonEntity): Person {
  return {
    id: person.id,
    name: person.name,
    email: person.email,
    siteRole: person.siteRole,
    disabled: person.disabled,
    invited: person.passwordHash === null,
    version: person.version,
    createdAt: person.createdAt,
  };
}

export const personRef = (person: PersonEntity | null | undefined): PersonRef | null =>
  person ? { id: person.id, name: person.name } : null;

export async function listPeople(ctx: Context, query: PageQuery & { q?: string }): Promise<Page<Person>> {
  const search = ctx.db.manager
    .createQueryBuilder(PersonEntity, 'p')
    .orderBy('p.name', 'ASC')
    .addOrderBy('p.id', 'ASC')
    .limit(query.limit)
    .offset(query.offset);
  if (query.q)
    search.where("(p.name LIKE :q ESCAPE '\\' OR p.email LIKE :q ESCAPE '\\')", { q: likePattern(query.q) });
  const [people, total] = await search.getManyAndCount();
  return { items: people.map(personView), total, limit: query.limit, offset: query.offset };
}

interface PersonChange {
  version: number;
  name?: string;
  siteRole?: SiteRole;
  disabled?: boolean;
}

export async function updatePerson(
  ctx: Context,
  actor: Actor,
  id: string,
  change: PersonChange,
): Promise<Person> {
  requireOnSite(actor, 'manage people');
  return ctx.db.write(async (manager) => {
    const found = await manager.findOne(PersonEntity, { where: { id }, relations: { updatedBy: true } });
    if (!found) throw notFound('person');
    const { updatedBy, ...person } = found;
    if (person.version !== change.version)
      throw stale(personView(person), personRef(updatedBy), person.updatedAt);
    const next = {
      ...person,
      ...change,
      version: person.version + 1,
      updatedAt: ctx.now().toISOString(),
      updatedById: actor.id,
    };
    if (isActiveAdmin(person) && !isActiveAdmin(next) && (await activeAdmins(ctx, manager)) <= 1)
      throw conflict(`${person.name} is the last administrator; make someone else administrator first.`);
    await manager.update(PersonEntity, { id }, next);
    if (next.disabled) await manager.delete(SessionEntity, { personId: id });
    return personView(next);
  });
}

const isActiveAdmin = (person: PersonEntity): boolean =>
  person.siteRole === 'admin' && !person.disabled && person.passwordHash !== null;

async function activeAdmins(ctx: Context, manager: EntityManager): Promise<number> {
  const search = manager
    .createQueryBuilder(PersonEntity, 'p')
    .where("p.siteRole = 'admin' AND p.disabled = 0 AND p.passwordHash IS NOT NULL");
  if (!ctx.config.demo) search.andWhere('p.demo = 0');
  return search.getCount();
}
