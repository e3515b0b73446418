import { randomUUID } from 'node:crypto';
import { readSettings } from '../../apps/server/src/config/settings.ts';
import { type Running, startServer } from '../../apps/server/src/start-server.ts';
import type { Role } from '../../packages/ventilation/src/permissions/permissions.ts';

const PASSWORD = 'correct horse battery';

export type Reply<Body = any> = { status: number; body: Body; headers: Headers };

/** Somebody signed in, who asks the real service over HTTP as a browser of our own page would. */
export class Caller {
  constructor(
    readonly url: string,
    private cookie: string | null = null,
  ) {}

  async ask(method: string, path: string, options: { body?: unknown; key?: string | null; version?: number | string; headers?: Record<string, string>; raw?: string } = {}): Promise<Reply> {
    const headers: Record<string, string> = { ...(this.cookie ? { cookie: this.cookie } : {}), ...options.headers };
    const isWrite = method !== 'GET';
    if (isWrite && options.key !== null) headers['Idempotency-Key'] = options.key ?? randomUUID();
    if (options.version !== undefined) headers['If-Match'] = typeof options.version === 'number' ? `"${options.version}"` : options.version;
    const body = options.raw ?? (options.body === undefined ? undefined : JSON.stringify(options.body));
    if (body !== undefined) headers['Content-Type'] ??= 'application/json';
    const response = await fetch(`${this.url}${path}`, { method, headers, body });
    const text = await response.text();
    return { status: response.status, body: text ? JSON.parse(text) : null, headers: response.headers };
  }

  get = (path: string) => this.ask('GET', path);
  post = (path: string, body: unknown, options: { key?: string | null; version?: number } = {}) => this.ask('POST', path, { body, ...options });
  put = (path: string, body: unknown, options: { key?: string; version?: number } = {}) => this.ask('PUT', path, { body, ...options });
  patch = (path: string, body: unknown, options: { key?: string; version?: number } = {}) => this.ask('PATCH', path, { body, ...options });

  async signIn(username: string, password = PASSWORD): Promise<Reply> {
    const reply = await this.ask('POST', '/api/session', { body: { username, password }, key: null });
    this.keepCookie(reply);
    return reply;
  }

  keepCookie({ headers }: Reply): void {
    const set = headers.get('set-cookie');
    if (set) this.cookie = set.split(';')[0] ?? null;
  }

  get cookieHeader(): string {
    return this.cookie ?? '';
  }
}

export type House = Awaited<ReturnType<typeof openHouse>>;

/**
 * A small house with a real server on a free port and a real database: units Alder (four beds) and Birch
 * (two), and everybody that the roles name. `clock` is the server's, and can be set.
 */
export async function openHouse({ database = ':memory:' }: { database?: string } = {}) {
  const clock = { now: new Date('2026-03-05T08:00:00.000Z') };
  const settings = { ...readSettings({}), port: 0, database, logLevel: 'silent' as const };
  const server: Running = await startServer(settings, { version: 'test', publicFolder: '/nowhere', now: () => clock.now });
  const admin = new Caller(server.url);
  admin.keepCookie(await admin.post('/api/start/administrator', { username: 'root', displayName: 'Rana Oduya', password: PASSWORD }, { key: null }));

  const unit = async (name: string, beds: number) => {
    const { unitId } = (await admin.post('/api/units', { name, timeZone: 'Europe/London' })).body;
    const bedIds: string[] = [];
    for (let n = 1; n <= beds; n += 1) {
      const bed = await admin.post(`/api/units/${unitId}/beds`, { label: String(n).padStart(2, '0'), row: 1, column: n });
      bedIds.push(bed.body.bedId);
    }
    return { unitId: unitId as string, bedIds };
  };
  const alder = await unit('Alder', 4);
  const birch = await unit('Birch', 2);

  const people = new Map<string, { personId: string; caller: Caller }>();
  const addPerson = async (username: string, grants: { role: Role; unitId: string | null }[]) => {
    const added = await admin.post('/api/people', { username, displayName: `Person ${username}`, initials: username.slice(0, 2), password: PASSWORD, grants });
    const caller = new Caller(server.url);
    await caller.signIn(username);
    people.set(username, { personId: added.body.personId, caller });
    return caller;
  };
  for (const role of ['therapist', 'charge', 'display'] as const) await addPerson(role, [{ role, unitId: alder.unitId }]);
  await addPerson('therapist2', [{ role: 'therapist', unitId: alder.unitId }]);
  await addPerson('birch-therapist', [{ role: 'therapist', unitId: birch.unitId }]);
  for (const role of ['supervisor', 'clinician', 'biomedical'] as const) await addPerson(role, [{ role, unitId: null }]);

  const as = (username: string): Caller => {
    if (username === 'administrator') return admin;
    const person = people.get(username);
    if (!person) throw new Error(`nobody is called ${username}`);
    return person.caller;
  };
  return {
    server, clock, alder, birch, as, addPerson, password: PASSWORD,
    personId: (username: string) => people.get(username)?.personId ?? '',
    anybody: () => new Caller(server.url),
    /** Minutes later, by the server's clock. */
    later: (minutes: number) => {
      clock.now = new Date(clock.now.getTime() + minutes * 60_000);
    },
    ago: (minutes: number) => new Date(clock.now.getTime() - minutes * 60_000).toISOString(),
    close: () => server.stop(),
  };
}
