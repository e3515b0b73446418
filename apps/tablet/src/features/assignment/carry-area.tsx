import { DndContext, DragOverlay } from '@dnd-kit/core';
import { loads } from '@windrow/ventilation/assignment/loads';
import { giveBed } from '@windrow/ventilation/assignment/places';
import type { AssignmentPlace } from '@windrow/ventilation/contract/shifts';
import { useState } from 'react';
import { CarriedBlock } from './bed-block.tsx';
import { announcementsFrom, CARRY_INSTRUCTIONS } from './drag/announcements.ts';
import { rowUnder, useCarrySensors } from './drag/carry-sensors.ts';
import { personOf } from './drag/place-id.ts';
import { tellingOf } from './drag/telling.ts';
import { type CarryProps, Rows } from './rows.tsx';

/** The people of a shift as rows, their beds as blocks that are carried between them, and the tray of beds that nobody has. */
export function CarryArea({
  onGive,
  ...area
}: CarryProps & { onGive: (bedId: string, personId: string | null) => void }) {
  const { people, places, work } = area;
  const [carried, setCarried] = useState<{ bedId: string; over: string | null } | null>(null);
  const sensors = useCarrySensors();
  const minutesByBed = new Map(work.map(({ bedId, minutes }) => [bedId, minutes.total]));
  const loadsOf = (held: readonly AssignmentPlace[]) => loads({ people, places: held, minutesByBed });
  const seen = carried?.over ? giveBed(places, carried.bedId, personOf(carried.over)) : places;
  const carriedWork = work.find(({ bedId }) => bedId === carried?.bedId) ?? null;

  return (
    <DndContext
      sensors={sensors}
      collisionDetection={rowUnder}
      accessibility={{
        announcements: announcementsFrom(tellingOf(area)),
        screenReaderInstructions: CARRY_INSTRUCTIONS,
      }}
      onDragStart={({ active }) => setCarried({ bedId: String(active.id), over: null })}
      onDragOver={({ over }) => setCarried((now) => now && { ...now, over: over ? String(over.id) : null })}
      onDragCancel={() => setCarried(null)}
      onDragEnd={({ active, over }) => {
        setCarried(null);
        if (over) onGive(String(active.id), personOf(String(over.id)));
      }}
    >
      <Rows
        {...area}
        carried={carried}
        loadsNow={loadsOf(places)}
        loadsSeen={loadsOf(seen)}
        minutesByBed={minutesByBed}
      />
      <DragOverlay dropAnimation={null}>{carriedWork && <CarriedBlock work={carriedWork} />}</DragOverlay>
    </DndContext>
  );
}
