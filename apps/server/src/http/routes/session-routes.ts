import { FirstAdministrator, Session, SignIn, Start } from '@windrow/ventilation/contract/session';
import { z } from 'zod';
import type { Deps } from '../../deps.ts';
import { notSignedIn, Refusal } from '../../errors.ts';
import { insertAudit } from '../../queries/audit.ts';
import { anyPerson } from '../../queries/people.ts';
import { houseRevision } from '../../queries/units.ts';
import { makeFirstAdministrator } from '../../services/set-up.ts';
import type { SignedIn } from '../../services/sign-ins.ts';
import { type Route, session } from '../route.ts';

const Health = z.object({
  status: z.literal('ok'),
  revision: z.number().int(),
  serverTime: z.string(),
  version: z.string(),
});

export const sessionRoutes: Route[] = [
  session({
    method: 'get',
    path: '/api/health',
    summary: 'Whether the service answers, with its time and revision',
    needs: 'nobody',
    response: Health,
    handle: async ({ deps }) => ({
      status: 'ok',
      revision: await houseRevision(deps.db),
      serverTime: deps.now().toISOString(),
      version: deps.version,
    }),
  }),
  session({
    method: 'get',
    path: '/api/start',
    summary: 'What a screen must know before anybody signs in',
    needs: 'nobody',
    response: Start,
    handle: async ({ deps }) => ({
      needsAdministrator: !(await anyPerson(deps.db)),
      demonstration: deps.demonstration,
      serverTime: deps.now().toISOString(),
    }),
  }),
  session({
    method: 'post',
    path: '/api/start/administrator',
    summary: 'Make the first administrator of an empty house',
    needs: 'nobody',
    body: FirstAdministrator,
    response: Session,
    status: 201,
    handle: async ({ deps, input, res }) =>
      openSession(deps, await makeFirstAdministrator(deps, input.body), res),
  }),
  session({
    method: 'post',
    path: '/api/session',
    summary: 'Sign in',
    needs: 'nobody',
    body: SignIn,
    response: Session,
    status: 201,
    handle: async ({ deps, person, input, res }) => {
      const personId = await deps.signIns.personFor(input.body);
      await insertAudit(deps.db, {
        at: deps.now().toISOString(),
        person_id: personId,
        act: 'sign in',
        unit_id: null,
        subject: null,
        outcome: personId ? 'done' : 'refused',
      });
      // The same words for an unknown name, a wrong password and a disabled person.
      if (!personId)
        throw new Refusal(
          401,
          'wrong-sign-in',
          'Not signed in',
          'The user name or the password is not right.',
        );
      // One browser, one session: whoever was signed in here before is so no longer.
      if (person) {
        await deps.signIns.close(person.sessionId);
        deps.live.drop(person.sessionId);
      }
      return openSession(deps, personId, res);
    },
  }),
  session({
    method: 'get',
    path: '/api/session',
    summary: 'Who am I',
    needs: 'anybody-signed-in',
    response: Session,
    handle: async ({ deps, person }) => {
      if (!person) throw notSignedIn();
      return toSession(deps, person);
    },
  }),
  session({
    method: 'delete',
    path: '/api/session',
    summary: 'Sign out',
    needs: 'anybody-signed-in',
    response: null,
    status: 204,
    handle: async ({ deps, person, res }) => {
      if (!person) throw notSignedIn();
      res.appendHeader('Set-Cookie', await deps.signIns.close(person.sessionId));
      deps.live.drop(person.sessionId);
    },
  }),
];

async function openSession(
  deps: Deps,
  personId: string,
  res: { appendHeader: (name: string, value: string) => unknown },
): Promise<Session> {
  const { cookie } = await deps.signIns.open(personId);
  res.appendHeader('Set-Cookie', cookie);
  const { person } = await deps.signIns.whoIs(cookie);
  if (!person) throw notSignedIn();
  return toSession(deps, person);
}

function toSession(
  { demonstration }: Deps,
  { personId, username, displayName, initials, grants, expiresAt }: SignedIn,
): Session {
  return {
    person: { personId, username, displayName, initials },
    grants,
    expiresAt,
    demonstration,
  };
}
