import { AIRWAY_KINDS, Airway, DEPTH_MARKS } from '@windrow/ventilation/contract/observations';
import { AIRWAY_FIELDS } from '@windrow/ventilation/entry/fields';
import { flagOf, pick } from '../entry-body.ts';
import type { EntryPlan } from '../entry-plan.ts';
import { choiceRow, type Earlier, measuredRow, NOTE_SECTION, optionsOf, YES_NO } from '../rows.ts';
import { AIRWAY_KIND_WORDS, DEPTH_MARK_WORDS } from '../words.ts';

/** Only a tube through mouth or nose is secured at a depth. */
const WITH_DEPTH: readonly string[] = ['oral-tube', 'nasal-tube'];

/** A device put into the airway. */
export function airwayPlan({ kind, earlier }: { kind: string; earlier: Earlier }): EntryPlan {
  const depth = WITH_DEPTH.includes(kind)
    ? [
        measuredRow({ key: 'depthCm', field: AIRWAY_FIELDS.depthCm, earlier }),
        choiceRow({
          key: 'depthMark',
          label: 'Depth read at',
          options: optionsOf(DEPTH_MARKS, DEPTH_MARK_WORDS),
          earlier,
        }),
      ]
    : [];
  return {
    kind: 'airway',
    title: 'Device placed',
    timeLabel: 'Placed',
    sections: [
      {
        title: 'Device',
        rows: [
          choiceRow({
            key: 'kind',
            label: 'Kind',
            options: optionsOf(AIRWAY_KINDS, AIRWAY_KIND_WORDS),
            earlier,
            needed: true,
          }),
          measuredRow({ key: 'sizeMm', field: AIRWAY_FIELDS.sizeMm, earlier, needed: true }),
          ...depth,
          choiceRow({ key: 'cuffed', label: 'Cuffed', options: YES_NO, earlier, needed: true }),
          choiceRow({ key: 'subglotticPort', label: 'Subglottic port', options: YES_NO, earlier }),
        ],
      },
      NOTE_SECTION,
    ],
    schema: Airway,
    bodyOf: (values) => ({
      event: 'placed',
      ...pick(values, ['kind', 'sizeMm', ...(depth.length > 0 ? ['depthCm', 'depthMark'] : [])]),
      ...flagOf(values, 'cuffed'),
      ...flagOf(values, 'subglotticPort'),
    }),
  };
}

/** The device taken out: nothing to ask but when. */
export function removalPlan({ device }: { device: string | null }): EntryPlan {
  return {
    kind: 'airway',
    title: 'Device taken out',
    timeLabel: 'Taken out',
    sections: [NOTE_SECTION],
    statement: device === null ? 'The device is taken out.' : `${device} is taken out.`,
    schema: Airway,
    bodyOf: () => ({ event: 'removed' }),
  };
}
