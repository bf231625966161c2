import { existsSync } from 'node:fs';
import path from 'node:path';
import compression from 'compression';
import { NotFoundError } from './errors';
import express, { type RequestHandler, type Response } from 'express';

const HASHED_ASSET = /[\\/]assets[\\/]/;

function setCaching(response: Response, file: string): void {
  response.setHeader('Cache-Control', HASHED_ASSET.test(file) ? 'public, max-age=31536000, immutable' : 'no-cache');
}

function isApi(requestPath: string): boolean {
  return requestPath === '/api' || requestPath.startsWith('/api/');
}

function wantsPage(method: string, requestPath: string, acceptsHtml: boolean): boolean {
  return (method === 'GET' || method === 'HEAD') && acceptsHtml && !path.basename(requestPath).includes('.');
}

/** Scripts and styles shrink to a third; answers of the API are short-lived and not worth the time. */
const compressed = compression({
  filter: (request, response) => !isApi(request.path) && compression.filter(request, response),
});

/** The built frontend: its files, and its one page for every address that belongs to the router in the browser. */
export function staticFrontend(frontendDir: string): RequestHandler[] {
  const page = path.join(frontendDir, 'index.html');
  const files = express.static(frontendDir, { index: false, redirect: false, setHeaders: setCaching });
  const fallback: RequestHandler = (request, response, next) => {
    if (isApi(request.path)) {
      next();
    } else if (!wantsPage(request.method, request.path, request.accepts('html') === 'html')) {
      next(new NotFoundError());
    } else if (existsSync(page)) {
      response.sendFile(page, { headers: { 'Cache-Control': 'no-cache' }, cacheControl: false });
    } else {
      response.status(503).type('text').send('The screens have not been built yet: run npm run build.\n');
    }
  };
  return [compressed, files, fallback];
}
