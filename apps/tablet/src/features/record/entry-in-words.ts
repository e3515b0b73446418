import {
  HAPPENING_KINDS,
  type HappeningKind,
  type RecordEntry,
} from '@windrow/ventilation/contract/observations';
import {
  AIRWAY_FIELDS,
  GAS_FIELDS,
  LIMIT_FIELDS,
  type NumberField,
  PATIENT_FIELDS,
  READING_FIELDS,
  SETTING_FIELDS,
  SIGN_FIELDS,
  TRIAL_FIELDS,
} from '@windrow/ventilation/entry/fields';
import { formatDay } from '@windrow/ventilation/format/clock';
import { formatWithUnit } from '@windrow/ventilation/format/number';
import { SCREEN_ANSWERS } from '@windrow/ventilation/readiness/screen-answers';
import { FAILURE_CRITERIA, type FailureCriterion } from '@windrow/ventilation/readiness/trial-failure';
import { SUPPORT_CATALOGUE } from '@windrow/ventilation/support/catalogue';
import { saidAs } from './words.ts';

/** One line of an entry: a heading where it has one, and what was recorded under it. */
export type EntryLine = { label: string | null; text: string };

type Body = RecordEntry['body'];
type Fields = Readonly<Record<string, NumberField>>;

export const KIND_WORDS: Readonly<Record<RecordEntry['kind'], string>> = {
  check: 'Check',
  gas: 'Gas',
  airway: 'Airway',
  'airway-check': 'Airway check',
  happening: 'Happening',
  'infection-sign': 'For surveillance',
  acknowledgement: 'Flag acknowledged',
  details: 'Details',
  place: 'Place',
};

/** Everything that an entry holds, in words and with its units. */
export function entryInWords({ kind, body }: Pick<RecordEntry, 'kind' | 'body'>): EntryLine[] {
  const lines = LINES[kind](body);
  const note = typeof body.note === 'string' ? [{ label: 'Note', text: body.note }] : [];
  return [...lines, ...unusualIn(body), ...note].filter(({ text }) => text !== '');
}

const LINES: Readonly<Record<RecordEntry['kind'], (body: Body) => EntryLine[]>> = {
  check: (body) => [
    { label: null, text: supportInWords(body.mode) },
    { label: 'Settings', text: numbersInWords(body.settings, SETTING_FIELDS) },
    { label: 'Readings', text: numbersInWords(body.readings, READING_FIELDS) },
    { label: 'Alarm limits', text: numbersInWords(body.limits, LIMIT_FIELDS) },
    {
      label: null,
      text: joined([
        saidAs('interface', body.interface),
        yesNo(body.passive, 'patient passive', 'patient made an effort') || passiveUnsaid(body),
      ]),
    },
  ],
  gas: (body) => [
    { label: null, text: saidAs('site', body.site) },
    { label: null, text: numbersInWords(body, GAS_FIELDS) },
  ],
  airway: (body) =>
    body.event === 'removed'
      ? [{ label: null, text: 'Device taken out' }]
      : [
          { label: null, text: joined(['Placed', saidAs('kind', body.kind)]) },
          {
            label: null,
            text: joined([
              numbersInWords(body, AIRWAY_FIELDS),
              saidAs('depthMark', body.depthMark),
              yesNo(body.cuffed, 'cuffed', 'no cuff'),
              yesNo(body.subglotticPort, 'subglottic port', 'no subglottic port'),
            ]),
          },
        ],
  'airway-check': (body) => [
    {
      label: null,
      text: joined([
        numbersInWords(body, AIRWAY_FIELDS),
        saidAs('cuffMethod', body.cuffMethod),
        saidAs('position', body.position),
        yesNo(body.secured, 'secured', 'not secured'),
      ]),
    },
  ],
  happening: (body) => [
    { label: null, text: isHappening(body.kind) ? HAPPENING_KINDS[body.kind].label : '' },
    { label: 'Breathes with from then on', text: supportInWords(body.toSupport) },
    ...trialLines(body),
    ...screenLines(body),
    { label: 'Detail', text: typeof body.detail === 'string' ? body.detail : '' },
  ],
  'infection-sign': (body) => [
    {
      label: null,
      text: joined([
        saidAs('sign', body.sign),
        numbersInWords(body, SIGN_FIELDS),
        textOf(body.agent),
        typeof body.day === 'string' ? formatDay(body.day) : '',
      ]),
    },
  ],
  acknowledgement: (body) => [{ label: textOf(body.short), text: textOf(body.sentence) }],
  details: detailLines,
  place: (body) => [
    { label: null, text: joined([saidAs('event', body.event), saidAs('outcome', body.outcome)]) },
  ],
};

/** What a breathing trial was made on, how long, and the published criteria by which it failed. */
function trialLines(body: Body): EntryLine[] {
  const criteria = Array.isArray(body.criteria) ? body.criteria.map(String) : [];
  return [
    { label: 'On', text: saidAs('method', body.method) },
    { label: null, text: numbersInWords(body, TRIAL_FIELDS) },
    {
      label: 'Criteria met',
      text: criteria.map((id) => (isCriterion(id) ? FAILURE_CRITERIA[id].label : id)).join('; '),
    },
  ];
}

function isCriterion(id: string): id is FailureCriterion {
  return id in FAILURE_CRITERIA;
}

function screenLines({ screen }: Body): EntryLine[] {
  const answers = groupOf(screen);
  const given = (answer: boolean) =>
    Object.entries(SCREEN_ANSWERS)
      .filter(([key]) => answers[key] === answer)
      .map(([, words]) => words)
      .join('; ');
  return [
    { label: 'Yes', text: given(true) },
    { label: 'No', text: given(false) },
  ];
}

function detailLines(body: Body): EntryLine[] {
  const patient = groupOf(body.patient);
  const orders = groupOf(body.orders);
  const every = (label: string, minutes: unknown) =>
    typeof minutes === 'number' ? `${label} every ${minutes} min` : '';
  return [
    {
      label: null,
      text: joined([
        `${textOf(patient.familyName)}, ${textOf(patient.givenName)}`,
        typeof patient.bornOn === 'string' ? `born ${formatDay(patient.bornOn)}` : '',
        `No. ${textOf(patient.hospitalNumber)}`,
      ]),
    },
    {
      label: null,
      text: joined([
        textOf(patient.sex) || 'sex not recorded',
        numbersInWords(patient, PATIENT_FIELDS) || 'no height',
      ]),
    },
    { label: null, text: body.difficultAirway === true ? 'Difficult airway' : '' },
    { label: 'Precautions', text: textOf(body.precautions) },
    { label: 'Care limits', text: textOf(body.careLimits) },
    {
      label: 'Ordered',
      text: joined([every('check', orders.checkEveryMinutes), every('gas', orders.gasEveryMinutes)]),
    },
  ];
}

/** "PEEP 8 cmH2O, Oxygen (FiO2) 50 %": only what was recorded, in the order of the fields. */
function numbersInWords(part: unknown, fields: Fields): string {
  const values = groupOf(part);
  return joined(
    Object.entries(fields).map(([key, field]) => {
      const value = values[key];
      if (value === 'off') return `${field.label} off`;
      return typeof value === 'number' ? `${field.label} ${formatWithUnit(value, field)}` : '';
    }),
  );
}

const ALL_FIELDS: Fields = {
  ...SETTING_FIELDS,
  ...READING_FIELDS,
  ...LIMIT_FIELDS,
  ...GAS_FIELDS,
  ...AIRWAY_FIELDS,
  ...SIGN_FIELDS,
};

function unusualIn({ confirmedUnusual }: Body): EntryLine[] {
  if (!Array.isArray(confirmedUnusual) || confirmedUnusual.length === 0) return [];
  return [
    {
      label: 'Unusual, asked about and kept',
      text: joined(confirmedUnusual.map((key) => ALL_FIELDS[String(key)]?.label ?? String(key))),
    },
  ];
}

function supportInWords(id: unknown): string {
  const entry = SUPPORT_CATALOGUE.find((one) => one.id === id);
  return entry ? `${entry.shortName}, ${entry.fullName}` : textOf(id);
}

function isHappening(kind: unknown): kind is HappeningKind {
  return typeof kind === 'string' && kind in HAPPENING_KINDS;
}

/** A plateau is used for nothing until somebody says that the patient was passive. */
function passiveUnsaid({ readings }: Body): string {
  return groupOf(readings).plateauCmH2O === undefined ? '' : 'passive? not recorded';
}

function yesNo(value: unknown, yes: string, no: string): string {
  return value === true ? yes : value === false ? no : '';
}

function textOf(value: unknown): string {
  return typeof value === 'string' ? value : '';
}

function groupOf(value: unknown): Readonly<Record<string, unknown>> {
  return typeof value === 'object' && value !== null ? { ...value } : {};
}

function joined(parts: readonly string[]): string {
  return parts.filter((part) => part !== '').join(', ');
}
