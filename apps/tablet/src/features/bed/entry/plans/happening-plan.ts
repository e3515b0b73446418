import {
  HAPPENING_KINDS,
  Happening,
  type HappeningKind,
  TRIAL_METHOD_IDS,
  TRIAL_METHODS,
} from '@windrow/ventilation/contract/observations';
import { TRIAL_FIELDS } from '@windrow/ventilation/entry/fields';
import { SCREEN_ANSWER_KEYS, SCREEN_ANSWERS } from '@windrow/ventilation/readiness/screen-answers';
import { FAILURE_CRITERIA, FAILURE_CRITERION_IDS } from '@windrow/ventilation/readiness/trial-failure';
import { SUPPORT_CATALOGUE } from '@windrow/ventilation/support/catalogue';
import { criterionKey } from '../earlier.ts';
import { flagOf, pick } from '../entry-body.ts';
import type { EntryRow, EntryValues } from '../entry-field.ts';
import type { EntryPlan } from '../entry-plan.ts';
import { choiceRow, type Earlier, measuredRow, optionsOf, textRow, YES_NO } from '../rows.ts';

const KINDS = Object.entries(HAPPENING_KINDS).map(([value, { label }]) => ({ value, label }));

/** What can follow a tube: everything that needs none. */
const AFTER_TUBE = SUPPORT_CATALOGUE.filter(({ kind }) => kind !== 'invasive').map(
  ({ id, shortName, fullName }) => ({
    value: id,
    label: shortName === fullName ? shortName : `${shortName} · ${fullName}`,
  }),
);

/** Something that changes what comes next; what else is asked follows from what it was. */
export function happeningPlan({
  kind,
  earlier,
  hasCriteria = false,
}: {
  kind: string;
  earlier: Earlier;
  /** Whether a failed trial names a published criterion; then it needs no words. */
  hasCriteria?: boolean;
}): EntryPlan {
  const known = isHappening(kind) ? kind : null;
  const changesSupport = known !== null && HAPPENING_KINDS[known].support;
  return {
    kind: 'happening',
    title: 'Happening',
    timeLabel: 'Happened',
    sections: [
      {
        title: 'What happened',
        rows: [choiceRow({ key: 'kind', label: 'What happened', options: KINDS, earlier, needed: true })],
      },
      ...(known === null
        ? []
        : [
            {
              title: 'More about it',
              rows: [
                ...(changesSupport ? [supportRow(earlier)] : []),
                ...rowsOf(known, earlier),
                detailRow(known, hasCriteria),
              ],
            },
          ]),
    ],
    schema: Happening,
    bodyOf: (values) => ({
      ...pick(values, ['kind', 'detail', 'method', 'plannedMinutes', 'minutes']),
      ...(changesSupport ? pick(values, ['toSupport']) : {}),
      ...criteriaOf(values),
      ...screenOf(values),
    }),
  };
}

function supportRow(earlier: Earlier): EntryRow {
  return choiceRow({
    key: 'toSupport',
    label: 'Breathes with from then on',
    options: AFTER_TUBE,
    earlier,
    needed: true,
  });
}

/** Whether any published criterion is said to be met. */
export function namesCriterion(values: Readonly<Record<string, string>>): boolean {
  return FAILURE_CRITERION_IDS.some((id) => (values[criterionKey(id)] ?? '') !== '');
}

const MET = [{ value: 'yes', label: 'Met' }] as const;

function rowsOf(kind: HappeningKind, earlier: Earlier): EntryRow[] {
  switch (kind) {
    case 'trial-started':
      return [
        choiceRow({
          key: 'method',
          label: 'On',
          options: optionsOf(TRIAL_METHOD_IDS, TRIAL_METHODS),
          earlier,
          needed: true,
        }),
        measuredRow({
          key: 'plannedMinutes',
          field: TRIAL_FIELDS.plannedMinutes,
          earlier,
          needed: true,
        }),
      ];
    case 'trial-passed':
      return [measuredRow({ key: 'minutes', field: TRIAL_FIELDS.minutes, earlier, needed: true })];
    case 'trial-failed':
      return FAILURE_CRITERION_IDS.map((id) =>
        choiceRow({ key: criterionKey(id), label: FAILURE_CRITERIA[id].label, options: MET, earlier }),
      );
    case 'screened':
      return SCREEN_ANSWER_KEYS.map((key) =>
        choiceRow({ key, label: SCREEN_ANSWERS[key], options: YES_NO, earlier }),
      );
    default:
      return [];
  }
}

function criteriaOf(values: EntryValues): { criteria?: string[] } {
  const criteria = FAILURE_CRITERION_IDS.filter((id) => values[criterionKey(id)] === 'yes');
  return criteria.length > 0 ? { criteria } : {};
}

function screenOf(values: EntryValues): { screen?: Record<string, boolean> } {
  const screen = Object.assign({}, ...SCREEN_ANSWER_KEYS.map((key) => flagOf(values, key)));
  return Object.keys(screen).length > 0 ? { screen } : {};
}

function detailRow(kind: HappeningKind, hasCriteria: boolean): EntryRow {
  switch (kind) {
    case 'left-for-transport':
      return textRow({ key: 'detail', label: 'Where to', hint: 'such as: CT' });
    case 'trial-failed':
      return textRow({
        key: 'detail',
        label: 'Why it failed, in words',
        hint: 'such as: rate 38, tired',
        needed: !hasCriteria,
      });
    default:
      return textRow({ key: 'detail', label: 'Detail' });
  }
}

function isHappening(kind: string): kind is HappeningKind {
  return kind in HAPPENING_KINDS;
}
