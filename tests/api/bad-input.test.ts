import { Shift } from '@windrow/ventilation/contract/shifts';
import {
  AIRWAY_FIELDS,
  GAS_FIELDS,
  type NumberField,
  READING_FIELDS,
} from '@windrow/ventilation/entry/fields';
import { DEFAULT_POLICY } from '@windrow/ventilation/policy/policy';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Asking, Reply } from '../support/caller.ts';
import { aCheck, aGas, anAdmission, anAirway, aPatient } from '../support/entries.ts';
import { type House, openHouse, PASSWORD } from '../support/house.ts';
import { Placed, Recorded } from '../support/shapes.ts';
import { stored } from '../support/stored.ts';

let house: House;
let stayId: string;
let leftStayId: string;
let shiftId: string;
let ventilatorId: string;

beforeAll(async () => {
  house = await openHouse();
  stayId = (await house.admit(house.bed(house.alder, 0))).stayId;
  leftStayId = (await house.admit(house.bed(house.alder, 1))).stayId;
  const out = { outcome: 'ward', observedAt: house.ago(5) };
  await house.as('therapist').post(`/api/stays/${leftStayId}/discharge`, out);
  await house.record(stayId, 'checks', aCheck(house.ago(30)));
  const shift = await house.as('charge').post(`/api/units/${house.alder.unitId}/shifts`, {
    name: 'Day',
    startsAt: house.ago(60),
    endsAt: house.ago(-600),
    people: [{ personId: house.personId('therapist'), minutesAvailable: 600 }],
  });
  shiftId = shift.as(Shift).shiftId;
  ventilatorId = (await house.readyMachine('V-1')).ventilatorId;
});
afterAll(() => house.close());

type Case = {
  title: string;
  send: () => [method: string, path: string, asking?: Asking & { who?: string }];
  status?: number;
  /** The field that must be named, and what must be said of it. */
  path?: string;
  says: RegExp;
};

async function ask([method, path, asking = {}]: ReturnType<Case['send']>): Promise<Reply> {
  return house.as(asking.who ?? 'therapist').ask(method, path, asking);
}

function refuses(cases: Case[]): void {
  it.each(cases)('$title', async ({ send, status = 400, path, says }) => {
    const before = await stored(house.db);
    const reply = await ask(send());
    expect(reply.text).toMatch(says);
    expect(reply.status).toBe(status);
    expect(reply.headers.get('content-type')).toMatch(/^application\/problem\+json/);
    if (path !== undefined) {
      const named = reply.problem.errors?.find((error) => error.path === path);
      expect(named, `${path} is not named in ${reply.text}`).toBeDefined();
      expect(named?.message).toMatch(says);
    }
    expect(await stored(house.db)).toEqual(before);
  });
}

const check = (over: Parameters<typeof aCheck>[1] = {}, more: Asking = {}): ReturnType<Case['send']> => [
  'POST',
  `/api/stays/${stayId}/checks`,
  { body: aCheck(house.ago(1), over), ...more },
];
const gas = (over: Record<string, unknown>): ReturnType<Case['send']> => [
  'POST',
  `/api/stays/${stayId}/gases`,
  { body: aGas(house.ago(1), over) },
];
const raw = (text: string, more: Asking = {}): ReturnType<Case['send']> => [
  'POST',
  `/api/stays/${stayId}/checks`,
  { raw: text, ...more },
];

describe('a value that cannot be is refused with its field and its range, and nothing is stored:', () => {
  const oxygen = /21 to 100 %/;
  refuses([
    {
      title: 'FiO2 20',
      send: () => check({ settings: { fio2Percent: 20 } }),
      path: 'settings.fio2Percent',
      says: oxygen,
    },
    {
      title: 'FiO2 101',
      send: () => check({ settings: { fio2Percent: 101 } }),
      path: 'settings.fio2Percent',
      says: oxygen,
    },
    {
      title: 'FiO2 0.4, typed as a fraction',
      send: () => check({ settings: { fio2Percent: 0.4 } }),
      path: 'settings.fio2Percent',
      says: /FiO2.*21 to 100 %, not 0\.4/,
    },
    {
      title: 'FiO2 as text',
      send: () => check({ settings: { fio2Percent: '40' } }),
      path: 'settings.fio2Percent',
      says: oxygen,
    },
    {
      title: 'FiO2 null',
      send: () => check({ settings: { fio2Percent: null } }),
      path: 'settings.fio2Percent',
      says: oxygen,
    },
    {
      title: 'FiO2 without end',
      send: () =>
        raw(JSON.stringify(aCheck(house.ago(1))).replace('"fio2Percent":45', '"fio2Percent":1e999')),
      path: 'settings.fio2Percent',
      says: oxygen,
    },
    { title: 'pH 74', send: () => gas({ ph: 74 }), path: 'ph', says: /pH must be 6\.5 to 8, not 74/ },
    { title: 'a gas without pH', send: () => gas({ ph: undefined }), path: 'ph', says: /6\.5 to 8.*missing/ },
    {
      title: 'a plateau above the peak',
      send: () => check({ readings: { peakCmH2O: 24, plateauCmH2O: 28 } }),
      path: 'readings.plateauCmH2O',
      says: /at most the peak pressure, 24 cmH2O, not 28/,
    },
    {
      title: 'a peak below PEEP',
      send: () => check({ readings: { peakCmH2O: 8, plateauCmH2O: undefined } }),
      path: 'readings.peakCmH2O',
      says: /at least PEEP, 10 cmH2O, not 8/,
    },
    {
      title: 'a plateau below PEEP, with no peak',
      send: () => check({ readings: { peakCmH2O: undefined, plateauCmH2O: 7 } }),
      path: 'readings.plateauCmH2O',
      says: /at least PEEP, 10 cmH2O, not 7/,
    },
    {
      title: 'a check without a setting that its mode needs',
      send: () => check({ settings: { peepCmH2O: undefined } }),
      path: 'settings.peepCmH2O',
      says: /PEEP is needed in AC\/VC: 0 to 40 cmH2O/,
    },
    {
      title: 'a setting that the mode does not have',
      send: () => check({ settings: { psCmH2O: 10 } }),
      path: 'settings.psCmH2O',
      says: /AC\/VC has no such setting; it takes vtSetMl/,
    },
    {
      title: 'a mask on a tube’s mode',
      send: () => check({ interface: 'full-face' }),
      path: 'interface',
      says: /AC\/VC has no mask/,
    },
    {
      title: 'an unknown mode',
      send: () => check({ mode: 'prvc' }),
      path: 'mode',
      says: /mode must be one of ac-vc, .*, not \\?"prvc/,
    },
    {
      title: 'tube 7.3',
      send: () => ['POST', `/api/stays/${stayId}/airways`, { body: anAirway(house.ago(1), { sizeMm: 7.3 }) }],
      path: 'sizeMm',
      says: /2 to 10 mm in steps of 0\.5, not 7\.3/,
    },
    {
      title: 'an airway check of nothing',
      send: () => ['POST', `/api/stays/${stayId}/airway-checks`, { body: { observedAt: house.ago(1) } }],
      path: '',
      says: /at least one of depthCm, cuffCmH2O, position, secured/,
    },
    {
      title: 'an extubation to nothing',
      send: () => [
        'POST',
        `/api/stays/${stayId}/happenings`,
        { body: { observedAt: house.ago(1), kind: 'extubated-planned' } },
      ],
      path: 'toSupport',
      says: /needs the support that follows: ac-vc/,
    },
    {
      title: 'a failed trial without its reason',
      send: () => [
        'POST',
        `/api/stays/${stayId}/happenings`,
        { body: { observedAt: house.ago(1), kind: 'trial-failed' } },
      ],
      path: 'detail',
      says: /needs its reason/,
    },
    {
      title: 'a height of 1.65',
      send: () => [
        'POST',
        '/api/stays',
        {
          body: anAdmission(house.bed(house.alder, 2), house.ago(1), {
            patient: aPatient({ heightCm: 1.65 }),
          }),
        },
      ],
      path: 'patient.heightCm',
      says: /Height must be 120 to 230 cm, not 1\.65/,
    },
    {
      title: 'a birthday that no calendar has',
      send: () => [
        'POST',
        '/api/stays',
        {
          body: anAdmission(house.bed(house.alder, 2), house.ago(1), {
            patient: aPatient({ bornOn: '1961-02-30' }),
          }),
        },
      ],
      path: 'patient.bornOn',
      says: /must be a day such as 1961-03-04/,
    },
    {
      title: 'a birthday to come',
      send: () => [
        'POST',
        '/api/stays',
        {
          body: anAdmission(house.bed(house.alder, 2), house.ago(1), {
            patient: aPatient({ bornOn: '2061-03-04' }),
          }),
        },
      ],
      path: 'patient.bornOn',
      says: /not after/,
    },
    {
      title: 'a policy whose ages go down',
      send: () => [
        'PUT',
        `/api/units/${house.alder.unitId}/policy`,
        {
          who: 'charge',
          version: 1,
          body: {
            reason: 'tighter',
            policy: {
              ...DEFAULT_POLICY,
              freshness: {
                ...DEFAULT_POLICY.freshness,
                check: { dueFrom: 240, overdueFrom: 210, withdrawFrom: 480 },
              },
            },
          },
        },
      ],
      path: 'policy.freshness.check',
      says: /must not go down/,
    },
    {
      title: 'a policy whose cuff band is upside down',
      send: () => [
        'PUT',
        `/api/units/${house.alder.unitId}/policy`,
        {
          who: 'charge',
          version: 1,
          body: {
            reason: 'tighter',
            policy: {
              ...DEFAULT_POLICY,
              thresholds: { ...DEFAULT_POLICY.thresholds, cuffLowCmH2O: 35, cuffHighCmH2O: 25 },
            },
          },
        },
      ],
      path: 'policy.thresholds.cuffHighCmH2O',
      says: /cuffLowCmH2O/,
    },
  ]);
});

describe('every number has its own range at the door:', () => {
  const groups: [
    string,
    Record<string, NumberField>,
    (key: string, value: number) => ReturnType<Case['send']>,
    string,
  ][] = [
    ['gas', GAS_FIELDS, (key, value) => gas({ [key]: value }), ''],
    [
      'reading',
      READING_FIELDS,
      (key, value) => check({ readings: { peakCmH2O: undefined, plateauCmH2O: undefined, [key]: value } }),
      'readings.',
    ],
    [
      'airway',
      AIRWAY_FIELDS,
      (key, value) =>
        key === 'cuffCmH2O'
          ? [
              'POST',
              `/api/stays/${stayId}/airway-checks`,
              { body: { observedAt: house.ago(1), [key]: value } },
            ]
          : ['POST', `/api/stays/${stayId}/airways`, { body: anAirway(house.ago(1), { [key]: value }) }],
      '',
    ],
  ];
  const fields = groups.flatMap(([group, table, send, under]) =>
    Object.entries(table).map(([key, field]) => ({ group, key, field, send, under })),
  );

  it.each(fields)('$group $key is refused just outside it', async ({ key, field, send, under }) => {
    const before = await stored(house.db);
    for (const value of [field.hard[0] - 0.01, field.hard[1] + 0.01]) {
      const reply = await ask(send(key, value));
      expect(reply.status).toBe(400);
      const named = reply.problem.errors?.find(({ path }) => path === `${under}${key}`);
      expect(named?.message).toContain(`${field.hard[0]} to ${field.hard[1]}`);
      expect(named?.message).toContain(`not ${value}`);
    }
    expect(await stored(house.db)).toEqual(before);
  });
});

describe('a time that cannot be is refused, and nothing is stored:', () => {
  const ahead = /at most 2 minutes ahead/;
  refuses([
    {
      title: 'observed ten minutes ahead',
      send: () => check({ observedAt: house.ago(-10) }),
      path: 'observedAt',
      says: ahead,
    },
    {
      title: 'observed a second past two minutes ahead',
      send: () => check({ observedAt: house.ago(-2 - 1 / 60) }),
      path: 'observedAt',
      says: ahead,
    },
    {
      title: 'admitted ten minutes ahead',
      send: () => ['POST', '/api/stays', { body: anAdmission(house.bed(house.alder, 2), house.ago(-10)) }],
      path: 'observedAt',
      says: ahead,
    },
    {
      title: 'transferred ten minutes ahead',
      send: () => [
        'POST',
        `/api/stays/${stayId}/transfer`,
        { body: { bedId: house.bed(house.alder, 2), observedAt: house.ago(-10) } },
      ],
      path: 'observedAt',
      says: ahead,
    },
    {
      title: 'discharged ten minutes ahead',
      send: () => [
        'POST',
        `/api/stays/${stayId}/discharge`,
        { body: { outcome: 'ward', observedAt: house.ago(-10) } },
      ],
      path: 'observedAt',
      says: ahead,
    },
    {
      title: 'a machine moved ten minutes ahead',
      send: () => [
        'POST',
        `/api/ventilators/${ventilatorId}/moves`,
        { body: { state: 'in-use', bedId: house.bed(house.alder, 2), observedAt: house.ago(-10) } },
      ],
      path: 'observedAt',
      says: ahead,
    },
    {
      title: 'transferred before the admission',
      send: () => [
        'POST',
        `/api/stays/${stayId}/transfer`,
        { body: { bedId: house.bed(house.alder, 2), observedAt: house.ago(700) } },
      ],
      status: 409,
      path: 'observedAt',
      says: /must not be before/,
    },
    {
      title: 'discharged before the admission',
      send: () => [
        'POST',
        `/api/stays/${stayId}/discharge`,
        { body: { outcome: 'ward', observedAt: house.ago(700) } },
      ],
      status: 409,
      path: 'observedAt',
      says: /must not be before/,
    },
    {
      title: 'a time without an offset',
      send: () => check({ observedAt: '2026-03-05T07:59:00' }),
      path: 'observedAt',
      says: /ISO 8601 time with offset/,
    },
    {
      title: 'a day that no calendar has',
      send: () => check({ observedAt: '2026-02-30T07:59:00Z' }),
      path: 'observedAt',
      says: /ISO 8601 time with offset/,
    },
    {
      title: 'a look back to the future',
      send: () => ['GET', `/api/units/${house.alder.unitId}/board?at=${house.ago(-1)}`],
      path: 'at',
      says: /must not be after the server's time/,
    },
    {
      title: 'a look back to no time',
      send: () => ['GET', `/api/units/${house.alder.unitId}/board?at=yesterday`],
      path: 'at',
      says: /ISO 8601 time with offset/,
    },
    {
      title: 'a shift that ends before it starts',
      send: () => [
        'POST',
        `/api/units/${house.alder.unitId}/shifts`,
        {
          who: 'charge',
          body: { name: 'Night', startsAt: house.ago(-900), endsAt: house.ago(-800), people: [] },
        },
      ],
      path: 'people',
      says: /./,
    },
    {
      title: 'a shift of two days',
      send: () => [
        'POST',
        `/api/units/${house.alder.unitId}/shifts`,
        {
          who: 'charge',
          body: {
            name: 'Night',
            startsAt: house.ago(-900),
            endsAt: house.ago(-4000),
            people: [{ personId: house.personId('therapist'), minutesAvailable: 60 }],
          },
        },
      ],
      path: 'endsAt',
      says: /within 24 h/,
    },
  ]);

  it('a fact two minutes ahead is accepted: a tablet’s clock may run a little fast', async () => {
    expect((await ask(check({ observedAt: house.ago(-2) }))).status).toBe(201);
  });

  it('an offset other than UTC is understood', async () => {
    const reply = await ask(check({ observedAt: '2026-03-05T08:59:00+01:00' }));
    expect(reply.status).toBe(201);
    const items = await house.recordOf(stayId);
    expect(items.map(({ observedAt }) => observedAt)).toContain('2026-03-05T07:59:00.000Z');
  });
});

describe('a thing that is not there, or no more, is refused, and nothing is stored:', () => {
  refuses([
    {
      title: 'an unknown bed',
      send: () => ['POST', '/api/stays', { body: anAdmission('no-such-bed', house.ago(1)) }],
      status: 404,
      path: 'bedId',
      says: /no bed with the id \\?"no-such-bed/,
    },
    {
      title: 'a transfer to an unknown bed',
      send: () => [
        'POST',
        `/api/stays/${stayId}/transfer`,
        { body: { bedId: 'no-such-bed', observedAt: house.ago(1) } },
      ],
      status: 404,
      path: 'bedId',
      says: /no bed/,
    },
    {
      title: 'an unknown stay',
      send: () => ['POST', '/api/stays/no-such-stay/checks', { body: aCheck(house.ago(1)) }],
      status: 404,
      path: 'stayId',
      says: /no stay with the id/,
    },
    {
      title: 'an unknown unit',
      send: () => ['GET', '/api/units/no-such-unit/board'],
      status: 404,
      path: 'unitId',
      says: /no unit with the id/,
    },
    {
      title: 'an unknown fact',
      send: () => [
        'POST',
        '/api/observations/no-such-fact/amendments',
        { body: { as: 'struck', reason: 'wrong patient' } },
      ],
      status: 404,
      path: 'observationId',
      says: /no observation with the id/,
    },
    {
      title: 'an unknown shift',
      send: () => [
        'PUT',
        '/api/shifts/no-such-shift/assignment',
        { who: 'charge', version: 0, body: { places: [], publish: true } },
      ],
      status: 404,
      path: 'shiftId',
      says: /no shift with the id/,
    },
    {
      title: 'an unknown machine',
      send: () => ['POST', '/api/ventilators/no-such-machine/moves', { body: { state: 'cleaning' } }],
      status: 404,
      says: /no ventilator with the id/,
    },
    {
      title: 'an unknown person',
      send: () => [
        'PATCH',
        '/api/people/no-such-person',
        { who: 'administrator', version: 1, body: { disabled: true } },
      ],
      status: 404,
      path: 'personId',
      says: /no person with the id/,
    },
    {
      title: 'a role in an unknown unit',
      send: () => [
        'POST',
        '/api/people',
        {
          who: 'administrator',
          body: {
            username: 'fresh',
            displayName: 'Fresh Face',
            initials: 'FF',
            password: PASSWORD,
            grants: [{ role: 'therapist', unitId: 'no-such-unit' }],
          },
        },
      ],
      status: 404,
      path: 'grants.0.unitId',
      says: /no unit/,
    },
    {
      title: 'an unknown address',
      send: () => ['GET', '/api/no-such-address'],
      status: 404,
      path: 'path',
      says: /no address/,
    },
    {
      title: 'a method that the address does not take',
      send: () => ['DELETE', `/api/stays/${stayId}`],
      status: 404,
      says: /no address/,
    },
    {
      title: 'an id longer than any',
      send: () => ['POST', `/api/stays/${'x'.repeat(65)}/checks`, { body: aCheck(house.ago(1)) }],
      path: 'stayId',
      says: /64/,
    },
    {
      title: 'an address that is not well-formed',
      send: () => ['GET', '/api/stays/%E0%A4%A/record'],
      says: /not well-formed/,
    },
    {
      title: 'a check on a stay that has left',
      send: () => ['POST', `/api/stays/${leftStayId}/checks`, { body: aCheck(house.ago(1)) }],
      status: 409,
      path: 'stayId',
      says: /ended at 2026-03-05T07:55:00\.000Z; only a present stay takes entries/,
    },
    {
      title: 'a correction of a stay that has left',
      send: () => ['PATCH', `/api/stays/${leftStayId}`, { version: 2, body: { difficultAirway: true } }],
      status: 409,
      path: 'stayId',
      says: /ended at/,
    },
    {
      title: 'a second discharge',
      send: () => [
        'POST',
        `/api/stays/${leftStayId}/discharge`,
        { body: { outcome: 'ward', observedAt: house.ago(1) } },
      ],
      status: 409,
      path: 'stayId',
      says: /ended at/,
    },
  ]);
});

describe('a body that is not what the route takes is refused, and nothing is stored:', () => {
  refuses([
    { title: 'malformed JSON', send: () => raw('{"observedAt": '), says: /not well-formed JSON/ },
    { title: 'a list', send: () => raw('[]'), says: /expected object/ },
    { title: 'null', send: () => raw('null'), path: 'observedAt', says: /ISO 8601/ },
    { title: 'a bare number', send: () => raw('7'), says: /expected object/ },
    {
      title: 'five megabytes',
      send: () => check({ note: 'x'.repeat(5_000_000) }),
      status: 413,
      path: 'body',
      says: /at most 64 kB/,
    },
    {
      title: 'a note longer than any',
      send: () => check({ note: 'x'.repeat(501) }),
      path: 'note',
      says: /500/,
    },
    {
      title: 'an unknown field',
      send: () => check({ colour: 'blue' }),
      path: 'colour',
      says: /is not a field here/,
    },
    {
      title: 'an unknown setting',
      send: () => check({ settings: { peep: 5 } }),
      path: 'settings.peep',
      says: /is not a field here/,
    },
    {
      title: 'an unknown reading',
      send: () => check({ readings: { plateau: 5 } }),
      path: 'readings.plateau',
      says: /is not a field here/,
    },
    {
      title: 'an unknown question',
      send: () => ['GET', `/api/units/${house.alder.unitId}/board?unit=2`],
      path: 'unit',
      says: /is not a field here/,
    },
    {
      title: 'an unknown audience',
      send: () => ['GET', `/api/units/${house.alder.unitId}/board?audience=public`],
      path: 'audience',
      says: /staff.*display/,
    },
    {
      title: '__proto__ as a field',
      send: () => raw(JSON.stringify(aCheck(house.ago(1))).replace('{', '{"__proto__":{"mode":"psv"},')),
      path: '__proto__',
      says: /is not a field here/,
    },
    {
      title: '__proto__ as a setting',
      send: () =>
        raw(
          JSON.stringify(aCheck(house.ago(1))).replace(
            '"settings":{',
            '"settings":{"__proto__":{"peepCmH2O":5},',
          ),
        ),
      path: 'settings.__proto__',
      says: /is not a field here/,
    },
    {
      title: 'constructor as a field',
      send: () => check({ constructor: { prototype: { mode: 'psv' } } }),
      path: 'constructor',
      says: /is not a field here/,
    },
    {
      title: 'text in place of JSON',
      send: () => check({}, { headers: { 'Content-Type': 'text/plain' } }),
      status: 415,
      path: 'Content-Type',
      says: /application\/json/,
    },
    {
      title: 'a form in place of JSON',
      send: () => raw('observedAt=now', { headers: { 'Content-Type': 'application/x-www-form-urlencoded' } }),
      status: 415,
      path: 'Content-Type',
      says: /application\/json/,
    },
    {
      title: 'a correction as text, of which nothing would be left',
      send: () => [
        'PATCH',
        `/api/stays/${stayId}`,
        { version: 1, raw: '{"difficultAirway":true}', headers: { 'Content-Type': 'text/plain' } },
      ],
      status: 415,
      path: 'Content-Type',
      says: /application\/json/,
    },
    {
      title: 'JSON in another alphabet',
      send: () => check({}, { headers: { 'Content-Type': 'application/json; charset=latin1' } }),
      says: /UTF-8/,
    },
    {
      title: 'a correction of nothing',
      send: () => ['PATCH', `/api/stays/${stayId}`, { version: 1, body: {} }],
      path: '',
      says: /nothing to change/,
    },
    {
      title: 'a change of a person in nothing',
      send: () => [
        'PATCH',
        `/api/people/${house.personId('therapist')}`,
        { who: 'administrator', version: 1, body: {} },
      ],
      path: '',
      says: /nothing to change/,
    },
    {
      title: 'an amendment without its reason',
      send: () => ['POST', '/api/observations/x/amendments', { body: { as: 'struck', reason: ' ' } }],
      path: 'reason',
      says: /at least 3 letters/,
    },
    {
      title: 'a machine in use at no bed',
      send: () => ['POST', `/api/ventilators/${ventilatorId}/moves`, { body: { state: 'in-use' } }],
      path: 'bedId',
      says: /stands at a bed/,
    },
    {
      title: 'a place with no clock of its own',
      send: () => [
        'POST',
        '/api/units',
        { who: 'administrator', body: { name: 'Cedar', timeZone: 'Mars/Olympus' } },
      ],
      path: 'timeZone',
      says: /Europe\/London, not \\?"Mars/,
    },
    {
      title: 'a short password',
      send: () => [
        'POST',
        '/api/people',
        {
          who: 'administrator',
          body: {
            username: 'fresh',
            displayName: 'Fresh Face',
            initials: 'FF',
            password: 'short',
            grants: [],
          },
        },
      ],
      path: 'password',
      says: /at least 12 characters/,
    },
    {
      title: 'an unknown role',
      send: () => [
        'POST',
        '/api/people',
        {
          who: 'administrator',
          body: {
            username: 'fresh',
            displayName: 'Fresh Face',
            initials: 'FF',
            password: PASSWORD,
            grants: [{ role: 'root', unitId: null }],
          },
        },
      ],
      path: 'grants.0.role',
      says: /therapist/,
    },
  ]);

  it('an amendment whose body breaks the rules of its kind, which it names under body', async () => {
    const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(2)));
    const before = await stored(house.db);
    const amend = (text: string) =>
      ask(['POST', `/api/observations/${observationId}/amendments`, { raw: text }]);
    const withBody = (body: string) => `{"as":"corrected","reason":"typed wrong","body":${body}}`;
    const wrong = await amend(
      withBody(JSON.stringify(aCheck(house.ago(2), { settings: { fio2Percent: 0.5 } }))),
    );
    expect(wrong.problem.errors).toEqual([
      { path: 'body.settings.fio2Percent', message: expect.stringContaining('21 to 100 %') },
    ]);
    const ahead = await amend(withBody(JSON.stringify(aCheck(house.ago(-10)))));
    expect(ahead.problem.errors?.[0]).toMatchObject({
      path: 'observedAt',
      message: expect.stringContaining('2 minutes ahead'),
    });
    expect(await stored(house.db)).toEqual(before);
  });

  it('an amendment’s __proto__ changes nothing of what is stored', async () => {
    const { observationId } = await house.record(stayId, 'checks', aCheck(house.ago(2)));
    const body = JSON.stringify(aCheck(house.ago(2))).replace('{', '{"__proto__":{"mode":"psv"},');
    const amendment = `{"as":"corrected","reason":"typed wrong","body":${body}}`;
    const reply = await ask(['POST', `/api/observations/${observationId}/amendments`, { raw: amendment }]);
    const { observationId: mended } = reply.as(Recorded);
    const entry = (await house.recordOf(stayId)).find((fact) => fact.observationId === mended);
    expect(entry?.body.mode).toBe('ac-vc');
    expect(JSON.stringify(entry)).not.toContain('__proto__');
  });
});

describe('a version that is not the newest is refused, and nothing is stored:', () => {
  const policy = (version: number | string | undefined): ReturnType<Case['send']> => [
    'PUT',
    `/api/units/${house.alder.unitId}/policy`,
    { who: 'charge', version, body: { policy: DEFAULT_POLICY, reason: 'as it was' } },
  ];
  refuses([
    {
      title: 'a policy without If-Match',
      send: () => policy(undefined),
      status: 428,
      path: 'If-Match',
      says: /the version that was read/,
    },
    {
      title: 'a policy with garbage in If-Match',
      send: () => policy('latest'),
      path: 'If-Match',
      says: /such as "3", not latest|such as \\"3\\", not latest/,
    },
    {
      title: 'a policy with any version',
      send: () => policy('*'),
      path: 'If-Match',
      says: /the version that was read/,
    },
    {
      title: 'a policy with a version below zero',
      send: () => policy('"-1"'),
      path: 'If-Match',
      says: /the version that was read/,
    },
    {
      title: 'a stale policy',
      send: () => policy(7),
      status: 409,
      path: 'If-Match',
      says: /current version is 1/,
    },
    {
      title: 'an assignment without If-Match',
      send: () => [
        'PUT',
        `/api/shifts/${shiftId}/assignment`,
        { who: 'charge', body: { places: [], publish: false } },
      ],
      status: 428,
      path: 'If-Match',
      says: /version that was read/,
    },
    {
      title: 'a stay without If-Match',
      send: () => ['PATCH', `/api/stays/${stayId}`, { body: { difficultAirway: true } }],
      status: 428,
      path: 'If-Match',
      says: /version that was read/,
    },
    {
      title: 'a person without If-Match',
      send: () => [
        'PATCH',
        `/api/people/${house.personId('therapist')}`,
        { who: 'administrator', body: { disabled: true } },
      ],
      status: 428,
      path: 'If-Match',
      says: /version that was read/,
    },
  ]);

  it('and the refusal names who changed it, and when', async () => {
    house.later(1);
    const at = house.ago(0);
    const { unitId } = house.alder;
    const change = { policy: DEFAULT_POLICY, reason: 'as it was' };
    const places = { places: [], publish: false };
    const therapist2 = house.personId('therapist2');
    await house.as('charge').put(`/api/units/${unitId}/policy`, change, { version: 1 });
    await house.as('charge').put(`/api/shifts/${shiftId}/assignment`, places, { version: 0 });
    await house.as('supervisor').patch(`/api/stays/${stayId}`, { difficultAirway: true }, { version: 1 });
    await house.as('administrator').patch(`/api/people/${therapist2}`, { disabled: true }, { version: 1 });
    house.later(5);
    const before = await stored(house.db);
    const late = [
      {
        reply: await house.as('charge').put(`/api/units/${unitId}/policy`, change, { version: 1 }),
        by: 'Person charge',
      },
      {
        reply: await house.as('supervisor').put(`/api/shifts/${shiftId}/assignment`, places, { version: 0 }),
        by: 'Person charge',
      },
      {
        reply: await house
          .as('therapist')
          .patch(`/api/stays/${stayId}`, { difficultAirway: false }, { version: 1 }),
        by: 'Person supervisor',
      },
      {
        reply: await house
          .as('administrator')
          .patch(`/api/people/${therapist2}`, { disabled: false }, { version: 1 }),
        by: 'Rana Oduya',
      },
    ];
    for (const { reply, by } of late) {
      expect(reply.status).toBe(409);
      expect(reply.problem.detail).toContain(`${by} changed it at ${at}`);
    }
    expect(await stored(house.db)).toEqual(before);
  });
});

describe('a key is for one entry:', () => {
  refuses([
    {
      title: 'a write without a key is refused',
      send: () => check({}, { key: null }),
      path: 'Idempotency-Key',
      says: /UUID made for it, not null/,
    },
    {
      title: 'a key that is no UUID is refused',
      send: () => check({}, { key: 'retry-1' }),
      path: 'Idempotency-Key',
      says: /UUID made for it, not \\?"retry-1/,
    },
  ]);

  it.each([
    ['another body', () => check({ note: 'another' })],
    [
      'another stay',
      (): ReturnType<Case['send']> => [
        'POST',
        `/api/stays/${leftStayId}/checks`,
        { body: aCheck(house.ago(1)) },
      ],
    ],
    [
      'another route',
      (): ReturnType<Case['send']> => ['POST', `/api/stays/${stayId}/gases`, { body: aGas(house.ago(1)) }],
    ],
  ])('used again with %s is refused with 422', async (_, other) => {
    const key = crypto.randomUUID();
    expect((await ask(check({}, { key }))).status).toBe(201);
    const before = await stored(house.db);
    const [method, path, asking] = other();
    const reply = await ask([method, path, { ...asking, key }]);
    expect(reply.status).toBe(422);
    expect(reply.problem.errors).toEqual([
      { path: 'Idempotency-Key', message: expect.stringContaining('another body') },
    ]);
    expect(await stored(house.db)).toEqual(before);
  });

  it('used by somebody else is theirs: two people who happen on one key both store', async () => {
    const key = crypto.randomUUID();
    const [method, path, asking] = check({}, { key });
    expect((await ask([method, path, asking])).status).toBe(201);
    const reply = await ask([method, path, { ...asking, who: 'charge' }]);
    expect(reply.status).toBe(201);
  });

  it('of a refused entry is free again: mended, it is stored under the same key', async () => {
    const key = crypto.randomUUID();
    expect((await ask(check({ settings: { fio2Percent: 4 } }, { key }))).status).toBe(400);
    const onLeft = await ask([
      'POST',
      `/api/stays/${leftStayId}/checks`,
      { body: aCheck(house.ago(1)), key },
    ]);
    expect(onLeft.status).toBe(409);
    expect((await ask(check({}, { key }))).status).toBe(201);
  });
});

describe('a list that is asked for wrongly is refused:', () => {
  const lists: [string, () => string, string][] = [
    ['a record', () => `/api/stays/${stayId}/record`, 'therapist'],
    ['the shifts', () => `/api/units/${house.alder.unitId}/shifts`, 'therapist'],
    ['the moves of a machine', () => `/api/ventilators/${ventilatorId}/moves`, 'therapist'],
    ['the audit trail', () => '/api/audit', 'therapist'],
  ];
  refuses(
    lists.flatMap(([title, path, who]): Case[] => [
      {
        title: `${title} from a garbage cursor`,
        send: () => ['GET', `${path()}?cursor=garbage`, { who }],
        path: 'cursor',
        says: /nextCursor of an earlier page/,
      },
      {
        title: `${title} from a cursor that is nearly one`,
        send: () => ['GET', `${path()}?cursor=1_1'--`, { who }],
        path: 'cursor',
        says: /nextCursor of an earlier page/,
      },
    ]),
  );
  const limits = ['0', '-1', '201', '1.5', 'all', ''];
  refuses(
    limits.map((limit) => ({
      title: `a page of ${limit || 'nothing'}`,
      send: () => ['GET', `/api/stays/${stayId}/record?limit=${limit}`],
      path: 'limit',
      says: /1 to 200/,
    })),
  );
});

describe('a write from another site is refused, and nothing is stored:', () => {
  const sites: [string, Record<string, string>][] = [
    ['another Origin', { Origin: 'https://elsewhere.example' }],
    ['an Origin that hides itself', { Origin: 'null' }],
    ['an Origin that begins like ours', { Origin: 'http://127.0.0.1.elsewhere.example' }],
    ['our host at another port', { Origin: 'http://127.0.0.1:1' }],
    ['Sec-Fetch-Site: cross-site', { 'Sec-Fetch-Site': 'cross-site' }],
    ['Sec-Fetch-Site: same-site', { 'Sec-Fetch-Site': 'same-site' }],
  ];
  refuses(
    sites.map(([title, headers]) => ({
      title,
      send: () => check({}, { headers }),
      status: 403,
      says: /from another site/,
    })),
  );
  refuses(
    sites.map(([title, headers]) => ({
      title: `signing in with ${title}`,
      send: () => [
        'POST',
        '/api/session',
        { headers, key: null, body: { username: 'therapist', password: PASSWORD } },
      ],
      status: 403,
      says: /from another site/,
    })),
  );

  it('and one from our own page is stored', async () => {
    const headers = { Origin: house.server.url, 'Sec-Fetch-Site': 'same-origin' };
    expect((await ask(check({}, { headers }))).status).toBe(201);
  });
});

describe('what stands in the way is named, and nothing is stored:', () => {
  refuses([
    {
      title: 'a bed with a patient',
      send: () => ['POST', '/api/stays', { body: anAdmission(house.bed(house.alder, 0), house.ago(1)) }],
      status: 409,
      path: 'bedId',
      says: /only an empty bed takes one/,
    },
    {
      title: 'a bed where the patient is already',
      send: () => [
        'POST',
        `/api/stays/${stayId}/transfer`,
        { body: { bedId: house.bed(house.alder, 0), observedAt: house.ago(1) } },
      ],
      status: 409,
      path: 'bedId',
      says: /where the stay is now/,
    },
    {
      title: 'a unit of the same name',
      send: () => [
        'POST',
        '/api/units',
        { who: 'administrator', body: { name: 'Alder', timeZone: 'Europe/London' } },
      ],
      status: 409,
      path: 'name',
      says: /is taken/,
    },
    {
      title: 'a bed of the same label',
      send: () => [
        'POST',
        `/api/units/${house.alder.unitId}/beds`,
        { who: 'administrator', body: { label: '01', row: 9, column: 9 } },
      ],
      status: 409,
      path: 'label',
      says: /is taken in this unit/,
    },
    {
      title: 'a bed on another bed',
      send: () => [
        'POST',
        `/api/units/${house.alder.unitId}/beds`,
        { who: 'administrator', body: { label: '09', row: 1, column: 1 } },
      ],
      status: 409,
      path: 'column',
      says: /row 1, column 1 is taken by bed 01/,
    },
    {
      title: 'closing a bed with a patient',
      send: () => [
        'PATCH',
        `/api/beds/${house.bed(house.alder, 0)}`,
        { who: 'administrator', body: { isOpen: false } },
      ],
      status: 409,
      path: 'isOpen',
      says: /stays open/,
    },
    {
      title: 'a user name that is taken, in capitals',
      send: () => [
        'POST',
        '/api/people',
        {
          who: 'administrator',
          body: {
            username: 'THERAPIST',
            displayName: 'Twice Here',
            initials: 'TH',
            password: PASSWORD,
            grants: [],
          },
        },
      ],
      status: 409,
      path: 'username',
      says: /is taken/,
    },
    {
      title: 'an asset number that is taken',
      send: () => [
        'POST',
        '/api/ventilators',
        {
          who: 'biomedical',
          body: { assetNumber: 'V-1', model: 'Model T', class: 'adult-icu', homeUnitId: null },
        },
      ],
      status: 409,
      path: 'assetNumber',
      says: /is taken/,
    },
    {
      title: 'the same role twice',
      send: () => [
        'POST',
        '/api/people',
        {
          who: 'administrator',
          body: {
            username: 'fresh',
            displayName: 'Fresh Face',
            initials: 'FF',
            password: PASSWORD,
            grants: [
              { role: 'therapist', unitId: house.alder.unitId },
              { role: 'therapist', unitId: house.alder.unitId },
            ],
          },
        },
      ],
      path: 'grants',
      says: /once/,
    },
  ]);

  it('a hospital number of a present patient is admitted once', async () => {
    const patient = aPatient();
    const admit = (bed: number) =>
      house
        .as('therapist')
        .post('/api/stays', anAdmission(house.bed(house.alder, bed), house.ago(1), { patient }));
    (await admit(2)).as(Placed);
    const before = await stored(house.db);
    const second = await admit(3);
    expect(second.status).toBe(409);
    expect(second.problem).toMatchObject({
      detail: expect.stringContaining('in bed 03'),
      errors: [{ path: 'patient.hospitalNumber' }],
    });
    expect(await stored(house.db)).toEqual(before);
  });
});
