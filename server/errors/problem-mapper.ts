import type { ErrorRequestHandler, Response } from 'express';
import { conflict, ProblemError } from './problems';

/** Errors of the body parser and the router carry a status; these are the ones a client can cause. */
const known: Record<number, [slug: string, title: string]> = {
  400: ['bad-request', 'The request cannot be read'],
  404: ['not-found', 'Not found'],
  413: ['too-large', 'The request is too large'],
  415: ['unsupported-type', 'The body must be application/json'],
  416: ['bad-request', 'The range cannot be served'],
};

function statusOf(error: unknown): number | null {
  if (!(error instanceof Error) || !('status' in error) || typeof error.status !== 'number') return null;
  return error.status in known ? error.status : null;
}

function sqliteCode(error: unknown): string {
  const cause = error instanceof Error && 'driverError' in error ? error.driverError : error;
  return cause instanceof Error && 'code' in cause && typeof cause.code === 'string' ? cause.code : '';
}

/** The write lock was not free in time, or the disk is full: the client may try again later. */
const isBusy = (error: unknown): boolean => /^SQLITE_(BUSY|LOCKED|FULL)/.test(sqliteCode(error));

/** Another process (the command) wrote between our check and our write. */
const isBrokenRule = (error: unknown): boolean => sqliteCode(error).startsWith('SQLITE_CONSTRAINT');

export function toProblemError(error: unknown): ProblemError {
  if (error instanceof ProblemError) return error;
  const status = statusOf(error);
  if (status !== null)
    return new ProblemError(status, ...known[status], error instanceof Error ? error.message : undefined);
  if (isBrokenRule(error)) return conflict('Something this depends on changed meanwhile; load it again.');
  if (isBusy(error))
    return new ProblemError(
      503,
      'busy',
      'The database is busy',
      'Try again in a moment.',
      {},
      {
        'Retry-After': '2',
      },
    );
  return new ProblemError(
    500,
    'internal',
    'Something went wrong on the server',
    'The fault has been logged.',
  );
}

export function sendProblem(res: Response, problem: ProblemError): void {
  res
    .status(problem.status)
    .set(problem.headers)
    .type('application/problem+json')
    .send(JSON.stringify(problem.toProblem()));
}

/** The one place where errors become answers. */
export const problemMapper: ErrorRequestHandler = (error, req, res, next) => {
  const problem = toProblemError(error);
  if (problem.status >= 500 && problem.slug !== 'busy') req.log?.error({ err: error }, 'request failed');
  if (res.headersSent) {
    next(error);
    return;
  }
  sendProblem(res, problem);
};
