import { Amendment } from '@windrow/ventilation/contract/observations';
import { Discharge, OUTCOMES, Transfer } from '@windrow/ventilation/contract/stays';
import { pick } from '../entry-body.ts';
import { NOTHING_BEFORE, type Option } from '../entry-field.ts';
import type { EntryPlan } from '../entry-plan.ts';
import { choiceRow, optionsOf, textRow } from '../rows.ts';

const nothing = () => NOTHING_BEFORE;

/** To another bed; the record goes along. */
export function transferPlan({ beds, statement }: { beds: readonly Option[]; statement: string }): EntryPlan {
  return {
    kind: 'transfer',
    title: 'Transfer',
    timeLabel: 'Moved',
    sections: [
      {
        title: 'Transfer',
        rows: [
          choiceRow({
            key: 'bedId',
            label: 'To bed',
            options: beds,
            earlier: nothing,
            needed: true,
            asList: true,
          }),
        ],
      },
    ],
    schema: Transfer,
    bodyOf: (values) => pick(values, ['bedId']),
    statement,
  };
}

const OUTCOME_WORDS = {
  ward: 'To a ward',
  'other-hospital': 'To another hospital',
  home: 'Home',
  died: 'Died',
} as const;

/** The stay ends; the bed is empty from then on. */
export function endPlan({ statement }: { statement: string }): EntryPlan {
  return {
    kind: 'end',
    title: 'End of the stay',
    timeLabel: 'Left',
    sections: [
      {
        title: 'End of the stay',
        rows: [
          choiceRow({
            key: 'outcome',
            label: 'Outcome',
            options: optionsOf(OUTCOMES, OUTCOME_WORDS),
            earlier: nothing,
            needed: true,
          }),
        ],
      },
    ],
    schema: Discharge,
    bodyOf: (values) => pick(values, ['outcome']),
    statement,
  };
}

export const REASON_SECTION = {
  title: 'Reason',
  rows: [
    textRow({
      key: 'reason',
      label: 'Why it is amended',
      hint: 'Stands in the record beside both, such as: misread from the slip',
      needed: true,
    }),
  ],
} as const;

/** Struck as entered in error: it no longer counts, and stays readable. */
export function struckPlan(): EntryPlan {
  return {
    kind: 'struck',
    title: 'Strike',
    timeLabel: null,
    sections: [REASON_SECTION],
    schema: Amendment,
    bodyOf: (values) => ({ as: 'struck', reason: values.reason }),
    statement:
      'The entry no longer counts. It stays in the record, struck through, with your name and the reason.',
  };
}
