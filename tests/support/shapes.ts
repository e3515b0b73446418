import { Bed } from '@windrow/ventilation/contract/board';
import { Id } from '@windrow/ventilation/contract/instant';
import { RecordEntry } from '@windrow/ventilation/contract/observations';
import { Stay } from '@windrow/ventilation/contract/stays';
import { z } from 'zod';

/** Answers that the contract page names and no schema of the shared package holds. */
export const Placed = z.object({ stay: Stay, bed: Bed });
export const Moved = z.object({ stay: Stay, beds: z.array(Bed) });
export const Recorded = z.object({
  observationId: Id,
  revision: z.number().int().nullable(),
  bed: Bed.nullable(),
});
export const RecordPage = listOf(RecordEntry);

export function listOf<S extends z.ZodType>(item: S) {
  return z.object({ items: z.array(item), nextCursor: z.string().nullable() });
}
