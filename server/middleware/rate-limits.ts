import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, type Options, rateLimit } from 'express-rate-limit';
import { ProblemError } from '../errors/problems';
import type { LimitName } from '../routes/route';

export type RateLimits = Record<LimitName, RequestHandler[]>;

const QUARTER_HOUR_MS = 15 * 60_000;

const address = (req: Request): string => ipKeyGenerator(req.ip ?? 'unknown');

function addressAndEmail(req: Request): string {
  const body: unknown = req.body;
  const email = typeof body === 'object' && body !== null && 'email' in body ? body.email : '';
  return `${address(req)} ${typeof email === 'string' ? email.trim().toLowerCase().slice(0, 200) : ''}`;
}

function limiter(limit: number, options: Partial<Options>): RequestHandler {
  return rateLimit({
    windowMs: QUARTER_HOUR_MS,
    limit,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    // The proxy setting is checked at start; its run-time warnings would only fill the log.
    validate: false,
    handler: (_req, _res, next) =>
      next(
        new ProblemError(429, 'too-many', 'Too many attempts', 'Wait a quarter of an hour and try again.'),
      ),
    ...options,
  });
}

/**
 * `limit` failed sign-ins a quarter of an hour for one person from one address, ten times that from one
 * address for all; the other doors in proportion. 0 opens them all, for test runs.
 */
export function createRateLimits(limit: number): RateLimits {
  if (limit === 0) return { signIn: [], reset: [], token: [], password: [] };
  const perPerson = { keyGenerator: addressAndEmail };
  const perAddress = { keyGenerator: address };
  return {
    signIn: [
      limiter(limit * 10, { ...perAddress, skipSuccessfulRequests: true }),
      limiter(limit, { ...perPerson, skipSuccessfulRequests: true }),
    ],
    reset: [limiter(limit * 5, perAddress), limiter(Math.ceil(limit / 2), perPerson)],
    token: [limiter(limit * 5, perAddress)],
    password: [
      limiter(limit, { keyGenerator: (req) => req.actor?.id ?? address(req), skipSuccessfulRequests: true }),
    ],
  };
}
