import { hash, verify } from '@node-rs/argon2';
import type { Grant } from '@windrow/ventilation/permissions/permissions';
import type { Knex } from 'knex';
import { Lucia, TimeSpan } from 'lucia';
import type { Settings } from '../config/settings.ts';
import { grantsOf, personByUsername } from '../queries/people.ts';
import { sessionAdapter, setSessionExpiry } from '../queries/session-adapter.ts';

export type SignedIn = {
  sessionId: string;
  personId: string;
  username: string;
  displayName: string;
  initials: string;
  grants: Grant[];
  expiresAt: string;
};

type PersonAttributes = { username: string; displayName: string; initials: string };

declare module 'lucia' {
  // biome-ignore lint/style/useConsistentTypeDefinitions: Lucia is told our types by merging into its interface
  interface Register {
    Lucia: ReturnType<typeof makeLucia>;
    DatabaseUserAttributes: PersonAttributes;
    DatabaseSessionAttributes: { endsAt: string };
  }
}

/** argon2id, 19 MiB, two passes, one lane. @source OWASP ASVS 5.0 appendix C. */
const ARGON2ID = { memoryCost: 19456, timeCost: 2, parallelism: 1 };
/** The longest shift with its handover; after it everybody signs in again. */
const STAFF_HOURS = 14;
/** A wall has nobody to sign it in again. */
const DISPLAY_DAYS = 400;

function makeLucia(db: Knex, settings: Settings) {
  const secure = settings.origin?.startsWith('https:') ?? false;
  return new Lucia(sessionAdapter(db), {
    sessionExpiresIn: new TimeSpan(12, 'h'),
    sessionCookie: {
      // `__Host-` binds the cookie to this very host; browsers accept it only over TLS.
      name: secure ? '__Host-windrow' : 'windrow',
      // The server alone ends a session. A cookie that ended with it would leave a wall signed out, whose
      // session is renewed through its open link, where no new cookie can be set.
      expires: false,
      attributes: { secure, sameSite: 'strict', path: '/' },
    },
    getUserAttributes: ({ username, displayName, initials }) => ({ username, displayName, initials }),
    getSessionAttributes: ({ endsAt }) => ({ endsAt }),
  });
}

export type SignIns = ReturnType<typeof signIns>;

/** Passwords and sessions: the one place that knows how people prove who they are. */
export function signIns(db: Knex, settings: Settings) {
  const lucia = makeLucia(db, settings);
  // Checked where there is no such person, so that a wrong name takes as long as a wrong password.
  const nobody = hash('nobody has this password', ARGON2ID);

  return {
    hashPassword: (password: string) => hash(password, ARGON2ID),

    /** The person, or null for an unknown name, a wrong password and a disabled person alike. */
    async personFor({ username, password }: { username: string; password: string }): Promise<string | null> {
      const person = await personByUsername(db, username);
      const isRight = await verify(person?.password_hash ?? (await nobody), password);
      return person && isRight && person.disabled_at === null ? person.id : null;
    },

    /** By the real clock, as everything about sessions: the library knows no other. */
    async open(personId: string) {
      const grants = await grantsOf(db, personId);
      const onlyDisplay = grants.length > 0 && grants.every(({ role }) => role === 'display');
      const endsAt = new Date(
        Date.now() + (onlyDisplay ? DISPLAY_DAYS * 24 : STAFF_HOURS) * 3_600_000,
      ).toISOString();
      const session = await lucia.createSession(personId, { endsAt });
      // A wall that was switched off overnight comes back by itself.
      if (onlyDisplay) await setSessionExpiry(db, session.id, endsAt);
      return { sessionId: session.id, cookie: lucia.createSessionCookie(session.id).serialize() };
    },

    async close(sessionId: string): Promise<string> {
      await lucia.invalidateSession(sessionId);
      return lucia.createBlankSessionCookie().serialize();
    },

    /** Who a cookie header stands for, with a cookie to set where the session was just renewed. */
    async whoIs(
      cookieHeader: string | undefined,
    ): Promise<{ person: SignedIn | null; cookie: string | null }> {
      const sessionId = lucia.readSessionCookie(cookieHeader ?? '');
      if (!sessionId) return { person: null, cookie: null };
      const { session, user } = await lucia.validateSession(sessionId);
      if (!session) return { person: null, cookie: lucia.createBlankSessionCookie().serialize() };
      const { username, displayName, initials } = user;
      return {
        person: {
          sessionId: session.id,
          personId: user.id,
          username,
          displayName,
          initials,
          grants: await grantsOf(db, user.id),
          // A session that was just renewed says when it would end without its own end.
          expiresAt: [session.expiresAt.toISOString(), session.endsAt].sort()[0] ?? session.endsAt,
        },
        cookie: session.fresh ? lucia.createSessionCookie(session.id).serialize() : null,
      };
    },

    deleteExpired: () => lucia.deleteExpiredSessions(),
  };
}
