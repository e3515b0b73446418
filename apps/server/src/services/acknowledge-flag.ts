import { shownBed } from '@windrow/ventilation/board/shown-bed';
import type { Flag } from '@windrow/ventilation/contract/board';
import type { Acknowledgement } from '@windrow/ventilation/contract/observations';
import { conflict } from '../errors.ts';
import type { StayRow } from '../queries/stays.ts';
import { bedById } from '../queries/units.ts';
import { bedFromFacts } from './rebuild-bed.ts';
import { recordObservation, requirePresent } from './record-observation.ts';
import type { Write } from './write.ts';

/**
 * Somebody has looked at a flag and says so. It must be the flag that stands now, with the values that they saw:
 * of others, which came in while they were writing, nobody has looked at anything.
 */
export async function acknowledgeFlag(
  write: Write,
  { stay, entry }: { stay: StayRow; entry: Acknowledgement },
) {
  const flag = await presentFlag(write, { stay, flagId: entry.flagId });
  if (flag.fingerprint !== entry.fingerprint) {
    throw conflict(
      `What this flag rests on has changed; it now says: ${flag.sentence} Look at it again; nothing was stored.`,
      [{ path: 'fingerprint', message: `is of other values; the flag's present one is ${flag.fingerprint}` }],
    );
  }
  // The words of that moment are kept with it, so that the record can be read whatever the rule says later.
  const { short, sentence } = flag;
  return recordObservation(write, { stay, kind: 'acknowledgement', entry: { ...entry, short, sentence } });
}

async function presentFlag(
  { trx, now }: Write,
  { stay, flagId }: { stay: StayRow; flagId: string },
): Promise<Flag> {
  const row = await bedById(trx, requirePresent(stay));
  if (!row) throw new Error(`stay ${stay.id} has no bed`);
  const { bed } = shownBed({ bed: await bedFromFacts(trx, { row, revision: 0, now }), now });
  const flags = bed.stay?.flags ?? [];
  const flag = flags.find(({ id }) => id === flagId);
  if (flag) return flag;
  const present = flags.map(({ id }) => id).join(', ') || 'none';
  throw conflict('This flag is not raised any more; there is nothing to acknowledge. Nothing was stored.', [
    { path: 'flagId', message: `is not raised at this bed; the flags raised now: ${present}` },
  ]);
}
