import type { Board } from '@windrow/ventilation/contract/board';
import type { BedChanged } from '@windrow/ventilation/contract/live';

/**
 * A board with one changed bed put into it. Revisions of a unit are consecutive: a message that is not
 * the very next one cannot be applied, and `null` says that the board must be read again.
 * A message that the board already contains leaves it as it is.
 */
export function applyBedChanged(board: Board, { revision, unitId, bed }: BedChanged): Board | null {
  if (unitId !== board.unit.unitId) return board;
  if (revision <= board.revision) return board;
  if (revision !== board.revision + 1) return null;
  // A bed that the board has never heard of was added to the floor plan.
  if (!board.beds.some(({ bedId }) => bedId === bed.bedId)) return null;
  return { ...board, revision, beds: board.beds.map((held) => (held.bedId === bed.bedId ? bed : held)) };
}
