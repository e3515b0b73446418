import { createHash } from 'node:crypto';
import type { Changed } from '@windrow/ventilation/contract/live';
import type { Knex } from 'knex';
import type { Deps, Tell } from '../deps.ts';
import { keyReused } from '../errors.ts';
import { insertAudit } from '../queries/audit.ts';
import { answerForKey, insertKey } from '../queries/idempotency-keys.ts';
import { deleteSessionsOf } from '../queries/session-adapter.ts';
import { rebuildBed } from './rebuild-bed.ts';
import type { SignedIn } from './sign-ins.ts';

/** One write under way: everything in it commits together, or nothing does. */
export type Write = {
  trx: Knex.Transaction;
  person: SignedIn;
  /** One instant for the whole write. */
  now: string;
  /** Builds a bed's row anew from the facts, with the unit's next revision, to be told after the commit. */
  bedChanged: (bedId: string) => Promise<Tell['beds'][number]>;
  changed: (changed: Changed) => void;
  /** Signs a person out everywhere, but from the session that asks for it; connections end after the commit. */
  signOut: (personId: string) => Promise<void>;
  audit: (entry: { act: string; unitId: string | null; subject: string | null }) => Promise<void>;
};

export type Answer = { status: number; body: unknown };

/**
 * Carries out a write once: the same key with the same request answers with the first result, and
 * another request under that key is refused. Tells the screens only after the commit, and only once.
 */
export async function writeOnce(
  deps: Deps,
  request: { person: SignedIn; key: string; fingerprint: string },
  act: (write: Write) => Promise<Answer>,
): Promise<Answer> {
  const tell: Tell = { beds: [], changed: [], dropped: [] };
  const requestHash = createHash('sha256').update(request.fingerprint).digest('base64url');
  const answer = await deps.db.transaction(async (trx) => {
    const first = await answerForKey(trx, { personId: request.person.personId, key: request.key });
    if (first) {
      if (first.request_hash !== requestHash) throw keyReused();
      return { status: first.status, body: JSON.parse(first.response) as unknown };
    }
    const write = beginWrite(deps, { trx, person: request.person, tell });
    const done = await act(write);
    await insertKey(trx, {
      person_id: request.person.personId,
      key: request.key,
      request_hash: requestHash,
      status: done.status,
      response: JSON.stringify(done.body),
      created_at: write.now,
    });
    return done;
  });
  deps.live.tell(tell);
  return answer;
}

/** The tools of one write; also used by the demonstration's filling and by commands, which have no request. */
export function beginWrite(
  deps: Pick<Deps, 'now'>,
  { trx, person, tell }: { trx: Knex.Transaction; person: SignedIn; tell: Tell },
): Write {
  const now = deps.now().toISOString();
  return {
    trx,
    person,
    now,
    async bedChanged(bedId) {
      const bed = await rebuildBed(trx, { bedId, now });
      const changed = { revision: bed.revision, unitId: bed.unitId, bed };
      tell.beds.push(changed);
      return changed;
    },
    changed: (changed) => void tell.changed.push(changed),
    async signOut(personId) {
      const except = personId === person.personId ? person.sessionId : null;
      tell.dropped.push(...(await deleteSessionsOf(trx, personId, { except })));
    },
    audit: ({ act, unitId, subject }) =>
      insertAudit(trx, {
        at: now,
        person_id: person.personId,
        act,
        unit_id: unitId,
        subject,
        outcome: 'done',
      }),
  };
}
