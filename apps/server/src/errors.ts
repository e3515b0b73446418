import type { Problem } from '@windrow/ventilation/contract/problem';

/** A failure that is expected: it has a status, a stable type and words for the person. Everything else is a bare 500. */
export class Refusal extends Error {
  readonly problem: Problem;

  constructor(status: number, slug: string, title: string, detail: string, errors?: Problem['errors']) {
    super(detail);
    this.name = 'Refusal';
    this.problem = {
      type: `urn:windrow:problem:${slug}`,
      title,
      status,
      detail,
      ...(errors ? { errors } : {}),
    };
  }
}

type FieldError = { path: string; message: string };

export function invalid(errors: FieldError[]): Refusal {
  const detail = errors.map(({ path, message }) => (path ? `${path}: ${message}` : message)).join('; ');
  return new Refusal(400, 'invalid', 'Some values are not accepted', detail, errors);
}

export const malformed = (detail: string) =>
  new Refusal(400, 'malformed', 'The request could not be read', detail);

export const notSignedIn = () =>
  new Refusal(
    401,
    'not-signed-in',
    'Sign in first',
    'There is no session, or it has ended. Sign in again; nothing was stored.',
  );

export const notAllowed = (detail = 'Your roles do not allow this here.') =>
  new Refusal(403, 'not-allowed', 'Not allowed', detail);

export function notFound(thing: string, path: string, value: string): Refusal {
  const message = `there is no ${thing} with the id ${JSON.stringify(value)}`;
  return new Refusal(404, 'not-found', `No such ${thing}`, `${path}: ${message}`, [{ path, message }]);
}

/** The state of things does not allow it: the bed is taken, the stay has ended. */
export function conflict(detail: string, errors?: FieldError[]): Refusal {
  return new Refusal(409, 'conflict', 'Not possible as things stand', detail, errors);
}

/** Somebody else changed it first; says who and when, so that the two can talk. */
export function staleVersion({
  thing,
  given,
  current,
  by,
  at,
}: {
  thing: string;
  given: number;
  current: number;
  by: string | null;
  at: string | null;
}): Refusal {
  const who = by && at ? ` ${by} changed it at ${at}.` : '';
  const detail = `The ${thing} is at version ${current}, not ${given}.${who} Read it again before replacing it; nothing was stored.`;
  return new Refusal(409, 'stale-version', 'Changed by somebody else', detail, [
    { path: 'If-Match', message: `the current version is ${current}` },
  ]);
}

export const versionNeeded = () =>
  new Refusal(
    428,
    'version-needed',
    'Which version?',
    'If-Match must carry the version that was read, such as "3".',
    [{ path: 'If-Match', message: 'the version that was read, such as "3"' }],
  );

export const keyReused = () =>
  new Refusal(
    422,
    'key-reused',
    'Key already used',
    'This Idempotency-Key was used for another request; make a new one for a new entry.',
    [{ path: 'Idempotency-Key', message: 'was used with another body' }],
  );
