import { isDeepStrictEqual } from 'node:util';
import type { Bed } from '@windrow/ventilation/contract/board';
import type { Knex } from 'knex';
import { boardRow } from '../queries/board-rows.ts';
import { allUnits, bedsOfUnit } from '../queries/units.ts';
import { bedFromFacts, rebuildBed } from './rebuild-bed.ts';

/** Compares every stored row with what the facts give, and stores anew those that differ. */
export async function rebuildAllBeds(
  db: Knex,
  { now }: { now: string },
): Promise<{ beds: number; differed: string[] }> {
  return db.transaction(async (trx) => {
    let beds = 0;
    const differed: string[] = [];
    for (const unit of await allUnits(trx)) {
      for (const row of await bedsOfUnit(trx, unit.id)) {
        beds += 1;
        const stored = await boardRow(trx, row.id);
        const fresh = await bedFromFacts(trx, { row, revision: stored?.revision ?? 0, now });
        if (stored && isDeepStrictEqual(withoutEnded(stored, now), JSON.parse(JSON.stringify(fresh))))
          continue;
        differed.push(`${unit.name} ${row.label}`);
        await rebuildBed(trx, { bedId: row.id, now });
      }
    }
    return { beds, differed };
  });
}

/** A row keeps an assignment past its shift's end, where nobody shows it any more. */
function withoutEnded(bed: Bed, now: string): Bed {
  return { ...bed, assignments: bed.assignments.filter(({ endsAt }) => endsAt > now) };
}
