import { randomUUID } from 'node:crypto';
import { type Session, type SiteRole, sessionSchema } from '@shared/schemas/person.schema';
import jwt from 'jsonwebtoken';
import { type EntityManager, LessThan } from 'typeorm';
import type { Context } from '../context';
import { PersonEntity } from '../db/entities/person.entity';
import { SessionEntity } from '../db/entities/session.entity';
import { ProblemError } from '../errors/problems';
import type { Actor } from './actor';
import { isPublicPassword } from './new-password';

const WEEK_MS = 7 * 24 * 3600 * 1000;
const ALGORITHM = 'HS256';

export interface StartedSession {
  token: string;
  session: Session;
}

export const wrongSignIn = () =>
  new ProblemError(401, 'wrong-sign-in', 'E-mail or password is wrong', 'Check both and try again.');

/** Whether this person may be signed in at all; demo people only while demo mode is on. */
export function maySignIn(ctx: Context, person: Pick<PersonEntity, 'disabled' | 'demo'>): boolean {
  return !person.disabled && (ctx.config.demo || !person.demo);
}

/** Same answer after the same work for an unknown person, a wrong password and a disabled person. */
export async function signIn(ctx: Context, email: string, password: string): Promise<StartedSession> {
  const person = await ctx.db.manager.findOneBy(PersonEntity, { email });
  const same = await ctx.passwords.matches(password, person?.passwordHash ?? null);
  // Who took the demo password for their own while demo mode was on is shut out with it.
  const isOpenToAll = !ctx.config.demo && isPublicPassword(password);
  if (!person || !same || isOpenToAll || !maySignIn(ctx, person)) throw wrongSignIn();
  return ctx.db.write((manager) => startSession(ctx, manager, person));
}

export async function startSession(
  ctx: Context,
  manager: EntityManager,
  person: PersonEntity,
): Promise<StartedSession> {
  const now = ctx.now();
  const id = randomUUID();
  const expiresAt = new Date(now.getTime() + WEEK_MS).toISOString();
  await manager.delete(SessionEntity, { expiresAt: LessThan(now.toISOString()) });
  await manager.insert(SessionEntity, { id, personId: person.id, createdAt: now.toISOString(), expiresAt });
  const token = jwt.sign({ sub: person.id, jti: id }, ctx.secret, {
    algorithm: ALGORITHM,
    noTimestamp: true,
  });
  return { token, session: sessionSchema.parse({ person, expiresAt }) };
}

export const sessionOf = (actor: Actor): Session =>
  sessionSchema.parse({ person: actor, expiresAt: actor.expiresAt });

interface SessionRow {
  id: string;
  name: string;
  email: string;
  siteRole: SiteRole;
  disabled: number;
  demo: number;
  expiresAt: string;
}

/** The session that a cookie names, if it is signed by us, still there, and its person may be signed in. */
export async function readSession(ctx: Context, token: string): Promise<Actor | null> {
  const sessionId = sessionIdOf(ctx, token);
  if (sessionId === null) return null;
  const [row] = await ctx.db.rows<SessionRow>(
    `SELECT p.id, p.name, p.email, p.site_role AS siteRole, p.disabled, p.demo, s.expires_at AS expiresAt
     FROM session s JOIN person p ON p.id = s.person_id WHERE s.id = ? AND s.expires_at > ?`,
    [sessionId, ctx.now().toISOString()],
  );
  if (!row || !maySignIn(ctx, { disabled: row.disabled !== 0, demo: row.demo !== 0 })) return null;
  const { id, name, email, siteRole, expiresAt } = row;
  return { id, name, email, siteRole, expiresAt, sessionId };
}

function sessionIdOf(ctx: Context, token: string): string | null {
  try {
    const claims = jwt.verify(token, ctx.secret, { algorithms: [ALGORITHM] });
    return typeof claims === 'object' && typeof claims.jti === 'string' ? claims.jti : null;
  } catch {
    return null;
  }
}

export async function signOut(ctx: Context, actor: Actor): Promise<void> {
  await ctx.db.write((manager) => manager.delete(SessionEntity, { id: actor.sessionId }));
}

export async function signOutEverywhere(ctx: Context, personId: string): Promise<void> {
  await ctx.db.write((manager) => manager.delete(SessionEntity, { personId }));
}
