import type { Problem } from '@windrow/ventilation/contract/problem';
import type { ErrorRequestHandler, RequestHandler } from 'express';
import type { Logger } from 'pino';
import { malformed, notFound, Refusal } from '../../errors.ts';
import { isNotSaving } from '../../queries/not-saving.ts';

export const BODY_LIMIT_KB = 64;

export const noSuchRoute: RequestHandler = (req) => {
  throw notFound('address', 'path', req.path);
};

/** The one place that turns an error into an answer. What was not expected says nothing of its inside. */
export function answerProblems(log: Logger): ErrorRequestHandler {
  return (error: unknown, req, res, next) => {
    if (res.headersSent) {
      next(error);
      return;
    }
    const problem = toProblem(error);
    if (problem.status >= 500)
      log.error({ err: error, method: req.method, path: req.route?.path ?? null }, 'a request failed');
    res.status(problem.status).type('application/problem+json').send(JSON.stringify(problem));
  };
}

function toProblem(error: unknown): Problem {
  if (error instanceof Refusal) return error.problem;
  const { type, code } = isCoded(error) ? error : { type: undefined, code: undefined };
  if (type === 'entity.too.large') {
    return {
      type: 'urn:windrow:problem:too-large',
      title: 'Too large',
      status: 413,
      detail: `A request body is at most ${BODY_LIMIT_KB} kB.`,
      errors: [{ path: 'body', message: `must be at most ${BODY_LIMIT_KB} kB` }],
    };
  }
  if (type === 'entity.parse.failed') return malformed('The body is not well-formed JSON.').problem;
  if (
    type?.startsWith('entity.') ||
    type?.startsWith('encoding.') ||
    type?.startsWith('charset.') ||
    type?.startsWith('request.')
  ) {
    return malformed('The body must be JSON in UTF-8.').problem;
  }
  if (isCoded(error) && (error.status === 404 || code === 'ENOENT'))
    return notFound('file', 'path', 'asked for').problem;
  if (error instanceof URIError) return malformed('The address is not well-formed.').problem;
  if (isNotSaving(error)) {
    return {
      type: 'urn:windrow:problem:not-saving',
      title: 'Not saving',
      status: 507,
      detail:
        'The server cannot write to its disk. Nothing was stored; keep what you typed and tell the administrator.',
    };
  }
  return {
    type: 'urn:windrow:problem:internal',
    title: 'Internal error',
    status: 500,
    detail:
      'Something failed on the server. Nothing was stored; try again, and tell the administrator if it stays.',
  };
}

function isCoded(error: unknown): error is { type?: string; code?: string; status?: number } {
  return (
    typeof error === 'object' && error !== null && ('type' in error || 'code' in error || 'status' in error)
  );
}
