import type { IncomingMessage } from 'node:http';
import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/** Links in mails carry a secret in their path; a log must not. */
export function withoutSecrets(url: string): string {
  return url
    .replace(/\/(invitations?|password-resets|reset)\/[^/?#]+/g, '/$1/…')
    .replace(/([?&][^=&]*(?:token|password|secret)[^=&]*)=[^&]*/gi, '$1=…');
}

/** Routers cut their own part off `url` while they work; the address as it came stands beside it. */
const isApi = (req: IncomingMessage & { originalUrl?: string }): boolean =>
  (req.originalUrl ?? req.url ?? '').startsWith('/api/');

export function requestLog(logger: Logger): RequestHandler {
  return pinoHttp({
    logger,
    serializers: {
      req: (req: { id: unknown; method: string; url: string }) => ({
        id: req.id,
        method: req.method,
        url: withoutSecrets(req.url),
      }),
      res: (res: { statusCode: number }) => ({ status: res.statusCode }),
    },
    customLogLevel: (req, res, error) => {
      if (error || res.statusCode >= 500) return 'error';
      return isApi(req) ? 'info' : 'debug';
    },
    customErrorMessage: () => 'request failed',
  });
}
