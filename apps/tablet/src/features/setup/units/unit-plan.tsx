import type { BedPlace, Unit } from '@windrow/ventilation/contract/board';
import { Plus } from 'lucide-react';
import { useState } from 'react';
import { BedDialog } from './bed-dialog.tsx';
import { type Cell, floorPlan, nextFreeCell } from './floor-plan.ts';
import { NewBedDialog } from './new-bed-dialog.tsx';
import { offeredLabel } from './next-label.ts';

/** The beds of a unit as they stand in it. A free cell takes a bed; a bed can be opened and closed. */
export function UnitPlan({ unit, beds }: { unit: Unit; beds: readonly BedPlace[] }) {
  const [place, setPlace] = useState<Pick<Cell, 'row' | 'column'> | null>(null);
  const [openId, setOpenId] = useState<string | null>(null);
  const { columns, cells } = floorPlan(beds);
  const closed = beds.filter(({ isOpen }) => !isOpen).length;
  const opened = beds.find(({ bedId }) => bedId === openId) ?? null;

  return (
    <div className="flex flex-col gap-3">
      <p>
        <strong>{beds.length === 1 ? '1 bed' : `${beds.length} beds`}</strong>
        {closed > 0 && `, ${closed} closed`} · {unit.timeZone}
      </p>
      {/* The plan is wider than a phone: it scrolls in its own frame, which the keyboard can reach. */}
      <section aria-label="Floor plan" className="overflow-x-auto rounded-xl bg-tile p-3">
        <ul
          className="grid w-max gap-2"
          style={{ gridTemplateColumns: `repeat(${columns}, minmax(4rem, 6rem))` }}
        >
          {cells.map((cell) => (
            <li key={`${cell.row} ${cell.column}`}>
              {cell.bed ? (
                <BedCell bed={cell.bed} onPress={setOpenId} />
              ) : (
                <FreeCell cell={cell} onPress={() => setPlace({ row: cell.row, column: cell.column })} />
              )}
            </li>
          ))}
        </ul>
      </section>
      {place && (
        <NewBedDialog
          // Each bed of a series is a form of its own.
          key={`${place.row} ${place.column}`}
          unitId={unit.unitId}
          place={place}
          label={offeredLabel(beds.map(({ label }) => label))}
          hasNext={nextFreeCell(cells, place) !== null}
          onClose={() => setPlace(null)}
          onNext={() => setPlace(nextFreeCell(cells, place))}
        />
      )}
      {opened && <BedDialog bed={opened} onClose={() => setOpenId(null)} />}
    </div>
  );
}

function BedCell({ bed, onPress }: { bed: BedPlace; onPress: (bedId: string) => void }) {
  const look = bed.isOpen ? 'border-block-soft bg-block-soft' : 'border-dashed border-line-strong';
  return (
    <button
      type="button"
      onClick={() => onPress(bed.bedId)}
      aria-label={`Bed ${bed.label}, ${bed.isOpen ? 'open' : 'closed'}, row ${bed.row}, column ${bed.column}`}
      className={`flex min-h-16 w-full flex-col items-center justify-center rounded-lg border-2 ${look}`}
    >
      <span className="font-bold text-lg leading-tight">{bed.label}</span>
      <span className="text-sm leading-tight">{bed.isOpen ? 'open' : 'closed'}</span>
    </button>
  );
}

function FreeCell({ cell, onPress }: { cell: Cell; onPress: () => void }) {
  return (
    <button
      type="button"
      onClick={onPress}
      aria-label={`Add a bed in row ${cell.row}, column ${cell.column}`}
      className="flex min-h-16 w-full items-center justify-center rounded-lg border-2 border-line border-dotted text-ink-muted"
    >
      <Plus aria-hidden="true" size={20} />
    </button>
  );
}
