import type { Knex } from 'knex';
import type { Adapter, DatabaseSession, DatabaseUser } from 'lucia';
import { isNotSaving } from './not-saving.ts';

export type SessionRow = { id: string; person_id: string; expires_at: string; ends_at: string };
type PersonOfSession = {
  id: string;
  username: string;
  display_name: string;
  initials: string;
  disabled_at: string | null;
};

/** Lucia's sessions in our tables. A session is renewed by use, but never past the end that it was given at sign-in. */
export function sessionAdapter(db: Knex): Adapter {
  const sessions = () => db<SessionRow>('sessions');
  return {
    async getSessionAndUser(sessionId) {
      const row = await sessions().where({ id: sessionId }).first();
      if (!row) return [null, null];
      const person = await db<PersonOfSession>('people')
        .where({ id: row.person_id })
        .whereNull('disabled_at')
        .first();
      return person ? [toSession(row), toUser(person)] : [null, null];
    },
    async getUserSessions(personId) {
      return (await sessions().where({ person_id: personId })).map(toSession);
    },
    async setSession({ id, userId, expiresAt, attributes }) {
      await sessions().insert({
        id,
        person_id: userId,
        expires_at: expiresAt.toISOString(),
        ends_at: attributes.endsAt,
      });
    },
    async updateSessionExpiration(sessionId, expiresAt) {
      const row = await sessions().where({ id: sessionId }).first();
      if (!row) return;
      const wanted = earlier(expiresAt.toISOString(), row.ends_at);
      // Near its end a session is "renewed" by every request, to the same end.
      if (wanted <= row.expires_at) return;
      try {
        await sessions().where({ id: sessionId }).update({ expires_at: wanted });
      } catch (error) {
        // A board must be readable from a disk that takes nothing more; a later request renews the session.
        if (!isNotSaving(error)) throw error;
      }
    },
    async deleteSession(sessionId) {
      await sessions().where({ id: sessionId }).delete();
    },
    async deleteUserSessions(personId) {
      await sessions().where({ person_id: personId }).delete();
    },
    async deleteExpiredSessions() {
      await sessions().where('expires_at', '<=', new Date().toISOString()).delete();
    },
  };
}

export async function setSessionExpiry(db: Knex, sessionId: string, expiresAt: string): Promise<void> {
  await db<SessionRow>('sessions').where({ id: sessionId }).update({ expires_at: expiresAt });
}

/** Ends the sessions of a person, but for the one that is kept; returns which were ended. */
export async function deleteSessionsOf(
  db: Knex,
  personId: string,
  { except }: { except: string | null },
): Promise<string[]> {
  const ended = await db<SessionRow>('sessions')
    .where({ person_id: personId })
    .whereNot({ id: except ?? '' })
    .select('id');
  await db<SessionRow>('sessions')
    .whereIn(
      'id',
      ended.map(({ id }) => id),
    )
    .delete();
  return ended.map(({ id }) => id);
}

function toSession(row: SessionRow): DatabaseSession {
  return {
    id: row.id,
    userId: row.person_id,
    expiresAt: new Date(earlier(row.expires_at, row.ends_at)),
    attributes: { endsAt: row.ends_at },
  };
}

function earlier(one: string, other: string): string {
  return one < other ? one : other;
}

function toUser({ id, username, display_name, initials }: PersonOfSession): DatabaseUser {
  return { id, attributes: { username, displayName: display_name, initials } };
}
