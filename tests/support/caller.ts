import { randomUUID } from 'node:crypto';
import { Problem } from '@windrow/ventilation/contract/problem';
import type { z } from 'zod';
import { requireAsDescribed } from './described.ts';

/** What came back. The body is not believed until a schema has read it. */
export class Reply {
  constructor(
    readonly status: number,
    readonly body: unknown,
    readonly headers: Headers,
    /** The very text, for tests that search it for what must not be there. */
    readonly text: string,
  ) {}

  as<S extends z.ZodType>(schema: S): z.infer<S> {
    if (this.status >= 400) throw new Error(`answered ${this.status}: ${this.text}`);
    return schema.parse(this.body);
  }

  get problem(): Problem {
    return Problem.parse(this.body);
  }
}

export type Asking = {
  body?: unknown;
  /** Sent as it is, in place of a body. */
  raw?: string;
  /** Null: no key at all. */
  key?: string | null;
  /** A number is sent as `"n"`, a text as it is. */
  version?: number | string;
  headers?: Record<string, string>;
};

/**
 * Somebody who asks the real service over HTTP as a browser of our own page would. Every answer is held
 * against the description of its route, whatever the test is about.
 */
export class Caller {
  constructor(
    readonly url: string,
    private cookie: string | null = null,
  ) {}

  async ask(method: string, path: string, { body, raw, key, version, headers = {} }: Asking = {}) {
    const sent: Record<string, string> = { ...headers };
    if (this.cookie) sent.cookie = this.cookie;
    if (method !== 'GET' && key !== null) sent['Idempotency-Key'] = key ?? randomUUID();
    if (version !== undefined) sent['If-Match'] = typeof version === 'number' ? `"${version}"` : version;
    const text = raw ?? (body === undefined ? undefined : JSON.stringify(body));
    if (text !== undefined) sent['Content-Type'] ??= 'application/json';
    const response = await fetch(`${this.url}${path}`, { method, headers: sent, body: text });
    const answer = await response.text();
    const reply = new Reply(
      response.status,
      answer === '' ? null : JSON.parse(answer),
      response.headers,
      answer,
    );
    requireAsDescribed(method, path, reply);
    return reply;
  }

  get = (path: string) => this.ask('GET', path);
  post = (path: string, body: unknown, more: Asking = {}) => this.ask('POST', path, { body, ...more });
  put = (path: string, body: unknown, more: Asking = {}) => this.ask('PUT', path, { body, ...more });
  patch = (path: string, body: unknown, more: Asking = {}) => this.ask('PATCH', path, { body, ...more });

  async signIn(username: string, password: string): Promise<Reply> {
    const reply = await this.ask('POST', '/api/session', { body: { username, password }, key: null });
    this.keepCookie(reply);
    return reply;
  }

  /** As a browser does: the last cookie of the name stands. */
  keepCookie({ headers }: Reply): void {
    const set = headers.getSetCookie().at(-1);
    if (set) this.cookie = set.split(';')[0] ?? null;
  }

  get cookieHeader(): string {
    return this.cookie ?? '';
  }
}
