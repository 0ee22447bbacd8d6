import { randomUUID } from 'node:crypto';
import type { Person, SiteRole } from '@shared/schemas/person.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../context';
import { PersonEntity } from '../db/entities/person.entity';
import { conflict, invalid, notFound } from '../errors/problems';
import { invitationMail } from '../mail/templates';
import type { Actor } from './actor';
import { hashNewPassword } from './new-password';
import { personView } from './person.service';
import { requireOnSite } from './rights';
import { type StartedSession, startSession } from './session.service';
import { issueToken, takeToken } from './token.service';

export async function invite(
  ctx: Context,
  actor: Actor,
  body: { email: string; name: string; siteRole: SiteRole },
): Promise<Person> {
  requireOnSite(actor, 'manage people');
  const { person, token } = await ctx.db.write(async (manager) => {
    if (await manager.existsBy(PersonEntity, { email: body.email }))
      throw invalid([{ path: 'email', message: 'someone with this address is here already' }]);
    const id = randomUUID();
    const now = ctx.now().toISOString();
    await manager.insert(PersonEntity, {
      ...body,
      id,
      passwordHash: null,
      createdAt: now,
      updatedAt: now,
      updatedById: actor.id,
    });
    return withToken(ctx, manager, id);
  });
  await send(ctx, actor, person, token);
  return personView(person);
}

/** Sends a new link to someone who has not accepted yet; the old link stops working. */
export async function inviteAgain(ctx: Context, actor: Actor, personId: string): Promise<Person> {
  requireOnSite(actor, 'manage people');
  const { person, token } = await ctx.db.write(async (manager) => {
    const found = await manager.findOneBy(PersonEntity, { id: personId });
    if (!found) throw notFound('person');
    if (found.passwordHash !== null) throw conflict(`${found.name} has accepted the invitation already.`);
    if (found.disabled) throw conflict(`${found.name} is disabled.`);
    return withToken(ctx, manager, personId);
  });
  await send(ctx, actor, person, token);
  return personView(person);
}

async function withToken(ctx: Context, manager: EntityManager, id: string) {
  const token = await issueToken(ctx, manager, id, 'invitation');
  return { person: await manager.findOneByOrFail(PersonEntity, { id }), token };
}

async function send(ctx: Context, actor: Actor, person: PersonEntity, token: string): Promise<void> {
  const link = `${ctx.config.baseUrl}/invitation/${token}`;
  await ctx.mailer.deliver(invitationMail(person, actor.name, link));
}

export async function acceptInvitation(
  ctx: Context,
  token: string,
  body: { name: string; password: string },
): Promise<StartedSession> {
  const passwordHash = await hashNewPassword(ctx, body.password);
  return ctx.db.write(async (manager) => {
    const { id } = await takeToken(ctx, manager, token, 'invitation');
    await manager.update(PersonEntity, { id }, { name: body.name, passwordHash });
    return startSession(ctx, manager, await manager.findOneByOrFail(PersonEntity, { id }));
  });
}
