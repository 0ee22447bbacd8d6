import type { Request, RequestHandler } from 'express';
import { forbidden } from '../errors/problems';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses changes asked for by another site's page. The session cookie is SameSite=Strict already; this holds
 * where a browser or a sibling host weakens that. A request without browser headers comes from no page, but must
 * then say that it is JSON or carry a header that only scripts can set.
 */
export function sameOrigin(baseUrl: string): RequestHandler {
  const baseOrigin = new URL(baseUrl).origin;
  return (req, _res, next) => {
    if (!SAFE.has(req.method) && !comesFromHere(req, baseOrigin))
      throw forbidden('The request comes from another site.');
    next();
  };
}

function comesFromHere(req: Request, baseOrigin: string): boolean {
  const site = req.get('sec-fetch-site');
  if (site !== undefined) return site === 'same-origin' || site === 'none';
  const origin = req.get('origin');
  if (origin !== undefined) return origin === baseOrigin || hostOf(origin) === req.get('host');
  if (req.method !== 'POST') return true;
  return req.get('content-type') !== undefined || req.get('x-requested-with') !== undefined;
}

function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}
