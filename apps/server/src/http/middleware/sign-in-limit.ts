import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import { Refusal } from '../../errors.ts';

const TRIES = 10;
const TRIES_OF_ONE_ADDRESS = 100;
const WINDOW_MINUTES = 15;

/**
 * Ten wrong passwords in a quarter of an hour for one name from one address, and a hundred from one
 * address whatever the names. Bound to the address, so that nobody can shut a colleague out from elsewhere.
 */
export function signInLimits(): RequestHandler[] {
  return [
    limitOf(TRIES, (req) => `${ipKeyGenerator(req.ip ?? '')} ${usernameOf(req.body)}`),
    limitOf(TRIES_OF_ONE_ADDRESS, (req) => ipKeyGenerator(req.ip ?? '')),
  ];
}

function limitOf(tries: number, keyOf: (req: Request) => string): RequestHandler {
  return rateLimit({
    windowMs: WINDOW_MINUTES * 60_000,
    limit: tries,
    skipSuccessfulRequests: true,
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    keyGenerator: keyOf,
    handler: () => {
      throw new Refusal(
        429,
        'too-many-tries',
        'Too many tries',
        `After ${tries} wrong tries wait ${WINDOW_MINUTES} minutes, or ask the administrator for a new password.`,
      );
    },
  });
}

function usernameOf(body: unknown): string {
  const username = typeof body === 'object' && body !== null && 'username' in body ? body.username : '';
  return typeof username === 'string' ? username.trim().toLowerCase().slice(0, 80) : '';
}
