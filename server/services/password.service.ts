import { Not } from 'typeorm';
import type { Context } from '../context';
import { PersonEntity } from '../db/entities/person.entity';
import { SessionEntity } from '../db/entities/session.entity';
import { invalid } from '../errors/problems';
import { passwordChangedMail, resetMail } from '../mail/templates';
import type { Actor } from './actor';
import { hashNewPassword } from './new-password';
import { maySignIn } from './session.service';
import { issueToken, takeToken } from './token.service';

/** Keeps this sign-in, ends the person's others. */
export async function changePassword(
  ctx: Context,
  actor: Actor,
  body: { currentPassword: string; password: string },
): Promise<void> {
  const person = await ctx.db.manager.findOneByOrFail(PersonEntity, { id: actor.id });
  if (!(await ctx.passwords.matches(body.currentPassword, person.passwordHash)))
    throw invalid([{ path: 'currentPassword', message: 'is not your password' }]);
  const passwordHash = await hashNewPassword(ctx, body.password);
  await ctx.db.write(async (manager) => {
    await manager.update(PersonEntity, { id: actor.id }, { passwordHash, demo: false });
    await manager.delete(SessionEntity, { personId: actor.id, id: Not(actor.sessionId) });
  });
  ctx.background.run('mail', () => ctx.mailer.deliver(passwordChangedMail(actor, ctx.config.baseUrl)));
}

/** Answers at once whoever asks for whatever address; looking up and mailing happen behind the answer. */
export function requestReset(ctx: Context, email: string): void {
  ctx.background.run('password reset', async () => {
    const person = await ctx.db.manager.findOneBy(PersonEntity, { email });
    if (!person?.passwordHash || !maySignIn(ctx, { ...person, demo: false })) return;
    const token = await ctx.db.write((manager) => issueToken(ctx, manager, person.id, 'reset'));
    await ctx.mailer.deliver(resetMail(person, `${ctx.config.baseUrl}/reset/${token}`));
  });
}

export async function resetPassword(ctx: Context, token: string, password: string): Promise<void> {
  const passwordHash = await hashNewPassword(ctx, password);
  const person = await ctx.db.write(async (manager) => {
    const owner = await takeToken(ctx, manager, token, 'reset');
    await manager.update(PersonEntity, { id: owner.id }, { passwordHash, demo: false });
    await manager.delete(SessionEntity, { personId: owner.id });
    return owner;
  });
  ctx.background.run('mail', () => ctx.mailer.deliver(passwordChangedMail(person, ctx.config.baseUrl)));
}
