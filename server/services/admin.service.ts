import { randomUUID } from 'node:crypto';
import type { Context } from '../context';
import { PersonEntity } from '../db/entities/person.entity';

/** For the command only: whoever may touch the data folder may make an administrator. False: the address is taken. */
export async function createAdmin(
  ctx: Context,
  { email, name, password }: { email: string; name: string; password: string },
): Promise<boolean> {
  const passwordHash = await ctx.passwords.hash(password);
  const now = ctx.now().toISOString();
  return ctx.db.write(async (manager) => {
    if (await manager.existsBy(PersonEntity, { email })) return false;
    await manager.insert(PersonEntity, {
      id: randomUUID(),
      email,
      name,
      siteRole: 'admin',
      passwordHash,
      createdAt: now,
      updatedAt: now,
    });
    return true;
  });
}
