import type { RequestHandler } from 'express';
import { ProblemError } from '../errors/problems';

const hasBody = (headers: Record<string, unknown>): boolean =>
  headers['transfer-encoding'] !== undefined || Number(headers['content-length'] ?? 0) > 0;

/** A body must be JSON: a form on another site can send text or form data, but never this type. */
export const requireJson: RequestHandler = (req, _res, next) => {
  if (hasBody(req.headers) && !req.is('application/json'))
    throw new ProblemError(415, 'unsupported-type', 'The body must be application/json');
  next();
};
