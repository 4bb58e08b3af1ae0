import { createHash } from 'node:crypto';
import fs from 'node:fs';
import path from 'node:path';

import express, { Router } from 'express';

import { unknownPath } from './error-handler';

const PAGE = 'index.html';

/** Their files carry a hash of the content in their names. */
const HASHED_FOLDERS = ['_expo', 'assets'];

/** Serves the exported web app: every page is the one page, which finds its way by the address. */
export function webPages(root: string): Router {
  const router = Router();
  for (const folder of HASHED_FOLDERS)
    router.use(
      `/${folder}`,
      express.static(path.join(root, folder), { immutable: true, maxAge: '1y', index: false }),
      unknownPath,
    );
  router.use(express.static(root, { index: false, redirect: false, setHeaders: revalidated }));
  router.get('/{*page}', (req, res, next) => {
    if (path.extname(req.path) !== '' || !req.accepts('html')) return next();
    return res.sendFile(PAGE, {
      root,
      cacheControl: false,
      headers: { 'Cache-Control': 'no-cache' },
    });
  });
  return router;
}

const revalidated = (res: express.Response) => res.set('Cache-Control', 'no-cache');

/** What the content security policy must know of the scripts that stand in the page itself. */
export function inlineScriptSources(root: string): string[] {
  const html = fs.readFileSync(path.join(root, PAGE), 'utf8');
  const scripts = [...html.matchAll(/<script(?![^>]*\ssrc=)[^>]*>([\s\S]*?)<\/script>/g)];
  return scripts.map(
    ([, code = '']) => `'sha256-${createHash('sha256').update(code).digest('base64')}'`,
  );
}
