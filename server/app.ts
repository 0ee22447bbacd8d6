import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type Express } from 'express';
import type { Context } from './context';
import { problemMapper } from './errors/problem-mapper';
import { notFound } from './errors/problems';
import { clientFiles } from './middleware/client-files';
import { createRateLimits } from './middleware/rate-limits';
import { requestLog } from './middleware/request-log';
import { sameOrigin } from './middleware/same-origin';
import { securityHeaders } from './middleware/security-headers';
import { readActor } from './middleware/session';
import { routes } from './routes';
import { registerRoutes } from './routes/registrar';

export interface AppOptions {
  /** Where the built client lies; left out, only the API is served. */
  clientFolder?: string;
}

/** The whole application, not listening. */
export function createApp(ctx: Context, options: AppOptions = {}): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', ctx.config.trustProxy);
  app.use(requestLog(ctx.log));
  app.use(securityHeaders(ctx.config.baseUrl.startsWith('https:')));
  app.use(compression());
  app.use(
    '/api',
    (_req, res, next) => {
      res.set('Cache-Control', 'no-store');
      next();
    },
    sameOrigin(ctx.config.baseUrl),
    cookieParser(),
    readActor(ctx),
    registerRoutes(routes, ctx, createRateLimits(ctx.config.rateLimit)),
    () => {
      throw notFound('address');
    },
  );
  if (options.clientFolder) app.use(clientFiles(options.clientFolder));
  app.use(() => {
    throw notFound('page');
  });
  app.use(problemMapper);
  return app;
}
