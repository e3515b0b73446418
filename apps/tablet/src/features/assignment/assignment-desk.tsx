import type { Bed, Unit } from '@windrow/ventilation/contract/board';
import type { Assignment } from '@windrow/ventilation/contract/shifts';
import type { Policy } from '@windrow/ventilation/policy/policy';
import { useState } from 'react';
import { blockId } from './bed-block.tsx';
import { BedDialog } from './bed-dialog.tsx';
import { CarryArea } from './carry-area.tsx';
import { useUndoKeys } from './draft/use-undo-keys.ts';
import { EmptyBeds } from './empty-beds.tsx';
import { DeskHead } from './publish/desk-head.tsx';
import { useDesk } from './use-desk.ts';
import { useFocusAfter } from './use-focus-after.ts';
import { standingOf } from './words.ts';

/** One shift's beds and people, to be divided, or only looked at. */
export function AssignmentDesk({
  unit,
  assignment,
  beds,
  policy,
  mayMove,
}: {
  unit: Unit;
  assignment: Assignment;
  beds: readonly Bed[];
  policy: Policy;
  mayMove: boolean;
}) {
  const desk = useDesk({ assignment, beds, policy });
  const { draft, people, work } = desk;
  const { timeZone } = unit;
  const [pressedId, setPressedId] = useState<string | null>(null);
  const pressed = work.find(({ bedId }) => bedId === pressedId) ?? null;
  const focusAfter = useFocusAfter(pressedId === null);
  useUndoKeys({ undo: draft.undo, redo: draft.redo, isActive: mayMove && pressedId === null });

  function giveFromDialog(bedId: string, personId: string | null): void {
    desk.give(bedId, personId);
    desk.announceGiven(bedId, personId);
    focusAfter(blockId(bedId));
    setPressedId(null);
  }

  return (
    <div className="flex flex-col gap-3">
      {mayMove ? (
        <DeskHead desk={desk} assignment={assignment} timeZone={timeZone} />
      ) : (
        <p className="font-bold">{standingOf({ assignment, now: desk.now, timeZone })}</p>
      )}
      <CarryArea
        people={people}
        places={draft.places}
        work={work}
        mayMove={mayMove}
        onGive={desk.give}
        onPress={setPressedId}
      />
      <EmptyBeds empty={desk.empty} places={draft.places} people={people} />
      {pressed && (
        <BedDialog
          work={pressed}
          choices={mayMove ? desk.choicesFor(pressed.bedId) : []}
          nobodyHasIt={desk.holderOf(pressed.bedId) === null}
          coverId={desk.coverOf(pressed.bedId)}
          onGive={(personId) => giveFromDialog(pressed.bedId, personId)}
          onCover={(personId) => desk.cover(pressed.bedId, personId)}
          onClose={() => setPressedId(null)}
        />
      )}
    </div>
  );
}
