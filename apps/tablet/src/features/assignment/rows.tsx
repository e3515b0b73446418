import { type Load, nobodyHas } from '@windrow/ventilation/assignment/loads';
import { holderOf } from '@windrow/ventilation/assignment/places';
import type { AssignmentPlace, ShiftPerson } from '@windrow/ventilation/contract/shifts';
import type { ReactNode } from 'react';
import { FixedBlock, type Held, MovableBlock } from './bed-block.tsx';
import type { BedWork } from './bed-work.ts';
import { NOBODY } from './drag/place-id.ts';
import { NobodyTray } from './nobody-tray.tsx';
import { BlockSlot, Ghost, PersonRow } from './person-row.tsx';
import { scaleOf } from './scale.ts';

export type CarryProps = {
  people: readonly ShiftPerson[];
  places: readonly AssignmentPlace[];
  work: readonly BedWork[];
  /** Not for those who only look. */
  mayMove: boolean;
  onPress: (bedId: string) => void;
};

type RowsProps = CarryProps & {
  carried: { bedId: string; over: string | null } | null;
  loadsNow: readonly Load[];
  /** With the carried bed where it hangs. */
  loadsSeen: readonly Load[];
  minutesByBed: ReadonlyMap<string, number>;
};

/** The rows and the tray as they are, with a carried bed shown where it hangs. */
export function Rows({
  people,
  places,
  work,
  mayMove,
  onPress,
  carried,
  loadsNow,
  loadsSeen,
  minutesByBed,
}: RowsProps) {
  const scaleMinutes = scaleOf({ loads: loadsSeen, minutesByBed });
  const workById = new Map(work.map((each) => [each.bedId, each]));
  const loose = nobodyHas({ people, places, minutesByBed });
  const hangsOver = (placeId: string) => carried?.over === placeId;
  const isNew = (placeId: string) =>
    carried !== null && hangsOver(placeId) && (holderOf(places, carried.bedId) ?? NOBODY) !== placeId;

  function block(bedId: string, holder: string): ReactNode {
    const held = heldBy({ bedId, holder, places, people });
    const each = workById.get(bedId);
    if (!each) return null;
    const Block = mayMove ? MovableBlock : FixedBlock;
    return (
      <BlockSlot key={bedId} minutes={each.minutes.total} scaleMinutes={scaleMinutes}>
        <Block work={each} held={held} onPress={() => onPress(bedId)} />
      </BlockSlot>
    );
  }
  const ghost = (placeId: string) =>
    carried && isNew(placeId) ? (
      <BlockSlot minutes={minutesByBed.get(carried.bedId) ?? 0} scaleMinutes={scaleMinutes}>
        <Ghost />
      </BlockSlot>
    ) : null;

  return (
    <div className="@container flex flex-col gap-3">
      <ul aria-label="People on this shift" className="flex flex-col gap-3">
        {loadsNow.map((load, index) => {
          const { person, bedIds } = load;
          return (
            <PersonRow
              key={person.personId}
              load={loadsSeen[index] ?? load}
              scaleMinutes={scaleMinutes}
              aside={knownBy(person, work)}
              isOver={hangsOver(person.personId)}
              isTarget={mayMove}
            >
              {bedIds.map((bedId) => block(bedId, `with ${person.displayName}`))}
              {ghost(person.personId)}
            </PersonRow>
          );
        })}
      </ul>
      <NobodyTray count={loose.length} isOver={hangsOver(NOBODY)} isTarget={mayMove}>
        {loose.map((bedId) => block(bedId, 'nobody has it'))}
        {ghost(NOBODY)}
      </NobodyTray>
    </div>
  );
}

function heldBy({
  bedId,
  holder,
  places,
  people,
}: { bedId: string; holder: string } & Pick<CarryProps, 'places' | 'people'>): Held {
  const coverId = places.find((place) => place.bedId === bedId)?.coverPersonId ?? null;
  const cover = people.find(({ personId }) => personId === coverId) ?? null;
  return { words: cover ? `${holder}, cover ${cover.displayName}` : holder, cover: cover?.initials ?? null };
}

/** How many of all beds a person has in the shift that runs now: whom the patients know. */
function knownBy({ personId }: ShiftPerson, work: readonly BedWork[]): string | null {
  const count = work.filter(({ nowWith }) => nowWith?.personId === personId).length;
  return count > 0 ? `has ${count} of these beds now` : null;
}
