import { Check, MASK_INTERFACES, pressureOrder } from '@windrow/ventilation/contract/observations';
import {
  LIMIT_FIELDS,
  type LimitKey,
  READING_FIELDS,
  SETTING_FIELDS,
} from '@windrow/ventilation/entry/fields';
import { SUPPORT_CATALOGUE, type SupportEntry } from '@windrow/ventilation/support/catalogue';
import { flagOf, pick } from '../entry-body.ts';
import type { EntryRow, EntrySection, EntryValues } from '../entry-field.ts';
import type { EntryPlan } from '../entry-plan.ts';
import { choiceRow, type Earlier, NOTE_SECTION, numberRow, optionsOf, YES_NO } from '../rows.ts';
import { MASK_WORDS } from '../words.ts';

const MODES = SUPPORT_CATALOGUE.map(({ id, shortName, fullName }) => ({
  value: id,
  label: `${shortName} · ${fullName}`,
}));

/**
 * A whole check: the rows follow from the mode, in the order in which a ventilator is read.
 *
 * @param standing the mode of the last check, where that check still holds on the board; null: none does.
 */
export function checkPlan({
  mode,
  earlier,
  standing = null,
}: {
  mode: string;
  earlier: Earlier;
  standing?: string | null;
}): EntryPlan {
  const entry = SUPPORT_CATALOGUE.find(({ id }) => id === mode) ?? null;
  return {
    kind: 'check',
    title: 'Check',
    timeLabel: 'Observed',
    sections: [
      {
        title: 'Mode',
        rows: [
          choiceRow({ key: 'mode', label: 'Mode', options: MODES, earlier, needed: true, asList: true }),
        ],
      },
      ...(entry ? sectionsOf({ entry, earlier, mayRepeat: standing === mode }) : []),
      NOTE_SECTION,
    ],
    schema: Check,
    crossCheck: (values) => pressureOrder(pressuresOf(values)),
    bodyOf: (values) => bodyOf(values, entry),
    onBoard: standing === null ? [] : Object.keys(READING_FIELDS),
  };
}

function sectionsOf({
  entry,
  earlier,
  mayRepeat,
}: {
  entry: SupportEntry;
  earlier: Earlier;
  mayRepeat: boolean;
}): EntrySection[] {
  const settings = [
    ...entry.required.map((key) => numberRow({ key, field: SETTING_FIELDS[key], earlier, needed: true })),
    ...entry.optional.map((key) => numberRow({ key, field: SETTING_FIELDS[key], earlier })),
  ];
  // Only where a pause can be held does it matter whether the patient made an effort, and there it stands beside it.
  const passive = choiceRow({
    key: 'passive',
    label: 'Patient passive (no effort)',
    options: YES_NO,
    earlier,
  });
  const readings = entry.readings.flatMap<EntryRow>((key) => {
    const row = numberRow({ key, field: READING_FIELDS[key], earlier });
    return key === 'plateauCmH2O' ? [row, passive] : [row];
  });
  const mask = choiceRow({
    key: 'interface',
    label: 'Mask',
    options: optionsOf(MASK_INTERFACES, MASK_WORDS),
    earlier,
  });
  return [
    { title: 'Settings', rows: entry.wantsInterface ? [...settings, mask] : settings, mayRepeat },
    { title: 'Readings', rows: readings },
    { title: 'Alarm limits', rows: entry.limits.map((key) => limitRow(key, earlier)) },
  ].filter(({ rows }) => rows.length > 0);
}

function limitRow(key: LimitKey, earlier: Earlier) {
  return numberRow({ key, field: LIMIT_FIELDS[key], earlier, mayBeOff: true });
}

function bodyOf(values: EntryValues, entry: SupportEntry | null): Record<string, unknown> {
  return {
    ...pick(values, ['mode', 'interface']),
    settings: pick(values, Object.keys(SETTING_FIELDS)),
    readings: pick(values, entry?.readings ?? []),
    limits: pick(values, entry?.limits ?? []),
    ...flagOf(values, 'passive'),
  };
}

/** The pressures as the contract's own rule wants them. */
function pressuresOf(values: EntryValues): Pick<Check, 'settings' | 'readings'> {
  return {
    settings: Check.shape.settings.parse(pick(values, Object.keys(SETTING_FIELDS))),
    readings: Check.shape.readings.parse(pick(values, Object.keys(READING_FIELDS))),
  };
}
