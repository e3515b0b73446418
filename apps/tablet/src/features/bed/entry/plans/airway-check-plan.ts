import { AirwayCheck, CUFF_METHODS, TUBE_POSITIONS } from '@windrow/ventilation/contract/observations';
import { AIRWAY_FIELDS } from '@windrow/ventilation/entry/fields';
import { flagOf, pick } from '../entry-body.ts';
import type { EntryPlan } from '../entry-plan.ts';
import { choiceRow, type Earlier, NOTE_SECTION, numberRow, optionsOf, YES_NO } from '../rows.ts';
import { CUFF_METHOD_WORDS, POSITION_WORDS } from '../words.ts';

/**
 * How the device sits now.
 *
 * @param mark where the depth is read, in words; null: not known.
 */
export function airwayCheckPlan({
  earlier,
  cuffed,
  mark,
}: {
  earlier: Earlier;
  cuffed: boolean;
  mark: string | null;
}): EntryPlan {
  const depth = numberRow({ key: 'depthCm', field: AIRWAY_FIELDS.depthCm, earlier });
  const cuff = [
    numberRow({ key: 'cuffCmH2O', field: AIRWAY_FIELDS.cuffCmH2O, earlier }),
    choiceRow({
      key: 'cuffMethod',
      label: 'Cuff measured by',
      options: optionsOf(CUFF_METHODS, CUFF_METHOD_WORDS),
      earlier,
    }),
  ];
  return {
    kind: 'airway-check',
    title: 'Airway check',
    timeLabel: 'Observed',
    sections: [
      {
        title: 'Airway',
        rows: [
          mark === null ? depth : { ...depth, label: `Depth at ${mark}` },
          ...(cuffed ? cuff : []),
          choiceRow({
            key: 'position',
            label: 'Position',
            options: optionsOf(TUBE_POSITIONS, POSITION_WORDS),
            earlier,
          }),
          choiceRow({ key: 'secured', label: 'Secured', options: YES_NO, earlier }),
        ],
      },
      NOTE_SECTION,
    ],
    schema: AirwayCheck,
    bodyOf: (values) => ({
      ...pick(values, ['depthCm', 'cuffCmH2O', 'cuffMethod', 'position']),
      ...flagOf(values, 'secured'),
    }),
  };
}
