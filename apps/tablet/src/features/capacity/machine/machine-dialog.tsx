import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { VENTILATOR_CLASSES, VENTILATOR_STATES, type Ventilator } from '@windrow/ventilation/contract/fleet';
import { formatAge } from '@windrow/ventilation/format/age';
import { formatMoment } from '@windrow/ventilation/format/clock';
import type { Grant } from '@windrow/ventilation/permissions/permissions';
import { allowedMoves } from '../fleet/allowed-moves.ts';
import { MachineHistory } from './machine-history.tsx';
import { MachineMark } from './machine-mark.tsx';
import { MoveForm } from './move-form.tsx';
import { placeInWords, type UnitNames } from './place-words.ts';

/** One machine: where it stands, what can become of it, and where it has been. */
export function MachineDialog({
  machine,
  grants,
  units,
  now,
  timeZone,
  onClose,
}: {
  machine: Ventilator;
  grants: readonly Grant[];
  units: UnitNames;
  now: number;
  timeZone: string;
  onClose: () => void;
}) {
  const moves = allowedMoves({ grants, from: machine.state });
  const since = `${formatMoment(machine.sinceAt, now, timeZone)}, ${formatAge((now - Date.parse(machine.sinceAt)) / 60_000)}`;
  const facts = [
    ['Class', VENTILATOR_CLASSES[machine.class]],
    ['Place', placeInWords({ place: machine.place, units })],
    ['Since', since],
    ['Belongs to', machine.homeUnitId ? (units.get(machine.homeUnitId) ?? 'a unit') : 'the house'],
  ] as const;
  return (
    <Dialog open onClose={onClose} title={`${machine.assetNumber} · ${machine.model}`}>
      <p className="flex items-center gap-3 font-bold text-lg">
        <MachineMark state={machine.state} /> {VENTILATOR_STATES[machine.state]}
      </p>
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1">
        {facts.map(([word, value]) => (
          <div key={word} className="contents">
            <dt className="text-ink-muted">{word}</dt>
            <dd>{value}</dd>
          </div>
        ))}
      </dl>
      {moves.length > 0 && (
        // What was entered for one state means nothing for another, so each begins anew.
        <MoveForm
          key={machine.state}
          machine={machine}
          moves={moves}
          grants={grants}
          units={units}
          onMoved={onClose}
        />
      )}
      <MachineHistory ventilatorId={machine.ventilatorId} units={units} now={now} timeZone={timeZone} />
      <DialogActions>
        <Button onClick={onClose}>Close</Button>
      </DialogActions>
    </Dialog>
  );
}
