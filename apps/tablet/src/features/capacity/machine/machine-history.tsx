import { useQuery } from '@tanstack/react-query';
import { Reading } from '@windrow/ui/controls/reading';
import { VENTILATOR_STATES } from '@windrow/ventilation/contract/fleet';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { movesQuery } from '../capacity-queries.ts';
import { placeInWords, type UnitNames } from './place-words.ts';

/** Where a machine has been and who moved it, newest first. */
export function MachineHistory({
  ventilatorId,
  units,
  now,
  timeZone,
}: {
  ventilatorId: string;
  units: UnitNames;
  now: number;
  timeZone: string;
}) {
  const moves = useQuery(movesQuery(ventilatorId));
  return (
    <section aria-labelledby="moves" className="flex flex-col gap-2">
      <h3 id="moves" className="font-bold text-lg">
        Where it has been
      </h3>
      <Reading asked={moves} what="its moves">
        {(items) =>
          items.length === 0 ? (
            <p className="text-ink-muted">No move has been recorded yet.</p>
          ) : (
            <ol className="flex flex-col">
              {items.map((move) => (
                <li key={move.moveId} className="border-line border-b py-2">
                  <p>
                    <strong>{formatMoment(move.observedAt, now, timeZone)}</strong>{' '}
                    {VENTILATOR_STATES[move.from]} → {VENTILATOR_STATES[move.to]}
                  </p>
                  <p className="text-ink-muted text-sm">
                    {placeInWords({ place: move, units })} · {move.movedBy}
                  </p>
                  {move.note && <p className="text-sm">{move.note}</p>}
                </li>
              ))}
            </ol>
          )
        }
      </Reading>
    </section>
  );
}
