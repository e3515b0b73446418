import { Button } from '@windrow/ui/controls/button';
import { Notice } from '@windrow/ui/controls/notice';
import { differences } from '@windrow/ventilation/assignment/places';
import type { Assignment, AssignmentPlace } from '@windrow/ventilation/contract/shifts';
import { formatMoment } from '@windrow/ventilation/format/clock';

/** Somebody changed the same assignment: who and when, what differs bed by bed, and the two ways on. */
export function ConflictPanel({
  theirs,
  mine,
  now,
  timeZone,
  labelOf,
  isOpen,
  onOpen,
  onTakeTheirs,
  onPutMineOnTop,
}: {
  theirs: Assignment;
  mine: readonly AssignmentPlace[];
  now: number;
  timeZone: string;
  labelOf: (bedId: string) => string;
  /** Folded while beds are still being moved: then it only says so. */
  isOpen: boolean;
  onOpen: () => void;
  onTakeTheirs: () => void;
  onPutMineOnTop: () => void;
}) {
  const who = theirs.changedBy ?? 'Somebody';
  const when = theirs.changedAt ? ` at ${formatMoment(theirs.changedAt, now, timeZone)}` : '';
  const pairs = differences({ theirs: theirs.places, mine });
  return (
    <Notice
      tone="attention"
      isNews
      title={`${who} changed this assignment${when}. Your moves are kept here and are not published.`}
    >
      {!isOpen && (
        <div>
          <Button onClick={onOpen}>See what differs</Button>
        </div>
      )}
      {isOpen && <DifferenceTable pairs={pairs} theirsName={who} nameOf={nameIn(theirs)} labelOf={labelOf} />}
      {isOpen && (
        <div className="flex flex-wrap gap-3">
          <Button onClick={onTakeTheirs}>Take theirs</Button>
          <Button onClick={onPutMineOnTop}>Put mine on top of theirs</Button>
        </div>
      )}
      {isOpen && (
        <p className="text-ink-muted text-sm">
          On top: beds that you moved go where you put them, all others stay as {who} left them. Nothing is
          published until you press Publish.
        </p>
      )}
    </Notice>
  );
}

function DifferenceTable({
  pairs,
  theirsName,
  nameOf,
  labelOf,
}: {
  pairs: ReturnType<typeof differences>;
  theirsName: string;
  nameOf: (place: AssignmentPlace | null) => string;
  labelOf: (bedId: string) => string;
}) {
  return (
    <div className="max-h-80 overflow-auto">
      <table className="w-full max-w-2xl text-left">
        <caption className="sr-only">Beds on which the two differ</caption>
        <thead>
          <tr className="border-ink border-b-2">
            <th scope="col" className="py-2 pr-4">
              Bed
            </th>
            <th scope="col" className="py-2 pr-4">
              {theirsName}
            </th>
            <th scope="col" className="py-2">
              Yours
            </th>
          </tr>
        </thead>
        <tbody>
          {pairs.map(({ bedId, theirs, mine }) => (
            <tr key={bedId} className="border-line border-b">
              <th scope="row" className="py-2 pr-4 font-bold">
                {labelOf(bedId)}
              </th>
              <td className="py-2 pr-4">{nameOf(theirs)}</td>
              <td className="py-2">{nameOf(mine)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function nameIn({ shift }: Assignment) {
  const names = new Map(shift.people.map(({ personId, displayName }) => [personId, displayName]));
  return (place: AssignmentPlace | null): string => {
    if (!place) return 'nobody';
    const name = names.get(place.personId) ?? 'somebody not on this shift';
    const cover = place.coverPersonId ? names.get(place.coverPersonId) : null;
    return cover ? `${name}, cover ${cover}` : name;
  };
}
