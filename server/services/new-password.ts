import type { Context } from '../context';
import { DEMO_PASSWORD } from '../db/demo/people';
import { invalid } from '../errors/problems';

export const PUBLIC_PASSWORD = 'is the demo password, which everybody can read; choose another';

export const isPublicPassword = (password: string): boolean => password === DEMO_PASSWORD;

/** The hash of a password that a person chose; the demo password will do only while demo mode is on. */
export function hashNewPassword(ctx: Context, password: string): Promise<string> {
  if (!ctx.config.demo && isPublicPassword(password))
    throw invalid([{ path: 'password', message: PUBLIC_PASSWORD }]);
  return ctx.passwords.hash(password);
}
