import type { NumberField } from '@windrow/ventilation/entry/fields';
import { formatNumber } from '@windrow/ventilation/format/number';
import type { DerivedLine } from '../derived-in-words.ts';
import type { ShownValue } from './value-grid.tsx';

/** The recorded values of a group, in the order of its fields; what was not recorded is not there. */
export function shownValues(
  values: Readonly<Record<string, number | 'off'>>,
  fields: Readonly<Record<string, NumberField>>,
): ShownValue[] {
  return Object.entries(fields).flatMap(([key, field]) => {
    const value = values[key];
    if (value === undefined) return [];
    return [
      {
        key,
        label: field.label,
        value: value === 'off' ? 'off' : formatNumber(value, field),
        unit: value === 'off' ? '' : field.unit,
      },
    ];
  });
}

export function shownDerived(lines: readonly DerivedLine[]): ShownValue[] {
  return lines.flatMap(({ key, label, value, unit, from }) =>
    value === null ? [] : [{ key, label, value, unit, from }],
  );
}
