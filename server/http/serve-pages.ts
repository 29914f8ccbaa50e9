import express, { type Express } from 'express';
import { existsSync } from 'node:fs';
import type { Server } from 'node:http';
import { join } from 'node:path';

/** Serves the built pages: hashed files for ever, the page itself never from a cache, and no page for a missing file. */
export function servePages(app: Express, folder: string): void {
  if (!existsSync(join(folder, 'index.html'))) {
    throw new Error(`The pages are not built: ${folder} has no index.html. Run npm start, which builds them.`);
  }
  app.use('/assets', express.static(join(folder, 'assets'), { immutable: true, maxAge: '1y', fallthrough: false }));
  app.use(express.static(folder, { index: false, maxAge: '1h' }));
  app.get('/{*page}', (_request, response) => {
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile(join(folder, 'index.html'));
  });
}

/** Serves the pages from their sources, changing as they change; development only. */
export async function servePagesLive(app: Express, server: Server): Promise<() => Promise<void>> {
  const { createServer } = await import('vite');
  const vite = await createServer({ appType: 'spa', server: { middlewareMode: { server }, hmr: { server } } });
  app.use(vite.middlewares);
  return () => vite.close();
}
