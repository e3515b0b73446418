import { VENTILATOR_CLASSES, VENTILATOR_STATES, type Ventilator } from '@windrow/ventilation/contract/fleet';
import { ageInWords, formatAge } from '@windrow/ventilation/format/age';
import { MachineMark } from '../machine/machine-mark.tsx';
import { placeInWords, type UnitNames } from '../machine/place-words.ts';

/** Machines, one a line; a line opens its machine. */
export function FleetList({
  machines,
  units,
  now,
  onOpen,
}: {
  machines: readonly Ventilator[];
  units: UnitNames;
  now: number;
  onOpen: (ventilatorId: string) => void;
}) {
  return (
    <ul className="flex flex-col overflow-hidden rounded-xl bg-tile">
      {machines.map((machine) => (
        <li key={machine.ventilatorId} className="border-line border-b last:border-b-0">
          <FleetLine machine={machine} units={units} now={now} onOpen={() => onOpen(machine.ventilatorId)} />
        </li>
      ))}
    </ul>
  );
}

function FleetLine({
  machine,
  units,
  now,
  onOpen,
}: {
  machine: Ventilator;
  units: UnitNames;
  now: number;
  onOpen: () => void;
}) {
  const minutes = (now - Date.parse(machine.sinceAt)) / 60_000;
  return (
    <button
      type="button"
      onClick={onOpen}
      className="grid min-h-14 w-full grid-cols-[1fr_auto] items-center gap-x-4 gap-y-1 px-4 py-2 text-left text-ink -outline-offset-2 md:grid-cols-[14rem_1fr_1fr_4rem]"
    >
      <span className="flex items-center gap-3">
        <MachineMark state={machine.state} />
        <span>
          <span className="block font-bold">{machine.assetNumber}</span>
          <span className="block text-ink-muted text-sm">{machine.model}</span>
        </span>
      </span>
      <span className="text-right md:text-left">
        <span className="block font-bold">{VENTILATOR_STATES[machine.state]}</span>
        <span className="block text-ink-muted text-sm">{VENTILATOR_CLASSES[machine.class]}</span>
      </span>
      <span>{placeInWords({ place: machine.place, units })}</span>
      <span className="text-right text-ink-muted">
        <span className="sr-only">since {ageInWords(minutes)}</span>
        <span aria-hidden="true">{formatAge(minutes)}</span>
      </span>
    </button>
  );
}
