import { randomBytes } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import express, { Router } from 'express';
import helmet from 'helmet';

/**
 * Serves the built pages from `folder`. Every address that is not a file is the application's own page, written with
 * a fresh nonce: Angular's component styles are allowed by it and nothing else inline is.
 */
export function pageRoutes(folder: string): Router {
  const router = Router();
  const page = readFileSync(join(folder, 'index.html'), 'utf8');
  router.use(
    express.static(folder, {
      index: false,
      setHeaders: (res, file) =>
        res.setHeader(
          'Cache-Control',
          /-[A-Z0-9]{8}\.\w+$/.test(file) ? 'public, max-age=31536000, immutable' : 'no-cache',
        ),
    }),
  );
  router.get('/{*path}', (_req, res) => {
    const nonce = randomBytes(16).toString('base64');
    res
      .set('Content-Security-Policy', contentSecurityPolicy(nonce))
      .set('Cache-Control', 'no-store')
      .type('html')
      .send(page.replaceAll('__CSP_NONCE__', nonce));
  });
  return router;
}

function contentSecurityPolicy(nonce: string): string {
  return [
    "default-src 'self'",
    "script-src 'self'",
    `style-src 'self' 'nonce-${nonce}'`,
    // Angular binds positions and widths through the style attribute's object model; drawings carry none inline
    "style-src-attr 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self'",
    "connect-src 'self'",
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ');
}

/** Headers of every answer; the pages add their own content policy. */
export const securityHeaders = () =>
  helmet({
    contentSecurityPolicy: { useDefaults: false, directives: { defaultSrc: ["'none'"], frameAncestors: ["'none'"] } },
    strictTransportSecurity: false, // set by whoever terminates HTTPS in front
  });
