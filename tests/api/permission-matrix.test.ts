import { ROLES, type Role } from '@windrow/ventilation/permissions/permissions';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { routes } from '../../apps/server/src/http/routes.ts';
import type { Caller, Reply } from '../support/caller.ts';
import { openHouse } from '../support/house.ts';
import { storedBesidesAsking } from '../support/stored.ts';
import { PROBES } from './permissions/probes.ts';
import { openScene, type Place, type Scene } from './permissions/scene.ts';
import { EXPECTED, type Held, isAllowed } from './permissions/who-may-do-what.ts';

let scene: Scene;
let number = 0;
beforeAll(async () => {
  scene = await openScene(await openHouse());
});
afterAll(() => scene.house.close());

const keys = routes.map(({ method, path }) => `${method.toUpperCase()} ${path}`);

/** Asks, and says whether anything was stored by it. */
async function probe(key: string, { caller, place }: { caller: Caller | null; place: Place }) {
  number += 1;
  const prepare = PROBES[key];
  if (!prepare) throw new Error(`${key} has no probe`);
  const { path, as: instead, after, ...asking } = await prepare({ scene, place, caller, number });
  const before = await storedBesidesAsking(scene.house.db);
  const method = key.slice(0, key.indexOf(' '));
  const reply = await (instead ?? caller ?? scene.house.anybody()).ask(method, path, asking);
  const isSame = JSON.stringify(before) === JSON.stringify(await storedBesidesAsking(scene.house.db));
  return { reply, isSame, after };
}

function requireAllowed({ status, text }: Reply, who: string): void {
  expect([401, 403], `${who} should be allowed, and was answered ${text.slice(0, 200)}`).not.toContain(
    status,
  );
}

/** The four ways to hold a role, seen from the thing that is asked for. */
function holders(role: Role): { held: Held; caller: Caller; place: Place }[] {
  const { inAlder, inHospital, alder, birch } = scene;
  return [
    { held: 'in the unit', caller: inAlder[role], place: alder },
    { held: 'in another unit', caller: inAlder[role], place: birch },
    { held: 'in the hospital', caller: inHospital[role], place: alder },
    { held: 'in the hospital', caller: inHospital[role], place: birch },
  ];
}

describe('the permission table', () => {
  it('has a row for every route, and a route for every row', () => {
    expect(Object.keys(EXPECTED).sort()).toEqual([...keys].sort());
    expect(Object.keys(PROBES).sort()).toEqual([...keys].sort());
    expect(new Set(keys).size).toBe(keys.length);
  });
});

describe.each(keys)('%s', (key) => {
  const expected = EXPECTED[key] ?? { row: 'audit trail', where: 'house' };

  it.each(ROLES)('is answered to a %s by the table, and stores nothing where it is refused', async (role) => {
    for (const { held, ...asker } of holders(role)) {
      const { reply, isSame, after } = await probe(key, asker);
      const who = `a ${role} ${held}`;
      if (isAllowed(expected, role, held)) requireAllowed(reply, who);
      else {
        expect(reply.status, `${who} should be refused, and was answered ${reply.text.slice(0, 200)}`).toBe(
          403,
        );
        expect(isSame, `${who} was refused, and something was stored`).toBe(true);
      }
      if (reply.status < 300) await after?.();
    }
  });

  it('is answered to nobody who has not signed in, unless it is open', async () => {
    const { reply, isSame } = await probe(key, { caller: null, place: scene.alder });
    if (expected === 'open') requireAllowed(reply, 'anybody');
    else {
      expect(reply.status).toBe(401);
      expect(isSame).toBe(true);
      // Nor is a wrong request told what is wrong with it.
      const [method = '', path = ''] = key.split(' ');
      const wrong = method === 'GET' ? {} : { body: { colour: 'blue' }, key: null };
      expect((await scene.house.anybody().ask(method, path, wrong)).status).toBe(401);
    }
  });
});
