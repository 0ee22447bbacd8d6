import type { Request, Response } from 'express';
import type { z } from 'zod';
import type { Context } from '../context';
import type { Actor } from '../services/actor';

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';
export type LimitName = 'signIn' | 'reset' | 'token' | 'password';

type Parsed<S> = S extends z.ZodType ? z.output<S> : undefined;

export interface Call<Body, Query, Who> {
  ctx: Context;
  actor: Who;
  /** Path parameters, each already checked by its own schema. */
  params: Record<string, string>;
  body: Body;
  query: Query;
  req: Request;
  res: Response;
}

/** A handler's answer when it is not plain JSON with status 200. */
export class Reply {
  constructor(
    readonly status: number,
    readonly body?: unknown,
    readonly file?: { name: string; type: string },
  ) {}
}

export const created = (body: unknown) => new Reply(201, body);
export const accepted = (body?: unknown) => new Reply(202, body);
export const done = () => new Reply(204);
export const attachment = (text: string, name: string, type: string) => new Reply(200, text, { name, type });

export interface Route {
  method: Method;
  path: string;
  /** `open`: without signing in; `signed-in`: with a session. What a person may do is decided by services. */
  access: 'open' | 'signed-in';
  limit?: LimitName;
  body?: z.ZodType;
  query?: z.ZodType;
  handle: (call: Call<unknown, unknown, Actor | null>) => Promise<unknown>;
}

interface RouteSpec<
  A extends Route['access'],
  B extends z.ZodType | undefined,
  Q extends z.ZodType | undefined,
> {
  access: A;
  limit?: LimitName;
  body?: B;
  query?: Q;
  handle: (call: Call<Parsed<B>, Parsed<Q>, A extends 'signed-in' ? Actor : Actor | null>) => unknown;
}

/** Declares a route; the registrar parses by its schemas before `handle` runs, so the types hold there. */
export function route<
  A extends Route['access'],
  B extends z.ZodType | undefined = undefined,
  Q extends z.ZodType | undefined = undefined,
>(method: Method, path: string, spec: RouteSpec<A, B, Q>): Route {
  const { access, limit, body, query } = spec;
  const handle: Route['handle'] = async (call) => spec.handle(call as Parameters<typeof spec.handle>[0]);
  return { method, path, access, limit, body, query, handle };
}
