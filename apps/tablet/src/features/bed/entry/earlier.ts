import type { ShownBed, ShownGroup } from '@windrow/ventilation/board/shown-bed';
import type { BedStay, FactGroup } from '@windrow/ventilation/contract/board';
import { type Before, NOTHING_BEFORE } from './entry-field.ts';
import type { Earlier } from './rows.ts';

type Flat = Readonly<Record<string, unknown>>;

/** The last values of one group of facts, as far as they may still be seen. */
export function earlierOf({ shown, group }: { shown: ShownBed; group: FactGroup }): Earlier {
  const { stay } = shown.bed;
  const values = stay ? flatOf[group](stay) : {};
  return (key) => beforeIn({ group: shown.groups[group], value: values[key] });
}

/** The values of a fact in the record, for the form that corrects it. */
export function earlierOfBody({ body, ageMinutes }: { body: Flat; ageMinutes: number }): Earlier {
  const values = flattened(body);
  return (key) => {
    const value = asRowValue(values[key]);
    return value === null ? NOTHING_BEFORE : { state: 'shown', value, ageMinutes };
  };
}

/** A body's values by row: the parts of a check, a screen and a failed trial lie in groups of their own. */
export function flattened(body: Flat): Flat {
  const { settings, readings, limits, screen, criteria, ...rest } = body;
  return {
    ...rest,
    ...groupOf(settings),
    ...groupOf(readings),
    ...groupOf(limits),
    ...groupOf(screen),
    ...listOf(criteria),
  };
}

const flatOf: Record<FactGroup, (stay: BedStay) => Flat> = {
  check: ({ check }) => (check ? flattened({ ...check, derived: undefined }) : {}),
  gas: ({ gas }) => (gas ? { site: gas.site, ...gas.values } : {}),
  airway: ({ airway }) => airway ?? {},
};

function beforeIn({ group, value }: { group: ShownGroup; value: unknown }): Before {
  if (group.state === 'withdrawn' && group.observedAt !== null)
    return { state: 'withdrawn', observedAt: group.observedAt };
  const rowValue = asRowValue(value);
  return rowValue === null || group.ageMinutes === null
    ? NOTHING_BEFORE
    : { state: 'shown', value: rowValue, ageMinutes: group.ageMinutes };
}

export function asRowValue(value: unknown): number | string | null {
  if (typeof value === 'number' || typeof value === 'string') return value;
  return typeof value === 'boolean' ? (value ? 'yes' : 'no') : null;
}

/** A list of words is a row of yes for each of them. */
function listOf(value: unknown): Flat {
  if (!Array.isArray(value)) return {};
  return Object.fromEntries(value.map((word) => [criterionKey(String(word)), true]));
}

/** The row of a published criterion of a failed trial. */
export function criterionKey(id: string): string {
  return `criterion-${id}`;
}

function groupOf(value: unknown): Flat {
  return typeof value === 'object' && value !== null ? { ...value } : {};
}
