import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** What a browser may load and do here: only our own files, no inline code, no frames, nothing kept of the API. */
export function securityHeaders(origin: string | null): RequestHandler {
  const isSecure = origin?.startsWith('https:') ?? false;
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        'default-src': ["'none'"],
        'script-src': ["'self'"],
        'style-src': ["'self'"],
        'font-src': ["'self'"],
        'img-src': ["'self'", 'data:'],
        'connect-src': ["'self'"],
        'manifest-src': ["'self'"],
        'form-action': ["'self'"],
        'base-uri': ["'none'"],
        'frame-ancestors': ["'none'"],
        'object-src': ["'none'"],
        'upgrade-insecure-requests': null,
      },
    },
    strictTransportSecurity: isSecure ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    referrerPolicy: { policy: 'no-referrer' },
    xFrameOptions: { action: 'deny' },
  });
}

export const neverStored: RequestHandler = (_req, res, next) => {
  res.set('Cache-Control', 'no-store');
  next();
};
