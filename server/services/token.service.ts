import { createHash, randomBytes, randomUUID } from 'node:crypto';
import type { TokenInfo } from '@shared/schemas/person.schema';
import type { EntityManager } from 'typeorm';
import type { Context } from '../context';
import { AccessTokenEntity, type TokenPurpose } from '../db/entities/access-token.entity';
import type { PersonEntity } from '../db/entities/person.entity';
import { ProblemError } from '../errors/problems';

const HOUR_MS = 3600 * 1000;
const lifetimeMs: Record<TokenPurpose, number> = { invitation: 7 * 24 * HOUR_MS, reset: HOUR_MS };

const hashOf = (token: string): string => createHash('sha256').update(token).digest('hex');

const deadLink = () =>
  new ProblemError(
    404,
    'dead-link',
    'This link is no longer valid',
    'It has been used, has expired, or a newer one was sent. Ask for a new one.',
  );

/** A new link for a person; one sent before stops working. */
export async function issueToken(
  ctx: Context,
  manager: EntityManager,
  personId: string,
  purpose: TokenPurpose,
): Promise<string> {
  const now = ctx.now();
  const token = randomBytes(32).toString('base64url');
  await manager.delete(AccessTokenEntity, { personId, purpose });
  await manager.insert(AccessTokenEntity, {
    id: randomUUID(),
    personId,
    purpose,
    hash: hashOf(token),
    createdAt: now.toISOString(),
    expiresAt: new Date(now.getTime() + lifetimeMs[purpose]).toISOString(),
  });
  return token;
}

async function find(ctx: Context, manager: EntityManager, token: string, purpose: TokenPurpose) {
  const row = await manager.findOne(AccessTokenEntity, {
    where: { hash: hashOf(token), purpose },
    relations: { person: true },
  });
  const person = row?.person;
  if (!row || !person || person.disabled || row.expiresAt <= ctx.now().toISOString()) throw deadLink();
  return { row, person };
}

export async function describeToken(ctx: Context, token: string, purpose: TokenPurpose): Promise<TokenInfo> {
  const { row, person } = await find(ctx, ctx.db.manager, token, purpose);
  return { email: person.email, name: person.name, expiresAt: row.expiresAt };
}

/** Uses a link up and answers whose it was. */
export async function takeToken(
  ctx: Context,
  manager: EntityManager,
  token: string,
  purpose: TokenPurpose,
): Promise<PersonEntity> {
  const { row, person } = await find(ctx, manager, token, purpose);
  await manager.delete(AccessTokenEntity, { id: row.id });
  return person;
}
