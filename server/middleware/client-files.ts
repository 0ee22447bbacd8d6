import { existsSync } from 'node:fs';
import path from 'node:path';
import express, { type RequestHandler, Router } from 'express';

const ONE_YEAR = 'public, max-age=31536000, immutable';

/** The built client: hashed assets for ever, the page itself asked for anew each time; every screen is one page. */
export function clientFiles(folder: string): RequestHandler {
  const page = path.join(folder, 'index.html');
  const router = Router();
  if (!existsSync(page)) {
    router.get('/', (_req, res) => {
      res.status(503).type('text').send('The client is not built yet: run npm run build.\n');
    });
    return router;
  }
  router.use(
    express.static(folder, {
      index: 'index.html',
      dotfiles: 'ignore',
      redirect: false,
      setHeaders: (res, file) => {
        const hashed = path.relative(folder, file).startsWith(`assets${path.sep}`);
        res.setHeader('Cache-Control', hashed ? ONE_YEAR : 'no-cache');
      },
    }),
  );
  router.use((req, res, next) => {
    const asksForPage = req.method === 'GET' && req.accepts(['html', 'json']) === 'html';
    if (!asksForPage || req.path.startsWith('/assets/')) return next();
    res.set('Cache-Control', 'no-cache').sendFile(page);
  });
  return router;
}
