import type { Happening } from '@windrow/ventilation/contract/observations';
import type { Trial } from '@windrow/ventilation/contract/readiness';
import { trialsOf } from '@windrow/ventilation/readiness/trials';
import type { Knex } from 'knex';
import { allFacts } from '../queries/stay-facts.ts';

/** The breathing trials of a stay, newest first, from the happenings that hold. */
export async function readTrials(db: Knex, stayId: string): Promise<{ items: Trial[]; nextCursor: null }> {
  const trials = trialsOf(await allFacts<Happening>(db, { stayId, kind: 'happening' }));
  return { items: trials.map((trial) => ({ ...trial, criteria: [...trial.criteria] })), nextCursor: null };
}
