import type { RequestHandler } from 'express';
import { sendProblem } from './problem';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Refuses changes that another site's page asks a browser to make. Browsers say where a request comes from in
 * Sec-Fetch-Site, and in Origin where that is missing; programs that send neither carry no one's cookie by accident.
 */
export const sameOriginOnly: RequestHandler = (req, res, next) => {
  if (SAFE.has(req.method) || isOwn(req.get('sec-fetch-site'), req.get('origin'), req.get('host'))) next();
  else sendProblem(res, 'cross-site');
};

function isOwn(fetchSite: string | undefined, origin: string | undefined, host: string | undefined): boolean {
  if (fetchSite !== undefined) return fetchSite === 'same-origin' || fetchSite === 'none';
  if (origin === undefined) return true;
  try {
    return new URL(origin).host === host;
  } catch {
    return false; // `null`, as sandboxed pages send it
  }
}
