import { idSchema } from '@shared/schemas/common.schema';
import { tokenSchema } from '@shared/schemas/person.schema';
import { letterSchema } from '@shared/schemas/revision.schema';
import express, { type Request, type RequestHandler, type Response, Router } from 'express';
import type { z } from 'zod';
import type { Context } from '../context';
import { faultsOf } from '../errors/faults';
import { badRequest, invalid, notFound, ProblemError, signedOut } from '../errors/problems';
import type { RateLimits } from '../middleware/rate-limits';
import { requireJson } from '../middleware/require-json';
import { Reply, type Route } from './route';

const BODY_LIMIT = '2mb';

/** A parameter that cannot name anything names nothing: 404, like one that names nothing today. */
const parameterSchemas: Record<string, [z.ZodType<string>, string]> = {
  boardId: [idSchema, 'board'],
  railId: [idSchema, 'rail'],
  personId: [idSchema, 'person'],
  partId: [idSchema, 'part'],
  mailId: [idSchema, 'mail'],
  letter: [letterSchema, 'revision'],
  token: [tokenSchema, 'link'],
};

/** All routes on one router: session, rate limit, body, then the handler; 405 and 404 for the rest. */
export function registerRoutes(routes: readonly Route[], ctx: Context, limits: RateLimits): Router {
  const router = Router({ caseSensitive: true });
  const json = express.json({ limit: BODY_LIMIT, strict: true });
  for (const item of routes) {
    const steps: RequestHandler[] = [];
    if (item.access === 'signed-in') steps.push(requireSession);
    if (item.method !== 'get') steps.push(requireJson, json);
    if (item.limit) steps.push(...limits[item.limit]);
    steps.push((req, res) => answer(item, ctx, req, res));
    router[item.method](item.path, ...steps);
  }
  for (const [path, methods] of methodsByPath(routes)) {
    router.all(path, () => {
      throw new ProblemError(
        405,
        'method',
        'This address does not take that method',
        undefined,
        {},
        {
          Allow: methods.join(', '),
        },
      );
    });
  }
  return router;
}

const requireSession: RequestHandler = (req, _res, next) => {
  if (!req.actor) throw signedOut();
  next();
};

function methodsByPath(routes: readonly Route[]): Map<string, string[]> {
  const found = new Map<string, string[]>();
  for (const { path, method } of routes) {
    const names = method === 'get' ? ['GET', 'HEAD'] : [method.toUpperCase()];
    found.set(path, [...(found.get(path) ?? []), ...names]);
  }
  return found;
}

async function answer(item: Route, ctx: Context, req: Request, res: Response): Promise<void> {
  const params = readParameters(req);
  const query = readQuery(item, req);
  const body = readBody(item, req);
  const value = await item.handle({ ctx, actor: req.actor, params, query, body, req, res });
  const reply = value instanceof Reply ? value : new Reply(200, value);
  res.status(reply.status);
  if (reply.file) {
    res.attachment(reply.file.name).type(reply.file.type).send(reply.body);
  } else if (reply.body === undefined) {
    res.end();
  } else {
    res.json(reply.body);
  }
}

function readParameters(req: Request): Record<string, string> {
  const params: Record<string, string> = {};
  for (const [name, value] of Object.entries(req.params)) {
    const [schema, what] = parameterSchemas[name];
    const parsed = schema.safeParse(value);
    if (!parsed.success) throw notFound(what);
    params[name] = parsed.data;
  }
  return params;
}

function readQuery(item: Route, req: Request): unknown {
  if (!item.query) return undefined;
  const parsed = item.query.safeParse({ ...req.query });
  if (!parsed.success) throw badRequest('The query has faults.', faultsOf(parsed.error));
  return parsed.data;
}

function readBody(item: Route, req: Request): unknown {
  if (!item.body) return undefined;
  const parsed = item.body.safeParse(req.body);
  if (!parsed.success) throw invalid(faultsOf(parsed.error));
  return parsed.data;
}
