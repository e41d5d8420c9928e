import { existsSync } from 'node:fs';
import path from 'node:path';
import express, { type Express } from 'express';
import { projectFile } from '../project-file.ts';

/** The built console: hashed assets kept for a year, every other address answered with its page. */
export function mountConsole(app: Express): void {
  const root = projectFile('dist/web');
  app.use('/assets', express.static(path.join(root, 'assets'), { immutable: true, maxAge: '1y', fallthrough: false }));
  app.use(express.static(root, { index: false, cacheControl: true, maxAge: 0 }));
  app.use((request, response, next) => {
    if (request.method !== 'GET' && request.method !== 'HEAD') return next();
    const page = path.join(root, 'index.html');
    if (!existsSync(page)) return void response.status(503).type('text/plain').send('The console has not been built: npm run build.\n');
    response.setHeader('Cache-Control', 'no-cache');
    response.sendFile(page);
  });
}
