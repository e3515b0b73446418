import type { IncomingMessage } from 'node:http';
import type { RequestHandler } from 'express';
import { notAllowed } from '../../errors.ts';

const SAFE = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Writes come from our own pages only. @source OWASP CSRF prevention: Fetch Metadata, with the Origin header as its fallback. */
export function sameOriginWrites(origin: string | null): RequestHandler {
  return (req, _res, next) => {
    if (!SAFE.has(req.method) && !isSameOrigin(req, origin))
      throw notAllowed('This request came from another site.');
    next();
  };
}

/**
 * Whether a request or a socket handshake comes from our own origin. A request with neither header is
 * not from a page at all (browsers send one with every write and every handshake), so no page can
 * borrow a session through it.
 */
export function isSameOrigin(req: IncomingMessage, ownOrigin: string | null): boolean {
  const { origin, host } = req.headers;
  const site = req.headers['sec-fetch-site'];
  if (origin !== undefined) return ownOrigin === null ? hostOf(origin) === host : origin === ownOrigin;
  return site === undefined || site === 'same-origin' || site === 'none';
}

function hostOf(origin: string): string | null {
  try {
    return new URL(origin).host;
  } catch {
    return null;
  }
}
