import { Session, Start } from '@windrow/ventilation/contract/session';
import { AuditEntry, Person } from '@windrow/ventilation/contract/setup';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { routes } from '../../apps/server/src/http/routes.ts';
import { Caller } from '../support/caller.ts';
import { type House, openHouse, PASSWORD } from '../support/house.ts';
import { listen } from '../support/listening.ts';
import { listOf } from '../support/shapes.ts';
import { storedBesidesAsking } from '../support/stored.ts';

let house: House;
beforeEach(async () => {
  house = await openHouse();
});
afterEach(() => house.close());

const disable = (username: string, version = 1) =>
  house.as('administrator').patch(`/api/people/${house.personId(username)}`, { disabled: true }, { version });

/** The one cookie of an answer, as its parts. */
function cookieOf(headers: Headers): { name: string; value: string; attributes: string[] } {
  const [cookie, ...more] = headers.getSetCookie();
  expect(more).toEqual([]);
  const [pair = '', ...attributes] = (cookie ?? '').split('; ');
  const [name = '', value = ''] = pair.split('=');
  return { name, value, attributes };
}

describe('signing in', () => {
  it('answers with who it is and what they may do, and with nothing of the password', async () => {
    const reply = await house.anybody().signIn('therapist', PASSWORD);
    const { person, grants, demonstration } = reply.as(Session);
    expect(person).toMatchObject({ username: 'therapist', displayName: 'Person therapist' });
    expect(grants).toEqual([{ role: 'therapist', unitId: house.alder.unitId }]);
    expect(demonstration).toBe(false);
    expect(reply.text).not.toMatch(/argon|hash|password/i);
  });

  it('takes the user name in any case and with spaces about it, the password only as it is', async () => {
    expect((await house.anybody().signIn(' Therapist ', PASSWORD)).status).toBe(201);
    expect((await house.anybody().signIn('therapist', PASSWORD.toUpperCase())).status).toBe(401);
    expect((await house.anybody().signIn('therapist', `${PASSWORD} `)).status).toBe(401);
  });

  it('says the same words of an unknown name, a wrong password and a disabled person', async () => {
    await disable('therapist2');
    const replies = [
      await house.anybody().signIn('nobody', PASSWORD),
      await house.anybody().signIn('therapist', 'wrong horse battery'),
      await house.anybody().signIn('therapist2', PASSWORD),
    ];
    expect(new Set(replies.map(({ text }) => text)).size).toBe(1);
    for (const { status, headers } of replies) {
      expect(status).toBe(401);
      expect(headers.getSetCookie()).toEqual([]);
    }
  });

  it('takes comparable time over an unknown name, a wrong password and a disabled person', async () => {
    await disable('therapist2');
    const tries = [
      ['nobody', PASSWORD],
      ['therapist', 'wrong horse battery'],
      ['therapist2', PASSWORD],
    ] as const;
    const times = tries.map((): number[] => []);
    // In turns, so that a busy moment of the machine falls on all alike; under ten, or the limit answers.
    for (let round = 0; round < 8; round += 1) {
      for (const [index, [username, password]] of tries.entries()) {
        const from = performance.now();
        await house.anybody().signIn(username, password);
        times[index]?.push(performance.now() - from);
      }
    }
    // The shortest of eight is the work itself. Without hashing it is some twentieth of this.
    const shortest = times.map((each) => Math.min(...each));
    expect(Math.max(...shortest) / Math.min(...shortest)).toBeLessThan(5);
  });

  it('is written to the audit trail, refused or not', async () => {
    await house.anybody().signIn('therapist', 'wrong horse battery');
    await house.anybody().signIn('therapist', PASSWORD);
    const { items } = (await house.as('administrator').get('/api/audit')).as(listOf(AuditEntry));
    expect(items.slice(0, 2)).toMatchObject([
      { act: 'sign in', outcome: 'done', displayName: 'Person therapist' },
      { act: 'sign in', outcome: 'refused', displayName: null },
    ]);
  });

  it('ends the session that the browser had before, and its open screens', async () => {
    const tablet = house.anybody();
    await tablet.signIn('therapist', PASSWORD);
    const before = new Caller(house.server.url, tablet.cookieHeader);
    const screen = await listen(before);
    await tablet.signIn('charge', PASSWORD);
    expect((await tablet.get('/api/session')).as(Session).person.username).toBe('charge');
    expect((await before.get('/api/session')).status).toBe(401);
    expect(await screen.ended()).toBe('io server disconnect');
  });
});

describe('ten wrong tries', () => {
  const wrong = async (username: string, times: number) => {
    for (let n = 0; n < times; n += 1) {
      expect((await house.anybody().signIn(username, 'wrong horse battery')).status).toBe(401);
    }
  };

  it('for one name stop the eleventh, even with the right password, and no other name', async () => {
    await wrong('therapist', 10);
    const stopped = await house.anybody().signIn('therapist', PASSWORD);
    expect(stopped.status).toBe(429);
    expect(stopped.problem.detail).toContain('wait 15 minutes');
    expect(stopped.headers.get('retry-after')).toMatch(/^\d+$/);
    // The same name, however it is written.
    expect((await house.anybody().signIn(' THERAPIST', PASSWORD)).status).toBe(429);
    expect((await house.anybody().signIn('charge', PASSWORD)).status).toBe(201);
  });

  it('are counted without the right ones between them', async () => {
    await wrong('therapist', 9);
    for (let n = 0; n < 3; n += 1) {
      expect((await house.anybody().signIn('therapist', PASSWORD)).status).toBe(201);
    }
    await wrong('therapist', 1);
    expect((await house.anybody().signIn('therapist', PASSWORD)).status).toBe(429);
  });
});

describe('the cookie', () => {
  it('is out of the reach of scripts and of other sites', async () => {
    const { headers } = await house.anybody().signIn('therapist', PASSWORD);
    const { name, value, attributes } = cookieOf(headers);
    expect(name).toBe('windrow');
    expect(value.length).toBeGreaterThanOrEqual(40);
    expect(attributes).toEqual(expect.arrayContaining(['HttpOnly', 'SameSite=Strict', 'Path=/']));
    expect(attributes).not.toContain('Secure');
  });

  it('outlives the session: a wall that is kept signed in by its open link gets no new one', async () => {
    const { headers } = await house.anybody().signIn('display', PASSWORD);
    const age = cookieOf(headers).attributes.find((each) => each.startsWith('Max-Age='));
    expect(Number(age?.slice('Max-Age='.length))).toBeGreaterThanOrEqual(400 * 24 * 3600 - 60);
  });

  it('is another at each sign-in', async () => {
    const first = cookieOf((await house.anybody().signIn('therapist', PASSWORD)).headers).value;
    const second = cookieOf((await house.anybody().signIn('therapist', PASSWORD)).headers).value;
    expect(first).not.toBe(second);
  });

  it('made up by somebody opens nothing', async () => {
    for (const cookie of [
      'windrow=aaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaaa',
      'windrow=',
      "windrow=' or 1=1 --",
    ]) {
      expect((await new Caller(house.server.url, cookie).get('/api/session')).status).toBe(401);
    }
  });
});

describe('behind TLS', () => {
  let secure: House;
  beforeAll(async () => {
    secure = await openHouse({ origin: 'https://board.example.org' });
  });
  afterAll(() => secure.close());

  it('the cookie is Secure and bound to the host by its name', async () => {
    const { name, attributes } = cookieOf((await secure.anybody().signIn('therapist', PASSWORD)).headers);
    expect(name).toBe('__Host-windrow');
    expect(attributes).toEqual(expect.arrayContaining(['Secure', 'HttpOnly', 'SameSite=Strict', 'Path=/']));
    expect(attributes.join()).not.toMatch(/domain/i);
  });

  it('browsers are told to come by TLS only', async () => {
    const { headers } = await secure.anybody().get('/api/health');
    expect(headers.get('strict-transport-security')).toMatch(/max-age=31536000/);
  });

  it('only its own origin writes, whatever host the request names', async () => {
    const write = (Origin: string) =>
      secure.anybody().ask('POST', '/api/session', {
        headers: { Origin },
        body: { username: 'therapist', password: PASSWORD },
        key: null,
      });
    expect((await write('https://board.example.org')).status).toBe(201);
    expect((await write(secure.server.url)).status).toBe(403);
    expect((await write('http://board.example.org')).status).toBe(403);
  });
});

describe('a session', () => {
  const sessionRow = () => house.db('sessions').where({ person_id: house.personId('therapist') });
  const inHours = (hours: number) => new Date(Date.now() + hours * 3_600_000).toISOString();

  it('ends with the sign-out, on every screen that it opened', async () => {
    const therapist = house.as('therapist');
    const copy = new Caller(house.server.url, therapist.cookieHeader);
    const screens = [await listen(therapist), await listen(copy, { audience: 'display' })];
    const other = await listen(house.as('charge'));
    const reply = await therapist.ask('DELETE', '/api/session');
    expect(reply.status).toBe(204);
    expect(cookieOf(reply.headers)).toMatchObject({
      value: '',
      attributes: expect.arrayContaining(['Max-Age=0']),
    });
    expect((await copy.get('/api/session')).status).toBe(401);
    for (const screen of screens) expect(await screen.ended()).toBe('io server disconnect');
    expect(other.isOpen).toBe(true);
    other.close();
  });

  it.each([
    ['changed roles', { grants: [{ role: 'clinician', unitId: null }] }],
    ['a new password', { password: 'another horse battery' }],
    ['being disabled', { disabled: true }],
  ])('ends with %s, and so do its screens', async (_, change) => {
    const screen = await listen(house.as('therapist'));
    const { personId } = house;
    const path = `/api/people/${personId('therapist')}`;
    const changed = await house.as('administrator').patch(path, change, { version: 1 });
    expect(changed.as(Person).version).toBe(2);
    expect((await house.as('therapist').get('/api/session')).status).toBe(401);
    expect(await screen.ended()).toBe('io server disconnect');
    await expect(listen(house.as('therapist'))).rejects.toThrow('not signed in');
  });

  it('that is refused a change keeps its screens: nothing ended that did not change', async () => {
    const screen = await listen(house.as('therapist'));
    const path = `/api/people/${house.personId('therapist')}`;
    expect((await house.as('administrator').patch(path, { disabled: true }, { version: 9 })).status).toBe(
      409,
    );
    expect((await house.as('therapist').get('/api/session')).status).toBe(200);
    expect(screen.isOpen).toBe(true);
    screen.close();
  });

  it('is renewed by use', async () => {
    await sessionRow().update({ expires_at: inHours(2) });
    const { headers } = await house.as('therapist').get('/api/session');
    expect(headers.getSetCookie()).toHaveLength(1);
    const [row] = await sessionRow().select('expires_at');
    expect(row.expires_at > inHours(11)).toBe(true);
  });

  it('ends when it is not used', async () => {
    await sessionRow().update({ expires_at: inHours(-0.01) });
    expect((await house.as('therapist').get('/api/session')).status).toBe(401);
    expect(await sessionRow()).toEqual([]);
  });

  it('is not renewed past the end that it was given at sign-in, and says so', async () => {
    const endsAt = inHours(1);
    await sessionRow().update({ expires_at: inHours(0.5), ends_at: endsAt });
    const session = (await house.as('therapist').get('/api/session')).as(Session);
    expect(session.expiresAt <= endsAt).toBe(true);
    const [row] = await sessionRow().select('expires_at');
    expect(row.expires_at <= endsAt).toBe(true);
  });

  it('ends at that end, however much it is used', async () => {
    await sessionRow().update({ expires_at: inHours(10), ends_at: inHours(-0.01) });
    expect((await house.as('therapist').get('/api/session')).status).toBe(401);
  });

  it('of staff ends within 14 hours, that of a display lasts', async () => {
    const ends = async (username: string) =>
      (
        await house
          .db('sessions')
          .where({ person_id: house.personId(username) })
          .first('ends_at')
      ).ends_at;
    expect((await ends('therapist')) < inHours(14.1)).toBe(true);
    expect((await ends('charge')) < inHours(14.1)).toBe(true);
    expect((await ends('display')) > inHours(24 * 399)).toBe(true);
  });
});

describe('the first administrator', () => {
  const second = { username: 'second', displayName: 'Second Root', password: PASSWORD };

  it('is made only once, even when two ask at once', async () => {
    await house.db('idempotency_keys').delete();
    for (const table of ['sessions', 'grants']) await house.db(table).delete();
    const before = await storedBesidesAsking(house.db);
    const replies = await Promise.all(
      [1, 2].map(() => house.anybody().post('/api/start/administrator', second)),
    );
    for (const reply of replies) {
      expect(reply.status).toBe(409);
      expect(reply.headers.getSetCookie()).toEqual([]);
    }
    expect(await storedBesidesAsking(house.db)).toEqual(before);
    expect((await house.anybody().get('/api/start')).as(Start).needsAdministrator).toBe(false);
  });

  it('cannot shut themselves out, nor keep the role in one unit only', async () => {
    const root = await house.db('people').where({ username: 'root' }).first('id');
    const before = await storedBesidesAsking(house.db);
    const changes = [
      { disabled: true },
      { grants: [] },
      { grants: [{ role: 'charge', unitId: null }] },
      { grants: [{ role: 'administrator', unitId: house.alder.unitId }] },
    ];
    for (const change of changes) {
      const reply = await house.as('administrator').patch(`/api/people/${root.id}`, change, { version: 1 });
      expect(reply.status).toBe(409);
    }
    expect(await storedBesidesAsking(house.db)).toEqual(before);
    expect((await house.as('administrator').get('/api/people')).status).toBe(200);
  });
});

describe('every answer', () => {
  it('carries the headers that keep a browser from running or framing anything else', async () => {
    for (const path of ['/api/health', '/api/session', '/api/no-such-address', '/']) {
      const { headers } = await fetch(`${house.server.url}${path}`);
      expect(headers.get('content-security-policy')?.split(';').sort()).toEqual(
        [
          "default-src 'none'",
          "script-src 'self'",
          "style-src 'self'",
          "font-src 'self'",
          "img-src 'self' data:",
          "connect-src 'self'",
          "manifest-src 'self'",
          "form-action 'self'",
          "base-uri 'none'",
          "frame-ancestors 'none'",
          "object-src 'none'",
        ].sort(),
      );
      expect(headers.get('x-content-type-options')).toBe('nosniff');
      expect(headers.get('x-frame-options')).toBe('DENY');
      expect(headers.get('referrer-policy')).toBe('no-referrer');
      expect(headers.get('cross-origin-opener-policy')).toBe('same-origin');
      expect(headers.get('cross-origin-resource-policy')).toBe('same-origin');
      expect(headers.get('x-powered-by')).toBeNull();
      expect(headers.get('access-control-allow-origin')).toBeNull();
      // Over plain HTTP it would do nothing, or lock a test address in.
      expect(headers.get('strict-transport-security')).toBeNull();
    }
  });

  it('of the service is kept by no cache, whether it is a refusal or not', async () => {
    for (const { method, path } of routes) {
      const address = path.replace(/:\w+/g, 'x');
      const { headers } = await fetch(`${house.server.url}${address}`, { method: method.toUpperCase() });
      expect(headers.get('cache-control'), `${method} ${path}`).toBe('no-store');
    }
  });
});

describe('a display', () => {
  it('stays signed in for its whole term, so that a wall that was off overnight comes back by itself', async () => {
    const { expiresAt } = (await house.as('display').get('/api/session')).as(Session);
    expect(Date.parse(expiresAt) - house.clock.now.getTime()).toBeGreaterThan(300 * 86_400_000);
  });
});

it('a person who changes their own password keeps this session and ends their others', async () => {
  const other = house.anybody();
  await other.signIn('root', PASSWORD);
  expect((await other.get('/api/session')).status).toBe(200);
  const { items } = (await house.as('administrator').get('/api/people')).as(listOf(Person));
  const root = items.find(({ username }) => username === 'root');
  const changed = await house
    .as('administrator')
    .patch(
      `/api/people/${root?.personId}`,
      { password: 'another long pass phrase' },
      { version: root?.version ?? 0 },
    );
  expect(changed.status).toBe(200);
  expect((await other.get('/api/session')).status).toBe(401);
  expect((await house.as('administrator').get('/api/session')).status).toBe(200);
});
