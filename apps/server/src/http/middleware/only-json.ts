import type { RequestHandler } from 'express';
import { Refusal } from '../../errors.ts';

/** A body of another type would be passed over, and the request taken for one without a body. */
export const onlyJson: RequestHandler = (req, _res, next) => {
  // `is` answers null where there is no body, and false where its type is another.
  if (req.is('application/json') === false) {
    const message = `must be application/json, not ${JSON.stringify(req.get('Content-Type') ?? null)}`;
    throw new Refusal(415, 'not-json', 'Not JSON', `Content-Type ${message}.`, [
      { path: 'Content-Type', message },
    ]);
  }
  next();
};
