import { SelectField } from '@windrow/ui/controls/select-field';
import { TextField } from '@windrow/ui/controls/text-field';
import {
  VENTILATOR_CLASSES,
  VENTILATOR_STATES,
  type VentilatorClass,
  type VentilatorState,
} from '@windrow/ventilation/contract/fleet';
import type { UnitNames } from '../machine/place-words.ts';
import type { FleetFilter } from './filter-fleet.ts';

/** What of the fleet to look at. */
export function FleetFilters({
  filter,
  units,
  onChange,
}: {
  filter: FleetFilter;
  units: UnitNames;
  onChange: (filter: FleetFilter) => void;
}) {
  return (
    <div className="grid grid-cols-2 items-end gap-3 md:grid-cols-4">
      <TextField
        label="Asset number"
        type="search"
        value={filter.search}
        onChange={(event) => onChange({ ...filter, search: event.target.value })}
      />
      <SelectField
        label="Class"
        empty="all"
        options={optionsOf(VENTILATOR_CLASSES)}
        value={filter.class ?? ''}
        onChange={(event) => onChange({ ...filter, class: asClass(event.target.value) })}
      />
      <SelectField
        label="State"
        empty="all in the house"
        options={optionsOf(VENTILATOR_STATES)}
        value={filter.state ?? ''}
        onChange={(event) => onChange({ ...filter, state: asState(event.target.value) })}
      />
      <SelectField
        label="Unit"
        empty="all"
        options={[...units].map(([value, label]) => ({ value, label }))}
        value={filter.unitId ?? ''}
        onChange={(event) => onChange({ ...filter, unitId: event.target.value || null })}
      />
    </div>
  );
}

export function asClass(text: string | null): VentilatorClass | null {
  return text !== null && isKey(VENTILATOR_CLASSES, text) ? text : null;
}

export function asState(text: string | null): VentilatorState | null {
  return text !== null && isKey(VENTILATOR_STATES, text) ? text : null;
}

function isKey<T extends object>(object: T, text: string): text is Extract<keyof T, string> {
  return Object.hasOwn(object, text);
}

function optionsOf(words: Readonly<Record<string, string>>): { value: string; label: string }[] {
  return Object.entries(words).map(([value, label]) => ({ value, label }));
}
