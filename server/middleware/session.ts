import type { CookieOptions, RequestHandler, Response } from 'express';
import type { Context } from '../context';
import type { Actor } from '../services/actor';
import { readSession } from '../services/session.service';

export const SESSION_COOKIE = 'millpond_session';

declare global {
  namespace Express {
    interface Request {
      actor: Actor | null;
    }
  }
}

/** Who is asking: one indexed query for a request with a well-signed cookie, none for the others. */
export function readActor(ctx: Context): RequestHandler {
  return async (req, _res, next) => {
    const token: unknown = req.cookies?.[SESSION_COOKIE];
    req.actor = typeof token === 'string' ? await readSession(ctx, token) : null;
    next();
  };
}

function cookieOptions(ctx: Context): CookieOptions {
  return { httpOnly: true, sameSite: 'strict', secure: ctx.config.secureCookie, path: '/' };
}

export function setSessionCookie(ctx: Context, res: Response, token: string, expiresAt: string): void {
  res.cookie(SESSION_COOKIE, token, { ...cookieOptions(ctx), expires: new Date(expiresAt) });
}

export function clearSessionCookie(ctx: Context, res: Response): void {
  res.clearCookie(SESSION_COOKIE, cookieOptions(ctx));
}
