import { join, resolve } from 'node:path';
import express, { type Express, type Response } from 'express';
import type { Config } from '@seamwright/shared/server';

const HASHED = /-[A-Z0-9]{8}\.\w+$/;

/** Files whose name carries their hash never change; the page itself is always asked for anew. */
const cacheFor = (response: Response, path: string): void => {
  response.set('cache-control', HASHED.test(path) ? 'public, max-age=31536000, immutable' : 'no-cache');
};

/** Serves both applications from one origin: the admin below /admin/, the storefront for everything else. */
export function serveApplications(app: Express, config: Config): void {
  if (config.STATIC_ADMIN) serve(app, '/admin', resolve(config.STATIC_ADMIN));
  if (config.STATIC_STOREFRONT) serve(app, '/', resolve(config.STATIC_STOREFRONT));
}

function serve(app: Express, base: string, folder: string): void {
  app.use(base, express.static(folder, { index: false, setHeaders: cacheFor }));
  const page = base === '/' ? /^\/(?!api\/)(?:[^.]*)$/ : new RegExp(`^${base}(?:/[^.]*)?$`);
  app.get(page, (_request, response) => {
    response.set('cache-control', 'no-cache').sendFile(join(folder, 'index.html'));
  });
}
