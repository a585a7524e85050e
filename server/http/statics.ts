import { extname, join, resolve } from 'node:path';
import express, { type Router } from 'express';

/** Names the build has put a content hash into: such a file never changes under its name. */
const HASHED = /-[A-Z0-9]{8}\.[a-z0-9]+(\.map)?$/;

/**
 * The built app, and its first page for every path that may be a place inside it. A path that ends like a
 * file is none: a script that is no longer there must not be answered with a page.
 */
export function appStatics(appFolder: string): Router {
  const folder = resolve(appFolder);
  const router = express.Router();
  router.use(
    express.static(folder, {
      index: false,
      setHeaders: (response, path) => {
        response.set(
          'Cache-Control',
          HASHED.test(path) ? 'public, max-age=31536000, immutable' : 'no-cache',
        );
      },
    }),
  );
  router.get('/{*path}', (request, response, next) => {
    if (extname(request.path) !== '') {
      next();
      return;
    }
    response.set('Cache-Control', 'no-cache');
    response.sendFile(join(folder, 'index.html'), (error) => {
      if (error && !response.headersSent) next();
    });
  });
  return router;
}
